namespace HemoRheo.Notebooks;

/// <summary>Small pieces that several pages share: verdicts, statuses, findings.</summary>
internal static class Marks
{
    private const int MostRows = 60;

    /// <summary>An instrument status: the word, in bold where a person should look.</summary>
    public static Markup Status(InstrumentStatus status) =>
        status == InstrumentStatus.InOrder ? Markup.Of($"{Words.Of(status)}") : Markup.Of($"<span class=\"loud\">{Words.Of(status)}</span>");

    /// <summary>A verdict: the word with its probability, or why there is none.</summary>
    public static Markup Verdict(JudgedValue? value) => value switch
    {
        null => Markup.Of($"no value"),
        { Verdict: { } verdict } => Markup.Of($"{Word(verdict)} <small>{Figures.Probability(Largest(verdict))}</small>"),
        _ => Markup.Of($"not judged"),
    };

    /// <summary>The word of a verdict, in bold unless it is within.</summary>
    public static Markup Word(Verdict verdict) =>
        verdict.Outcome is Outcome.Within ? Markup.Of($"{Words.Of(verdict.Outcome)}") : Markup.Of($"<b>{Words.Of(verdict.Outcome)}</b>");

    /// <summary>Reasons counted by code.</summary>
    public static Markup Reasons(Items<CountedReason> reasons) => reasons.Count == 0
        ? Markup.Of($"{Figures.Nothing}")
        : new(string.Join("<br/>", reasons.Select(reason => Markup.Of($"{reason.Count} <code>{reason.Code}</code>").Text)));

    /// <summary>Findings as a table, the weightiest first.</summary>
    /// <param name="caption">What they are about.</param>
    /// <param name="findings">The findings.</param>
    public static Markup Findings(string caption, IEnumerable<Finding> findings)
    {
        var rows = findings.Distinct().OrderByDescending(finding => finding.Severity).ToArray();
        if (rows.Length == 0) return Markup.Of($"<p>{caption}: none.</p>");
        var rest = rows.Length > MostRows ? Markup.Of($"<p class=\"quiet\">{rows.Length - MostRows} more stand in tables/findings.csv.</p>") : Markup.None;
        return Markup.Of($"""
            <div class="wide"><table><caption>{caption}</caption>
            <thead><tr><th scope="col">severity</th><th scope="col">code</th><th scope="col">what was found</th><th scope="col">where</th><th scope="col" class="n">observed</th><th scope="col" class="n">limit</th><th scope="col">what to do</th></tr></thead>
            <tbody>{rows.Take(MostRows).Select(Row)}</tbody></table></div>{rest}
            """);
    }

    /// <summary>The most probable of a verdict's three probabilities.</summary>
    public static double Largest(Verdict verdict) => Math.Max(verdict.Within, Math.Max(verdict.Below, verdict.Above));

    private static Markup Row(Finding finding) => Markup.Of($"""
        <tr><td>{(finding.Severity == Severity.Fault ? Markup.Of($"<b>{Words.Of(finding.Severity)}</b>") : Markup.Of($"{Words.Of(finding.Severity)}"))}</td><td><code>{finding.Code}</code></td><td>{finding.Message}</td><td>{finding.Where.ToString()}</td><td class="n">{Amount(finding.Observed)}</td><td class="n">{Amount(finding.Limit)}</td><td>{finding.Kind.WhatToDo}</td></tr>
        """);

    private static string Amount(double? number) => number is { } known && double.IsFinite(known) ? Rounding.Digits(known, 4) : Figures.Nothing;
}
