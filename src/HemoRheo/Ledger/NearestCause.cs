namespace HemoRheo;

/// <summary>The change nearest to a changed result: the sample's own input, else settings, version or seed, else another input.</summary>
internal sealed class NearestCause
{
    private readonly Dictionary<string, string[]> _feeds;
    private readonly HashSet<string> _changedInputs;
    private readonly string _otherwise;

    internal NearestCause(RunRecord earlier, RunRecord later, IReadOnlyCollection<RunChange> inputs, IReadOnlyCollection<RunChange> rest)
    {
        _feeds = later.Feeds.Concat(earlier.Feeds).GroupBy(feed => feed.Name).ToDictionary(sample => sample.Key, sample => sample.Select(feed => feed.Text).Distinct().ToArray());
        _changedInputs = inputs.Select(change => change.Name).ToHashSet();
        _otherwise = rest.FirstOrDefault() is { } change ? change.What == change.Name ? change.What : $"{change.What} {change.Name}"
            : inputs.Count > 0 ? $"input {inputs.First().Name}{(inputs.Count > 1 ? $" or another of {inputs.Count} changed inputs" : "")}, through what the samples share"
            : "nothing that was recorded: no input, setting, version or seed changed";
    }

    internal string Of(string result) =>
        SampleOf(result) is { } sample && _feeds[sample].FirstOrDefault(_changedInputs.Contains) is { } own ? $"input {own}" : _otherwise;

    /// <summary>The sample a result's name begins with; a pseudonym may itself hold a slash.</summary>
    private string? SampleOf(string result)
    {
        for (var end = result.IndexOf('/', StringComparison.Ordinal); end > 0; end = result.IndexOf('/', end + 1))
        {
            if (_feeds.ContainsKey(result[..end])) return result[..end];
        }

        return null;
    }
}
