using System.Globalization;

namespace HemoRheo;

/// <summary>Two records held side by side.</summary>
internal static class RunComparing
{
    internal static RunComparison Of(RunRecord earlier, RunRecord later)
    {
        var inputs = Differences("input", earlier.Inputs, later.Inputs);
        var rest = Single("setting", "study file", earlier.Settings, later.Settings)
            .Concat(Differences("version", earlier.Versions, later.Versions))
            .Concat(Single("seed", "seed", earlier.Seed.ToString(CultureInfo.InvariantCulture), later.Seed.ToString(CultureInfo.InvariantCulture)))
            .Concat(Single("study", "name", earlier.Study, later.Study))
            .ToArray();
        var cause = new NearestCause(earlier, later, inputs, rest);
        var results = Differences("result", earlier.Results, later.Results).Select(change => change with { NearestCause = cause.Of(change.Name) });
        return new([.. inputs, .. rest, .. results]);
    }

    private static IEnumerable<RunChange> Single(string what, string name, string before, string after) =>
        before == after ? [] : [new(what, name, before, after, null)];

    /// <summary>In the later run's order; what only the earlier one had comes last.</summary>
    private static RunChange[] Differences(string what, Items<NamedText> before, Items<NamedText> after)
    {
        var was = before.ToLookup(item => item.Name, item => item.Text);
        var now = after.ToLookup(item => item.Name, item => item.Text);
        return after.Select(item => item.Name)
            .Concat(before.Select(item => item.Name))
            .Distinct()
            .Where(name => !was[name].SequenceEqual(now[name]))
            .Select(name => new RunChange(what, name, Text(was[name]), Text(now[name]), null))
            .OrderBy(change => change.After is null)
            .ToArray();
    }

    private static string? Text(IEnumerable<string> texts)
    {
        var all = texts.ToArray();
        return all.Length == 0 ? null : string.Join("; ", all);
    }
}
