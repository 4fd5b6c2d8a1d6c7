using System.Globalization;

namespace HemoRheo.Notebooks;

/// <summary>The uncertainty budget of a value, line by line: one line a kind of source, largest first.</summary>
internal static class BudgetView
{
    /// <summary>The budget of a value of a sample, in per cent where its scale is logarithmic, else in its unit.</summary>
    public static Table Table(SampleValue value)
    {
        var logarithmic = value.Measurand.Logarithmic;
        var factor = logarithmic ? 100 : 1 / value.Measurand.Shown.Factor;
        return HemoRheo.Table.Of("source", logarithmic ? "relative contribution" : "contribution", "share", "degrees of freedom", "shared")
            .WithRows(Lines(value.Value), line =>
            [
                line.Name,
                Amount(factor * line.Amount),
                Share(100 * line.Amount * line.Amount / value.Value.Variance),
                Cell.Rounded(line.DegreesOfFreedom, Figures.Freedom(line.DegreesOfFreedom)),
                line.Shared,
            ]);
    }

    public static Markup Of(SampleValue value) => Markup.Of($"""
        {TableMarkup.Of(Table(value), value.ToString())}<p>{Sum(value)} Shared parts are not averaged away in a mean of samples.</p>
        {FindingsView.Folded(value.Findings)}<p><i>{ResearchUse.Caution}</i></p>
        """);

    public static Markup Of(JudgedValue value) => Markup.Of($"<p>{Verdict(value)}</p>\n{Of(value.Value)}");

    private static string Sum(SampleValue value)
    {
        var u = value.Value.StandardUncertainty;
        var size = value.Measurand.Logarithmic ? $"{Rounding.Uncertainty(100 * u)} %" : $"{Rounding.Uncertainty(u / value.Measurand.Shown.Factor)} {value.Measurand.Shown}";
        return $"Together: standard uncertainty {size}, {Figures.Freedom(value.Value.DegreesOfFreedom)} degrees of freedom.";
    }

    private static string Verdict(JudgedValue value) => value.Verdict is { } verdict
        ? string.Create(CultureInfo.InvariantCulture, $"Verdict: {Words.Of(verdict.Outcome)} (probability below {verdict.Below:0.000}, within {verdict.Within:0.000}, above {verdict.Above:0.000}; {verdict.Level:0.##} decides).") + (value.Marked ? " Marked: the instrument was not in order." : "") + (value.ChangesWithLimits ? " It would change within the limits' own intervals." : "")
        : $"Not judged: {value.WhyNotJudged}";

    private static Cell Amount(double amount) => Cell.Rounded(amount, amount == 0 ? "0" : amount < 0 ? $"-{Rounding.Uncertainty(-amount)}" : Rounding.Uncertainty(amount));

    private static Cell Share(double percent) => Cell.Rounded(percent, percent < 0.1 ? "< 0.1" : Figures.Fixed(percent, 1));

    private static BudgetLine[] Lines(Value value) => [.. value.Parts.GroupBy(part => part.Source.Kind)
        .Select(kind => new BudgetLine(Name(kind.Key, [.. kind.Select(part => part.Source.Of).Distinct()]), value.Part(kind.Key)!.Value, value.Only(source => source.Kind == kind.Key).DegreesOfFreedom, kind.First().Source.Shared))
        .OrderByDescending(line => Math.Abs(line.Amount))];

    private static string Name(SourceKind kind, string[] of) => of switch { [""] => kind.Words(), [var one] => $"{kind.Words()} of {one}", _ => $"{kind.Words()} ({of.Length} parts)" };
}
