namespace HemoRheo.Notebooks;

/// <summary>Intervals from one fit: what they say in words, then the numbers.</summary>
internal static class IntervalView
{
    public static Table Table(IEnumerable<FitInterval> intervals) => HemoRheo.Table.Of("measurand", "value", "lower end", "upper end", "unit", "method", "answer").WithRows(intervals, one =>
    [
        one.Name, Number(one, one.Estimate), Number(one, one.Lower), Number(one, one.Upper), one.Shown.Symbol, Words.Of(one.Method), Words.Of(one.Kind),
    ]);

    public static Markup Of(FitInterval interval) => Markup.Of($"""
        <p>{interval.ToString()}.</p>
        {(interval.Findings.Count == 0 ? Markup.None : FindingsView.Of(interval.Findings))}
        """);

    public static Markup Of(Items<FitInterval> intervals) => TableMarkup.Of(Table(intervals), "Intervals from one fit alone; a side that the shear rates leave open is empty");

    public static Markup Of(Profile profile) => Markup.Of($"""
        {Of(profile.Interval)}<p>{profile.Points.Count} points; <code>.Chart()</code> draws them.</p>
        """);

    private static Cell Number(FitInterval interval, double? si) => si is { } number && !double.IsNaN(number)
        ? interval is { Lower: { } lower, Upper: { } upper } && upper > lower ? Cell.Rounded(interval.Shown.FromSi(number), interval.Shown.FromSi(upper - lower) / 4) : interval.Shown.FromSi(number)
        : Cell.Empty;
}
