using System.Globalization;
using OxyPlot.Axes;

namespace HemoRheo.Notebooks;

/// <summary>One axis of a picture, as a figure takes it: logarithmic, linear, of dates or of names.</summary>
internal sealed class PlotlyAxis(Axis axis)
{
    private static readonly double[] Steps = [1, 2, 5];

    private bool Logarithmic => axis is LogarithmicAxis;

    private bool OfNames => axis is LinearAxis { LabelFormatter: not null } and not DateTimeAxis;

    /// <summary>A number of the picture as the figure takes it; null where there is none.</summary>
    public object? Place(double number) => !double.IsFinite(number) ? null : axis is DateTimeAxis ? Date(number) : number;

    /// <summary>Two ends, held within the axis.</summary>
    public (double Lower, double Upper) Within(double lower, double upper) =>
        (Math.Max(double.IsFinite(lower) ? lower : axis.ActualMinimum, axis.ActualMinimum), Math.Min(double.IsFinite(upper) ? upper : axis.ActualMaximum, axis.ActualMaximum));

    /// <summary>Its properties.</summary>
    public Dictionary<string, object> Properties()
    {
        var properties = new Dictionary<string, object>
        {
            ["title"] = new { text = PlotlyFigure.Escaped(axis.Title), font = new { size = 13 }, standoff = 8 },
            ["type"] = Logarithmic ? "log" : axis is DateTimeAxis ? "date" : "linear",
            ["range"] = Range(),
            ["gridcolor"] = PlotlyFigure.Css(Ink.Grid),
            ["linecolor"] = PlotlyFigure.Css(Ink.Muted),
            ["ticks"] = OfNames ? "" : "outside",
            ["zeroline"] = false,
            ["automargin"] = true,
        };
        if (axis is DateTimeAxis) properties["tickformat"] = "%Y-%m-%d";
        if (Logarithmic) Label(properties, Ticks());
        if (OfNames) Label(properties, Enumerable.Range(0, 1 + (int)Math.Max(0, Math.Floor(axis.ActualMaximum))).Select(place => (double)place));
        return properties;
    }

    private void Label(Dictionary<string, object> properties, IEnumerable<double> places)
    {
        var ticks = places.ToArray();
        properties["tickmode"] = "array";
        properties["tickvals"] = ticks;
        properties["ticktext"] = ticks.Select(tick => PlotlyFigure.Escaped(axis.FormatValue(tick))).ToArray();
    }

    /// <summary>Ticks of the picture where it covers little; else 1, 2 and 5 of every decade, so that there are some after zooming too.</summary>
    private IEnumerable<double> Ticks()
    {
        var first = (int)Math.Floor(Math.Log10(axis.ActualMinimum));
        var decades = Math.Log10(axis.ActualMaximum / axis.ActualMinimum);
        if (decades > 0.7) return Enumerable.Range(first - 1, (int)Math.Ceiling(decades) + 3).SelectMany(decade => Steps.Select(step => step * Math.Pow(10, decade)));
        axis.GetTickValues(out var labels, out _, out _);
        return labels;
    }

    private object[] Range()
    {
        var ends = new[] { axis.ActualMinimum, axis.ActualMaximum };
        if (axis.StartPosition > axis.EndPosition) Array.Reverse(ends);
        return [.. ends.Select(end => Logarithmic ? Math.Log10(end) : Place(end)!)];
    }

    private static string Date(double number) => DateTimeAxis.ToDateTime(number, TimeSpan.FromSeconds(1)).ToString("yyyy-MM-dd HH:mm:ss", CultureInfo.InvariantCulture);
}
