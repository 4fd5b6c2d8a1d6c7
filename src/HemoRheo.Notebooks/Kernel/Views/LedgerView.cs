namespace HemoRheo.Notebooks;

/// <summary>The record of a run, and two runs held side by side.</summary>
internal static class LedgerView
{
    public static Markup Of(RunRecord record) => TableMarkup.Of(
        Table.Of("what", "name").WithRows(
            [new("study", record.Study), new("study file", record.Settings), .. record.Versions, new("inputs", $"{record.Inputs.Count} files"), new("results", $"{record.Results.Count} numbers, digest {record.ResultDigest}")],
            (NamedText row) => [row.Name, row.Text]),
        "Record of the run");

    public static Markup Of(RunComparison comparison) => comparison.Identical
        ? Markup.Of($"<p>Identical: every input, setting, version and number is the same.</p>\n")
        : TableMarkup.Of(
            Table.Of("what", "name", "before", "after", "nearest cause").WithRows(comparison.Changes, change => [change.What, change.Name, change.Before, change.After, change.NearestCause]),
            comparison.ToString());
}
