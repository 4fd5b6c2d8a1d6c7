namespace HemoRheo.App;

/// <summary>A run held beside the previous one, in words.</summary>
internal static class ComparisonLines
{
    private const string Result = "result";
    private const int Longest = 10;

    /// <summary>The lines; the first says whether the runs are identical.</summary>
    public static IEnumerable<string> Of(RunComparison comparison)
    {
        if (comparison.Identical)
        {
            yield return "identical to the previous run";
            yield break;
        }
        yield return $"{comparison.Changes.Count} {(comparison.Changes.Count == 1 ? "change" : "changes")} since the previous run";
        var causes = comparison.Changes.Where(change => change.What != Result).ToArray();
        foreach (var change in causes.Take(Longest)) yield return $"{change.What} {change.Name} {Kind(change)}";
        if (causes.Length > Longest) yield return $"and {causes.Length - Longest} more; all are in the pages";
        var groups = comparison.Changes.Where(change => change.What == Result).GroupBy(change => change.NearestCause).OrderByDescending(group => group.Count()).ToArray();
        foreach (var group in groups.Take(Longest)) yield return $"{Results(group.Count())} changed; nearest cause: {group.Key ?? "not known"}";
        if (groups.Length > Longest) yield return $"{Results(groups.Skip(Longest).Sum(group => group.Count()))} changed for {groups.Length - Longest} more causes";
    }

    private static string Results(int count) => count == 1 ? "1 result" : $"{count} results";

    private static string Kind(RunChange change) => change.Before is null ? "is new" : change.After is null ? "is gone" : "changed";
}
