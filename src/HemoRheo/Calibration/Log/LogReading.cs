using static System.FormattableString;

namespace HemoRheo;

/// <summary>Makes the contents of the rows of a log.</summary>
internal static class LogReading
{
    internal static LogContents Of(string instrument, List<LogRow> rows)
    {
        var read = LogJson.TryRead(rows);
        var entries = rows.Select((row, i) => read[i] is { } what ? LogEntries.Of(row, what, i == 0 ? null : rows[i - 1]) : null).OfType<LogEntry>().ToItems();
        var standing = Standing(entries).ToItems();
        var verification = LogChain.Verify(rows, read);
        return new(instrument, entries, standing, verification, [.. Broken(verification), .. entries.SelectMany(entry => entry.Findings), .. Twice(standing)]);
    }

    private static IEnumerable<StandingEntry> Standing(Items<LogEntry> entries)
    {
        var corrections = entries.Where(entry => entry.What is LoggedCorrection).ToLookup(entry => ((LoggedCorrection)entry.What).Of);
        return entries.Where(entry => entry.What.Happened is not null)
            .Select(entry => (Entry: entry, Corrections: corrections[entry.Number].ToItems()))
            .Select(pair => (pair.Entry, What: pair.Corrections.Count == 0 ? pair.Entry.What : ((LoggedCorrection)pair.Corrections[^1].What).Instead, pair.Corrections))
            .Where(one => one.What is not null)
            .Select(one => new StandingEntry(one.Entry, one.What!, one.Corrections))
            .OrderBy(entry => entry.What.Happened);
    }

    private static IEnumerable<Finding> Broken(LogVerification verification)
    {
        if (verification.FirstBreak is { } broken) yield return CalibrationFindings.LogBroken.At(Where.Nowhere, Invariant($"The log is not as it was written: {broken}"), broken.Number);
    }

    private static IEnumerable<Finding> Twice(Items<StandingEntry> standing)
    {
        var checks = standing.Where(entry => entry.What is LoggedCheck).Select(entry => (entry.Entry.Number, Check: (LoggedCheck)entry.What)).ToArray();
        foreach (var same in checks.GroupBy(one => (one.Check.At, one.Check.Name, one.Check.Filling, one.Check.ExportDigest)).Where(same => same.Key.ExportDigest is not null && same.Count() > 1))
        {
            yield return CalibrationFindings.LogRecordedTwice.At(Where.Nowhere with { Sample = same.Key.Name }, $"Entries {Numbers(same.Select(one => one.Number))} record filling {same.Key.Filling} of check '{same.Key.Name}' from the same export.");
        }

        foreach (var same in checks.GroupBy(one => one.Check.At).Where(same => same.Select(one => (one.Check.Name, one.Check.Filling)).Distinct().Count() > 1))
        {
            yield return CalibrationFindings.LogSameMoment.At(Where.Nowhere, Invariant($"Entries {Numbers(same.Select(one => one.Number))} are different checks at one moment, {same.Key:yyyy-MM-dd HH:mm zzz}."));
        }
    }

    private static string Numbers(IEnumerable<long> numbers) => string.Join(", ", numbers.Order());
}
