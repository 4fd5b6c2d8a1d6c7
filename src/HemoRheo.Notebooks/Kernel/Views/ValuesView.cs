namespace HemoRheo.Notebooks;

/// <summary>Values with their intervals and verdicts, one row each.</summary>
internal static class ValuesView
{
    /// <summary>Values with their verdicts.</summary>
    public static Table Table(IEnumerable<JudgedValue> values) => HemoRheo.Table.Of("measurand", "law", "basis", "value", "lower", "upper", "unit", "interpolated", "outcome", "p below", "p within", "p above", "marked")
        .WithRows(values, value =>
        [
            .. Start(value.Value),
            value.Verdict is { } verdict ? Words.Of(verdict.Outcome) : "not judged",
            .. Probabilities(value.Verdict),
            value.Marked,
        ]);

    /// <summary>Values before judgment.</summary>
    public static Table Table(IEnumerable<SampleValue> values) => HemoRheo.Table.Of("measurand", "law", "basis", "value", "lower", "upper", "unit", "interpolated", "decidable")
        .WithRows(values, value => [.. Start(value), value.Decidable]);

    private static Cell[] Start(SampleValue value)
    {
        var interval = value.Interval();
        var quarter = Math.Abs(interval.Upper - interval.Lower) / 4;
        return [value.Measurand.Name, value.Law, Words.Short(value.Basis), Number(value.Shown), Number(interval.Lower), Number(interval.Upper), value.Measurand.Shown.Symbol, value.Interpolated is { } read ? Number(value.Measurand.ToShown(read)) : Cell.Empty];

        Cell Number(double x) => double.IsFinite(x) && double.IsFinite(quarter) ? Cell.Rounded(x, quarter) : "not finite";
    }

    private static Cell[] Probabilities(Verdict? verdict) => verdict is null
        ? [Cell.Empty, Cell.Empty, Cell.Empty]
        : [Share(verdict.Below), Share(verdict.Within), Share(verdict.Above)];

    private static Cell Share(double probability) => Cell.Rounded(probability, probability.ToString("0.000", System.Globalization.CultureInfo.InvariantCulture));
}
