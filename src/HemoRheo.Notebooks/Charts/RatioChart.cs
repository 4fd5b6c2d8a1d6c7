using OxyPlot;
using OxyPlot.Axes;

namespace HemoRheo.Notebooks;

/// <summary>Ratios of two groups with their intervals: one row a measurand and hematocrit basis, the adjusted ratio below the plain one.</summary>
internal static class RatioChart
{
    private const int Row = 40;
    private const int LongestLabels = 50;

    /// <summary>Height of the picture, in pixels.</summary>
    public static int Height(CohortSummary summary) => 110 + Row * Math.Max(1, Drawable(summary).Length);

    /// <summary>The picture. A quantity whose differences could not be had has no row.</summary>
    /// <param name="summary">The summary; differences on the logarithmic scale are drawn.</param>
    public static string Svg(CohortSummary summary) => Still.Svg(Model(summary), Height(summary));

    /// <summary>The picture's model, which the interactive chart is made of too.</summary>
    public static PlotModel Model(CohortSummary summary)
    {
        var rows = Drawable(summary);
        var intervals = rows.SelectMany(row => new[] { row.Total.Difference, row.Adjusted?.Difference }).OfType<Value>().Select(difference => difference.Interval().Select(Math.Exp)).ToArray();
        var lowest = Math.Min(0.95, intervals.Select(interval => interval.Lower).DefaultIfEmpty(1).Min() / 1.02);
        var highest = Math.Max(1.05, intervals.Select(interval => interval.Upper).DefaultIfEmpty(1).Max() * 1.02);

        var model = Still.Model();
        model.Axes.Add(Still.Names([.. rows.Select(row => $"{row.Measurand.Name}, {Words.Short(row.Basis)}")]));
        model.Axes.Add(Still.Log(AxisPosition.Bottom, $"ratio of means, {Labels(summary)} (bars: 95 % interval)", lowest, highest));
        model.Legends.Add(Still.Legend());
        model.Series.Add(Still.Line(new(1, -0.6), new(1, rows.Length - 0.4), Ink.Text, LineStyle.Dash, title: "no difference"));
        Add(model, rows, row => row.Total, -0.16, "as it is", Ink.Accent, MarkerType.Square);
        Add(model, rows, row => row.Adjusted, 0.16, "adjusted for hematocrit", Ink.Alert, MarkerType.Circle);
        return model;
    }

    private static MeasurandSummary[] Drawable(CohortSummary summary) => [.. summary.Measurands.Where(one => one.Measurand.Logarithmic && (one.Total.Difference is not null || one.Adjusted?.Difference is not null))];

    private static void Add(PlotModel model, MeasurandSummary[] rows, Func<MeasurandSummary, GroupDifference?> question, double offset, string title, OxyColor color, MarkerType marker)
    {
        var places = Enumerable.Range(0, rows.Length).Where(place => question(rows[place])?.Difference is not null).ToArray();
        if (places.Length == 0) return;
        var differences = places.Select(place => question(rows[place])!.Difference!).ToArray();
        var reach = differences.Select(difference => difference.Interval().Select(Math.Exp)).ToArray();
        model.Series.Add(Still.Strokes(places.Select((place, i) => (new DataPoint(reach[i].Lower, place + offset), new DataPoint(reach[i].Upper, place + offset))), color, 2));
        model.Series.Add(Still.Points(places.Select((place, i) => new DataPoint(Math.Exp(differences[i].X), place + offset)), color, marker, 5, title: title));
    }

    private static string Labels(CohortSummary summary) =>
        summary.Measurands is [var one, ..] && one.First.Label.Length + one.Second.Label.Length <= LongestLabels ? $"{one.Second.Label} over {one.First.Label}" : "second group over first";
}
