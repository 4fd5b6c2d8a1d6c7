namespace HemoRheo.App;

/// <summary>What of a result needs a person.</summary>
internal static class Attention
{
    private const int ToldEach = 3;

    /// <summary>Whether a person is needed: a failed check, a file that could not be read, or any fault.</summary>
    public static bool NeedsAPerson(StudyResult results) =>
        FailedChecks(results).Any() || results.Findings.Any(finding => finding.Severity == Severity.Fault);

    /// <summary>The lines that tell what needs attention.</summary>
    public static IEnumerable<string> Lines(StudyResult results)
    {
        foreach (var history in results.Analyzed.Histories) yield return OfInstrument(history);
        yield return OfSamples(results);
        foreach (var kind in results.Findings.GroupBy(finding => finding.Kind).OrderByDescending(kind => kind.Key.Severity).ThenBy(kind => kind.Key.Code, StringComparer.Ordinal))
        {
            foreach (var line in OfFindings(kind.Key, [.. kind])) yield return line;
        }
    }

    private static IEnumerable<InstrumentCheck> FailedChecks(StudyResult results) =>
        results.Analyzed.Histories.SelectMany(history => history.Checks).Where(check => check.Outcome == CheckOutcome.Fails);

    private static string OfInstrument(InstrumentHistory history)
    {
        var failed = history.Checks.Where(check => check.Outcome == CheckOutcome.Fails).Select(check => $"{check.Name} of {check.Day:yyyy-MM-dd}").ToArray();
        var undecided = history.Checks.Count(check => check.Outcome == CheckOutcome.CannotTell);
        if (history.Checks.Count == 0) return $"instrument {history.Instrument.Name}: no check, so nothing vouches for it";
        return $"instrument {history.Instrument.Name}: {Counted(history.Checks.Count, "check")}"
            + (failed.Length > 0 ? $", {failed.Length} failed ({string.Join(", ", failed)})" : ", none failed")
            + (undecided > 0 ? $", {undecided} too uncertain to tell" : "");
    }

    private static string OfSamples(StudyResult results)
    {
        var words = new[]
        {
            (InstrumentStatus.InOrder, "in order"),
            (InstrumentStatus.InDoubt, "in doubt"),
            (InstrumentStatus.Failed, "measured after a failed check"),
            (InstrumentStatus.Unknown, results.Analyzed.Histories.All(history => history.Checks.Count == 0) ? "that no check vouches for: there is no check" : "measured before any check, or after an adjustment without one"),
        };
        var counts = words
            .Select(word => (Count: results.Samples.Count(sample => sample.Result.Status == word.Item1), Words: word.Item2))
            .Where(one => one.Count > 0)
            .Select(one => $"{one.Count} {one.Words}");
        return $"{Counted(results.Samples.Count, "sample")}: {string.Join(", ", counts)}";
    }

    private static IEnumerable<string> OfFindings(FindingKind kind, IReadOnlyList<Finding> findings)
    {
        var head = $"{kind.Severity.ToString().ToUpperInvariant(),-8}{kind.Code}";
        IEnumerable<string> lines = findings.Count <= ToldEach
            ? findings.Select(finding => $"{head}: {finding.Message}{Place("", finding)}")
            : [$"{head}, {findings.Count} times: {kind.Meaning}{Place("first: ", findings[0])}"];
        return kind.Severity == Severity.Fault ? lines.Append($"{"",-8}what to do: {kind.WhatToDo}") : lines;
    }

    private static string Place(string word, Finding finding) => finding.Where.ToString() is { Length: > 0 } where ? $" ({word}{where})" : "";

    private static string Counted(int count, string what) => count == 1 ? $"1 {what}" : $"{count} {what}s";
}
