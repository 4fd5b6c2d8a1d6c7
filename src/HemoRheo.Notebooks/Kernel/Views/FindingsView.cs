namespace HemoRheo.Notebooks;

/// <summary>Findings as a table, faults first.</summary>
internal static class FindingsView
{
    public static Table Table(IEnumerable<Finding> findings) => HemoRheo.Table.Of("severity", "code", "finding", "where", "what to do").WithRows(
        findings.OrderByDescending(finding => finding.Severity),
        finding => [Words.Of(finding.Severity), finding.Code, finding.Message, finding.Where.ToString(), finding.Kind.WhatToDo]);

    /// <summary>All of them, or a line that there are none.</summary>
    public static Markup Of(Items<Finding> findings) => findings.Count == 0
        ? Markup.Of($"<p>No findings.</p>\n")
        : Markup.Of($"<details open><summary>{Count(findings)}</summary>{TableMarkup.Of(Table(findings))}</details>\n");

    /// <summary>The same, folded where there are many.</summary>
    public static Markup Folded(Items<Finding> findings) => findings.Count == 0 ? Markup.Of($"<p>No findings.</p>\n") : TableMarkup.Folded(Table(findings), Count(findings));

    /// <summary>How many of each kind, for a whole study.</summary>
    public static Markup ByKind(Items<Finding> findings)
    {
        var kinds = findings.GroupBy(finding => finding.Kind).OrderByDescending(kind => kind.Key.Severity).ThenByDescending(kind => kind.Count());
        var table = HemoRheo.Table.Of("severity", "code", "count", "meaning", "what to do").WithRows(kinds, kind => [Words.Of(kind.Key.Severity), kind.Key.Code, kind.Count(), kind.Key.Meaning, kind.Key.WhatToDo]);
        return findings.Count == 0 ? Of(findings) : Markup.Of($"<details open><summary>{Count(findings)}</summary>{TableMarkup.Of(table)}</details>\n");
    }

    /// <summary>How many of each severity, e.g. <c>3 findings: 1 fault, 2 warnings</c>.</summary>
    public static string Count(IReadOnlyCollection<Finding> findings)
    {
        var kinds = findings.GroupBy(finding => finding.Severity).OrderByDescending(kind => kind.Key).Select(kind => Plural(kind.Count(), Words.Of(kind.Key)));
        return $"{Plural(findings.Count, "finding")}: {string.Join(", ", kinds)}";
    }

    private static string Plural(int count, string word) => count == 1 ? $"1 {word}" : $"{count} {word}s";
}
