using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>What the uncertainty of some values is made of: bars of each kind of source, side by side.</summary>
internal static class BudgetChart
{
    /// <summary>The most values one picture shows.</summary>
    public const int Most = 3;

    private const double Thick = 0.24;

    /// <summary>Height of the picture, in pixels.</summary>
    public static int Height(IReadOnlyList<SampleValue> values) => 120 + 36 * (Kinds(values).Length + 1);

    /// <summary>The picture.</summary>
    /// <param name="values">Up to three values on the logarithmic scale; others are left out.</param>
    public static string Svg(IReadOnlyList<SampleValue> values) => Still.Svg(Model(values), Height(values));

    /// <summary>The picture's model, which the interactive chart is made of too.</summary>
    public static PlotModel Model(IReadOnlyList<SampleValue> values)
    {
        var shown = values.Where(value => value.Measurand.Logarithmic).Take(Most).ToArray();
        var kinds = Kinds(shown);
        var highest = shown.Select(value => 100 * value.Value.StandardUncertainty).DefaultIfEmpty(1).Max() * 1.06;

        var model = Still.Model();
        model.Axes.Add(Still.Names([.. kinds.Select(Name), "together"]));
        model.Axes.Add(Still.Linear(AxisPosition.Bottom, "size of the contribution, % of the value (one standard uncertainty)", 0, highest));
        model.Legends.Add(Still.Legend());
        for (var i = 0; i < shown.Length; i++)
        {
            var offset = (i - (shown.Length - 1) / 2.0) * (Thick + 0.04);
            var sizes = kinds.Select(kind => Math.Abs(shown[i].Value.Part(kind) ?? 0)).Append(shown[i].Value.StandardUncertainty);
            var bars = new RectangleBarSeries { FillColor = Fill(i), StrokeColor = Ink.Text, StrokeThickness = 0.7, Title = $"{shown[i].Measurand.Symbol}, {Words.Short(shown[i].Basis)}" };
            foreach (var (size, place) in sizes.Select((size, place) => (size, place)))
            {
                bars.Items.Add(new(0, place + offset - Thick / 2, 100 * size, place + offset + Thick / 2));
            }

            model.Series.Add(bars);
        }

        return model;
    }

    private static SourceKind[] Kinds(IReadOnlyList<SampleValue> values) => [.. values.SelectMany(value => value.Value.Parts).Select(part => part.Source.Kind).Distinct().Order()];

    private static string Name(SourceKind kind) => new Source(kind, "").Shared ? $"{kind.Words()} (shared)" : kind.Words();

    private static OxyColor Fill(int index) => index switch { 0 => Ink.Accent, 1 => Ink.LimitInterval, _ => OxyColors.White };
}
