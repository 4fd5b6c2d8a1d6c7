using System.Globalization;
using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Legends;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>The common look of still pictures, and their SVG text. The same model gives the same text, byte for byte.</summary>
internal static class Still
{
    /// <summary>Width of every picture, in pixels.</summary>
    public const int Width = 700;

    private const double FontSize = 13;

    /// <summary>An empty picture.</summary>
    public static PlotModel Model() => new()
    {
        DefaultFont = "Arial",
        DefaultFontSize = FontSize,
        TextColor = Ink.Text,
        PlotAreaBorderColor = Ink.Muted,
        PlotAreaBorderThickness = new(1, 0, 0, 1),
        Background = OxyColors.White,
        Padding = new(8, 8, 16, 12),
        Culture = CultureInfo.InvariantCulture,
    };

    /// <summary>A logarithmic axis.</summary>
    public static LogAxis Log(AxisPosition position, string title, double lowest, double highest) => Styled(new LogAxis(position, title) { Minimum = lowest, Maximum = highest });

    /// <summary>A linear axis.</summary>
    public static LinearAxis Linear(AxisPosition position, string title, double lowest, double highest) =>
        Styled(new LinearAxis { Position = position, Title = title, Minimum = lowest, Maximum = highest });

    /// <summary>An axis of names, the first on top.</summary>
    public static LinearAxis Names(IReadOnlyList<string> names) => Styled(new LinearAxis
    {
        Position = AxisPosition.Left,
        Minimum = -0.6,
        Maximum = names.Count - 0.4,
        StartPosition = 1,
        EndPosition = 0,
        MajorStep = 1,
        MinorStep = 1,
        MinimumMajorStep = 1,
        TickStyle = TickStyle.None,
        LabelFormatter = place => place == Math.Round(place) && place >= 0 && place < names.Count ? names[(int)place] : "",
    });

    /// <summary>Gives an axis the common look.</summary>
    public static TAxis Styled<TAxis>(TAxis axis)
        where TAxis : Axis
    {
        axis.MajorGridlineStyle = LineStyle.Solid;
        axis.MajorGridlineColor = Ink.Grid;
        axis.AxislineColor = Ink.Muted;
        axis.TicklineColor = Ink.Muted;
        axis.MinorTicklineColor = Ink.Muted;
        axis.AxisTitleDistance = axis.IsHorizontal() ? 6 : 10;
        axis.TitleFontSize = FontSize;
        axis.IsZoomEnabled = false;
        axis.IsPanEnabled = false;
        return axis;
    }

    /// <summary>A legend below the picture's axes.</summary>
    public static Legend Legend() => new()
    {
        LegendPlacement = LegendPlacement.Outside,
        LegendPosition = LegendPosition.BottomLeft,
        LegendOrientation = LegendOrientation.Horizontal,
        LegendBorder = OxyColors.Transparent,
        LegendBackground = OxyColors.Transparent,
        LegendFontSize = 12,
        LegendSymbolLength = 22,
        LegendColumnSpacing = 18,
        LegendItemSpacing = 18,
        LegendPadding = 2,
        LegendMargin = 4,
        LegendMaxWidth = Width - 40,
    };

    /// <summary>A straight line between two points, without a place in the legend unless it is given a title.</summary>
    public static LineSeries Line(DataPoint from, DataPoint to, OxyColor color, LineStyle style = LineStyle.Solid, double width = 1, string? title = null)
    {
        var line = new LineSeries { Color = color, LineStyle = style, StrokeThickness = width, Title = title, RenderInLegend = title is not null };
        line.Points.Add(from);
        line.Points.Add(to);
        return line;
    }

    /// <summary>Horizontal or vertical intervals as plain strokes.</summary>
    public static LineSeries Strokes(IEnumerable<(DataPoint From, DataPoint To)> strokes, OxyColor color, double width = 1.4, string? title = null)
    {
        var line = new LineSeries { Color = color, StrokeThickness = width, Title = title, RenderInLegend = title is not null };
        foreach (var (from, to) in strokes) line.Points.AddRange([from, to, DataPoint.Undefined]);
        return line;
    }

    /// <summary>Points without a line.</summary>
    public static ScatterSeries Points(IEnumerable<DataPoint> points, OxyColor color, MarkerType marker, double size = 4, bool hollow = false, string? title = null) =>
        Points(points.Select(point => new ScatterPoint(point.X, point.Y)), color, marker, size, hollow, title);

    /// <summary>Points without a line, each with a text as its tag, which an interactive chart shows where the pointer is.</summary>
    public static ScatterSeries Points(IEnumerable<ScatterPoint> points, OxyColor color, MarkerType marker, double size = 4, bool hollow = false, string? title = null)
    {
        var open = marker is MarkerType.Cross or MarkerType.Plus;
        var series = new ScatterSeries
        {
            MarkerType = marker,
            MarkerSize = marker == MarkerType.Triangle ? 1.3 * size : size,
            MarkerFill = hollow ? OxyColors.White : color,
            MarkerStroke = hollow || open ? color : OxyColors.White,
            MarkerStrokeThickness = hollow || open ? 1.6 : 0.7,
            Title = title,
            RenderInLegend = title is not null,
        };
        series.Points.AddRange(points);
        return series;
    }

    /// <summary>The picture as SVG text.</summary>
    /// <param name="model">The picture.</param>
    /// <param name="height">Its height, in pixels.</param>
    public static string Svg(PlotModel model, int height)
    {
        var exporter = new SvgExporter { Width = Width, Height = height, IsDocument = false, UseVerticalTextAlignmentWorkaround = true, TextMeasurer = new PixelText() };
        return exporter.ExportToString(model);
    }
}
