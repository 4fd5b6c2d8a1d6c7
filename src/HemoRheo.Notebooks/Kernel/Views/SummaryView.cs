namespace HemoRheo.Notebooks;

/// <summary>Two groups side by side, measurand by measurand.</summary>
internal static class SummaryView
{
    private static Table Groups(IEnumerable<MeasurandSummary> measurands) => Table.Of("measurand", "law", "basis", "group", "samples", "n", "set aside", "reasons", "mean", "lower", "upper", "unit").WithRows(
        measurands.SelectMany(one => new[] { (one, group: one.First), (one, group: one.Second) }),
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

    private static Table Differences(IEnumerable<MeasurandSummary> measurands) => Table.Of("measurand", "law", "basis", "question", "ratio", "ratio lower", "ratio upper", "probability").WithRows(
        Questions(measurands.Where(one => one.Measurand.Logarithmic)),
        row =>
        [
            row.One.Measurand.Name,
            row.One.Law,
            Words.Short(row.One.Basis),
            row.Difference.Question,
            .. Shown(row.Difference.Difference, Math.Exp),
            row.Difference.Probability is { } p ? Cell.Rounded(p, Figures.Probability(p)) : Cell.Empty,
        ]);

    private static Table Methods(IEnumerable<MeasurandSummary> measurands) => Table.Of("measurand", "law", "basis", "question", "method", "reason").WithRows(
        Questions(measurands),
        row => [row.One.Measurand.Name, row.One.Law, Words.Short(row.One.Basis), row.Difference.Question, row.Difference.Method, row.Difference.WhyNot]);

    private static IEnumerable<(MeasurandSummary One, GroupDifference Difference)> Questions(IEnumerable<MeasurandSummary> measurands) =>
        measurands.SelectMany(one => new[] { one.Total, one.Adjusted }.OfType<GroupDifference>().Select(difference => (one, difference)));

    public static Markup Of(CohortSummary summary)
    {
        var compared = summary.Measurands.Where(one => one.Total.Difference is not null).ToArray();
        var others = summary.Measurands.Except(compared).ToArray();
        return Markup.Of($"""
            {TableMarkup.Of(Groups(compared), $"{summary.Study} by {summary.By}: means with 95 % intervals")}{TableMarkup.Of(Differences(compared), "Second group over first, with 95 % intervals")}{TableMarkup.Folded(Groups(others), $"{others.Length} that could not be compared")}{TableMarkup.Folded(Methods(summary.Measurands), "How each comparison was made, and why it could not be")}<ul>{summary.Cautions.Select(caution => Markup.Of($"<li>{caution}</li>"))}</ul>
            {FindingsView.Folded(summary.Findings)}<p><i>{ResearchUse.Caution}</i></p>
            """);
    }

    private static Cell[] Shown(Value? value, Func<double, double> toShown)
    {
        if (value is null) return [Cell.Empty, Cell.Empty, Cell.Empty];
        var interval = value.Interval().Select(toShown);
        var quarter = Math.Abs(interval.Upper - interval.Lower) / 4;
        return [Cell.Rounded(toShown(value.X), quarter), Cell.Rounded(interval.Lower, quarter), Cell.Rounded(interval.Upper, quarter)];
    }
}
