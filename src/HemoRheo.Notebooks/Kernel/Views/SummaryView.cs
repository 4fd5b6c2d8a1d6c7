namespace HemoRheo.Notebooks;

/// <summary>Two groups side by side, measurand by measurand.</summary>
internal static class SummaryView
{
    public static Table Groups(CohortSummary summary) => Table.Of("measurand", "law", "basis", "group", "samples", "n", "set aside", "reasons", "mean", "lower", "upper", "unit").WithRows(
        summary.Measurands.SelectMany(one => new[] { (one, group: one.First), (one, group: one.Second) }),
        row =>
        [
            row.one.Measurand.Name,
            row.one.Law,
            Words.Short(row.one.Basis),
            row.group.Label,
            row.group.Samples,
            row.group.Used,
            row.group.SetAside.Sum(reason => reason.Count),
            string.Join(", ", row.group.SetAside.Select(reason => $"{reason.Code} ({reason.Count})")),
            .. Shown(row.group.Mean, row.one.Measurand.ToShown),
            row.one.Measurand.Shown.Symbol,
        ]);

    public static Table Differences(CohortSummary summary) => Table.Of("measurand", "law", "basis", "question", "ratio", "ratio lower", "ratio upper", "probability", "method", "reason").WithRows(
        summary.Measurands.Where(one => one.Measurand.Logarithmic).SelectMany(one => new[] { one.Total, one.Adjusted }.OfType<GroupDifference>().Select(difference => (one, difference))),
        row =>
        [
            row.one.Measurand.Name,
            row.one.Law,
            Words.Short(row.one.Basis),
            row.difference.Question,
            .. Shown(row.difference.Difference, Math.Exp),
            row.difference.Probability is { } p ? Cell.Rounded(p, Rounding.Digits(p, 2)) : Cell.Empty,
            row.difference.Method,
            row.difference.WhyNot,
        ]);

    public static Markup Of(CohortSummary summary) => Markup.Of($"""
        {TableMarkup.Of(Groups(summary), $"{summary.Study} by {summary.By}: means with 95 % intervals")}{TableMarkup.Of(Differences(summary), "Second group over first, with 95 % intervals")}<ul>{summary.Cautions.Select(caution => Markup.Of($"<li>{caution}</li>"))}</ul>
        {FindingsView.Folded(summary.Findings)}<p><i>{ResearchUse.Caution}</i></p>
        """);

    private static Cell[] Shown(Value? value, Func<double, double> toShown)
    {
        if (value is null) return [Cell.Empty, Cell.Empty, Cell.Empty];
        var interval = value.Interval().Select(toShown);
        var quarter = Math.Abs(interval.Upper - interval.Lower) / 4;
        return [Cell.Rounded(toShown(value.X), quarter), Cell.Rounded(interval.Lower, quarter), Cell.Rounded(interval.Upper, quarter)];
    }
}
