using System.Globalization;
using OxyPlot;
using OxyPlot.Annotations;
using OxyPlot.Series;
using Plotly.NET;

namespace HemoRheo.Notebooks;

/// <summary>Turns the model of a still picture into a figure that can be zoomed and asked with the pointer. What it shows is the same.</summary>
/// <remarks>Property names are those of plotly.js. A text in a point's Tag is shown when the pointer is on it.</remarks>
internal static class PlotlyFigure
{
    /// <summary>The figure.</summary>
    /// <param name="model">The picture.</param>
    /// <param name="height">Its height, in pixels.</param>
    public static GenericChart Of(PlotModel model, int height)
    {
        ((IPlotModel)model).Update(true);
        var axes = new PlotlyAxes(model);
        var boxes = model.Annotations.OfType<RectangleAnnotation>().ToArray();
        var grounds = boxes.Select(box => Ground(box, axes)).Concat(boxes.Where(box => !string.IsNullOrEmpty(box.Text)).Select(box => Text(box, axes)));
        var traces = grounds.Concat(model.Series.Select(series => Of(series, axes))).ToArray();
        return GenericChart.setLayout(Layout(axes, height), GenericChart.ofTraceObjects<IEnumerable<Trace>>(false, traces));
    }

    private static Trace Of(Series series, PlotlyAxes axes) => series switch
    {
        AreaSeries area => Area(area, axes),
        LineSeries line => Line(line, axes),
        ScatterSeries points => Points(points, axes),
        RectangleBarSeries bars => Bars(bars, axes),
        _ => throw new InvalidOperationException($"A {series.GetType().Name} has no interactive form; draw it with lines, points, areas or rectangles."),
    };

    private static Trace Line(LineSeries line, PlotlyAxes axes)
    {
        var trace = Named(line, "lines");
        Place(trace, line.Points, axes);
        trace.SetProperty("line", new { color = Css(line.Color), width = line.StrokeThickness, dash = Dash(line.LineStyle) });
        trace.SetProperty("hoverinfo", line.RenderInLegend ? "name+x+y" : "skip");
        return trace;
    }

    private static Trace Area(AreaSeries area, PlotlyAxes axes)
    {
        var trace = Filled(area.ActualFill, area);
        Place(trace, [.. area.Points, .. area.Points2.Reverse<DataPoint>()], axes);
        return trace;
    }

    private static Trace Bars(RectangleBarSeries bars, PlotlyAxes axes)
    {
        var trace = Filled(bars.FillColor, bars);
        trace.SetProperty("line", new { color = Css(bars.StrokeColor), width = bars.StrokeThickness });
        Place(trace, [.. bars.Items.SelectMany(bar => Corners(bar.X0, bar.Y0, bar.X1, bar.Y1))], axes);
        return trace;
    }

    private static Trace Ground(RectangleAnnotation box, PlotlyAxes axes)
    {
        var (left, right) = axes.X.Within(box.MinimumX, box.MaximumX);
        var (bottom, top) = axes.Y.Within(box.MinimumY, box.MaximumY);
        var trace = Filled(box.Fill, null);
        Place(trace, [.. Corners(left, bottom, right, top)], axes);
        return trace;
    }

    private static Trace Text(RectangleAnnotation box, PlotlyAxes axes)
    {
        var (left, right) = axes.X.Within(box.MinimumX, box.MaximumX);
        var (bottom, top) = axes.Y.Within(box.MinimumY, box.MaximumY);
        var trace = new Trace("scatter");
        trace.SetProperty("mode", "text");
        trace.SetProperty("text", new[] { Escaped(box.Text) });
        trace.SetProperty("showlegend", false);
        trace.SetProperty("hoverinfo", "skip");
        Place(trace, [new((left + right) / 2, bottom + 0.05 * (top - bottom))], axes);
        return trace;
    }

    private static Trace Points(ScatterSeries points, PlotlyAxes axes)
    {
        var trace = Named(points, "markers");
        var open = points.MarkerType is MarkerType.Cross or MarkerType.Plus;
        Place(trace, [.. points.Points.Select(point => new DataPoint(point.X, point.Y))], axes);
        trace.SetProperty("marker", new
        {
            symbol = Symbol(points.MarkerType),
            size = 2 * points.MarkerSize,
            color = Css(open ? points.MarkerStroke : points.MarkerFill),
            line = new { width = points.MarkerStrokeThickness, color = Css(points.MarkerStroke) },
        });
        if (points.Points.Any(point => point.Tag is string))
        {
            trace.SetProperty("text", points.Points.Select(point => Escaped(point.Tag as string)).ToArray());
            trace.SetProperty("hovertemplate", "%{text}<extra></extra>");
        }

        return trace;
    }

    private static Trace Named(Series series, string mode)
    {
        var trace = new Trace("scatter");
        trace.SetProperty("mode", mode);
        trace.SetProperty("name", Escaped(series.Title));
        trace.SetProperty("showlegend", series.RenderInLegend && series.Title is not null);
        return trace;
    }

    private static Trace Filled(OxyColor fill, Series? series)
    {
        var trace = new Trace("scatter");
        trace.SetProperty("mode", "lines");
        trace.SetProperty("fill", "toself");
        trace.SetProperty("fillcolor", Css(fill));
        trace.SetProperty("line", new { width = 0, color = Css(fill) });
        trace.SetProperty("name", Escaped(series?.Title));
        trace.SetProperty("showlegend", series is { RenderInLegend: true, Title: not null });
        trace.SetProperty("hoverinfo", "skip");
        return trace;
    }

    private static void Place(Trace trace, IReadOnlyList<DataPoint> points, PlotlyAxes axes)
    {
        trace.SetProperty("x", points.Select(point => axes.X.Place(point.X)).ToArray());
        trace.SetProperty("y", points.Select(point => axes.Y.Place(point.Y)).ToArray());
    }

    private static DataPoint[] Corners(double x0, double y0, double x1, double y1) => [new(x0, y0), new(x1, y0), new(x1, y1), new(x0, y1), new(x0, y0), DataPoint.Undefined];

    private static Plotly.NET.Layout Layout(PlotlyAxes axes, int height)
    {
        var layout = new Plotly.NET.Layout();
        layout.SetProperty("width", Still.Width);
        layout.SetProperty("height", height + 40);
        layout.SetProperty("xaxis", axes.X.Properties());
        layout.SetProperty("yaxis", axes.Y.Properties());
        layout.SetProperty("font", new { family = "Arial, sans-serif", size = 13, color = Css(Ink.Text) });
        layout.SetProperty("legend", new { orientation = "h", x = 0, yref = "container", y = 0, yanchor = "bottom", font = new { size = 12 } });
        layout.SetProperty("margin", new { l = 70, r = 20, t = 30, b = 95 });
        layout.SetProperty("hovermode", "closest");
        layout.SetProperty("plot_bgcolor", "white");
        layout.SetProperty("paper_bgcolor", "white");
        return layout;
    }

    /// <summary>Labels take a few tags of markup, so text from files must not look like one.</summary>
    public static string Escaped(string? text) => (text ?? "").Replace("&", "&amp;", StringComparison.Ordinal).Replace("<", "&lt;", StringComparison.Ordinal).Replace("\n", "<br>", StringComparison.Ordinal);

    public static string Css(OxyColor color) => string.Create(CultureInfo.InvariantCulture, $"rgba({color.R},{color.G},{color.B},{color.A / 255.0:0.###})");

    private static string Dash(LineStyle style) => style switch { LineStyle.Dash => "dash", LineStyle.Dot => "dot", LineStyle.DashDot => "dashdot", _ => "solid" };

    private static string Symbol(MarkerType marker) => marker switch
    {
        MarkerType.Square => "square",
        MarkerType.Triangle => "triangle-up",
        MarkerType.Diamond => "diamond",
        MarkerType.Cross => "x-thin",
        MarkerType.Plus => "cross-thin",
        _ => "circle",
    };
}
