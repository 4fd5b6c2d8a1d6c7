using OxyPlot;
using OxyPlot.Annotations;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>
/// A control chart: the error of each check with its 95 % interval, center and limits, the weighted average, checks that signal by shape, adjustments, and when the instrument changed as a band.
/// </summary>
internal static class ControlChartPicture
{
    /// <summary>Height of the picture in a notebook, in pixels.</summary>
    public const int Height = 380;

    /// <summary>Height of the picture on the weekly page, in pixels.</summary>
    public const int LowHeight = 235;

    /// <summary>Most checks that are drawn: the last ones.</summary>
    public const int Most = 60;

    /// <summary>The picture as SVG text.</summary>
    public static string Svg(ControlChart chart, double? limit = null) => Still.Svg(Model(chart, limit), LowHeight);

    /// <summary>The picture's model, which the interactive chart is made of too.</summary>
    /// <param name="chart">A chart with at least one check.</param>
    /// <param name="limit">How far a check may be off; null: not drawn.</param>
    public static PlotModel Model(ControlChart chart, double? limit)
    {
        var drawn = Drawn(chart);
        var points = drawn.SelectMany(segment => segment.Points).ToArray();
        var aside = Math.Max(1.5, 0.02 * (points[^1].Check.At - points[0].Check.At).TotalDays);
        var (from, until) = (points[0].Check.At.AddDays(-aside), points[^1].Check.At.AddDays(aside));
        var reach = 1.12 * points.SelectMany(Heights).Append(limit is { } allowed ? 100 * allowed : 0).Max();

        var model = Still.Model();
        model.Axes.Add(Still.Styled(new DateTimeAxis
        {
            Position = AxisPosition.Bottom,
            Title = "date of the check",
            Minimum = Place(from),
            Maximum = Place(until),
            StringFormat = "yyyy-MM-dd",
            MajorStep = Math.Max(1, Math.Ceiling((until - from).TotalDays / 6)),
            MinorIntervalType = DateTimeIntervalType.Days,
            IntervalType = DateTimeIntervalType.Days,
        }));
        model.Axes.Add(Still.Linear(AxisPosition.Left, "error of the check, %", -reach, reach));
        model.Legends.Add(Still.Legend());
        foreach (var segment in drawn) Ground(model, segment, Place(from), Place(until), reach);
        if (limit is { } most) Limit(model, 100 * most, Place(from), Place(until));
        Lines(model, drawn);
        Points(model, points);
        return model;
    }

    private static ChartSegment[] Drawn(ControlChart chart)
    {
        var left = Most;
        var drawn = new List<ChartSegment>();
        foreach (var segment in chart.Segments.Reverse())
        {
            if (left == 0 || segment.Points.Count == 0) continue;
            drawn.Insert(0, segment with { Points = segment.Points.TakeLast(left).ToItems() });
            left -= drawn[0].Points.Count;
        }

        return [.. drawn];
    }

    private static void Ground(PlotModel model, ChartSegment segment, double left, double right, double reach)
    {
        if (segment.From is { } adjusted && Place(adjusted) > left)
        {
            model.Series.Add(Still.Line(new(Place(adjusted), -reach), new(Place(adjusted), reach), Ink.Text, LineStyle.Dot, title: model.Series.Any(series => series.Title == "adjusted") ? null : "adjusted"));
        }

        if (segment.Changes is not { } changes) return;
        var latest = changes.Step.Latest > changes.Drift.Latest ? changes.Step.Latest : changes.Drift.Latest;
        var (from, until) = (Math.Max(left, Place(changes.Earliest)), Math.Min(right, Place(latest)));
        if (until <= from) return;
        model.Annotations.Add(new RectangleAnnotation
        {
            MinimumX = from,
            MaximumX = until,
            MinimumY = -reach,
            MaximumY = reach,
            Fill = Ink.Doubt,
            Layer = AnnotationLayer.BelowAxes,
            Text = "it changed in here",
            TextColor = Ink.Text,
            TextPosition = new((from + until) / 2, -reach * 0.92),
            TextVerticalAlignment = VerticalAlignment.Bottom,
        });
    }

    private static void Limit(PlotModel model, double limit, double left, double right)
    {
        model.Series.Add(Still.Line(new(left, limit), new(right, limit), Ink.Text, LineStyle.Solid, 1.6, "allowed"));
        model.Series.Add(Still.Line(new(left, -limit), new(right, -limit), Ink.Text, LineStyle.Solid, 1.6));
    }

    private static void Lines(PlotModel model, ChartSegment[] segments)
    {
        var center = Line("center", Ink.Muted, LineStyle.Solid);
        var lower = Line(null, Ink.Accent, LineStyle.Dash);
        var upper = Line("limits of chance", Ink.Accent, LineStyle.Dash);
        var average = Line("weighted average", Ink.Alert, LineStyle.DashDot);
        foreach (var segment in segments)
        {
            foreach (var point in segment.Points)
            {
                var x = Place(point.Check.At);
                if (segment.Baseline is { } baseline) center.Points.Add(new(x, Percent(baseline.Center.X)));
                if (point.Limits is { } limits)
                {
                    lower.Points.Add(new(x, Percent(limits.Lower)));
                    upper.Points.Add(new(x, Percent(limits.Upper)));
                }

                if (point.Average is { } mean) average.Points.Add(new(x, Percent(mean)));
            }

            foreach (var line in (LineSeries[])[center, lower, upper, average]) line.Points.Add(DataPoint.Undefined);
        }

        foreach (var line in ((LineSeries[])[center, lower, upper, average]).Where(line => line.Points.Any(point => point.IsDefined()))) model.Series.Add(line);
    }

    private static LineSeries Line(string? title, OxyColor color, LineStyle style) =>
        new() { Color = color, LineStyle = style, StrokeThickness = 1.2, Title = title, RenderInLegend = title is not null };

    private static void Points(PlotModel model, ChartPoint[] points)
    {
        model.Series.Add(Still.Strokes(points.Select(point => (Ends(point), Place(point.Check.At))).Select(one => (new DataPoint(one.Item2, one.Item1.Lower), new DataPoint(one.Item2, one.Item1.Upper))), Ink.Muted));
        foreach (var kind in points.GroupBy(KindOf).OrderBy(kind => kind.Key))
        {
            var (marker, title) = kind.Key switch
            {
                Kind.Steady => (MarkerType.Circle, "check"),
                Kind.SlowDrift => (MarkerType.Diamond, "slow drift"),
                Kind.TwoOfThree => (MarkerType.Triangle, "two of three far out"),
                Kind.Beyond => (MarkerType.Square, "beyond the limits of chance"),
                _ => (MarkerType.Cross, "failed"),
            };
            var color = kind.Key == Kind.Steady ? Ink.Accent : Ink.Alert;
            model.Series.Add(Still.Points(kind.Select(point => new ScatterPoint(Place(point.Check.At), Percent(point.Check.Error.X), tag: PointWords.Of(point))), color, marker, kind.Key == Kind.Steady ? 4 : 5.5, title: title));
        }
    }

    private static Kind KindOf(ChartPoint point) => point switch
    {
        { Check.Outcome: CheckOutcome.Fails } => Kind.Failed,
        _ when point.Breaks.Contains(ChartRule.BeyondLimits) => Kind.Beyond,
        _ when point.Breaks.Contains(ChartRule.TwoOfThree) => Kind.TwoOfThree,
        _ when point.Breaks.Contains(ChartRule.WeightedAverage) => Kind.SlowDrift,
        _ => Kind.Steady,
    };

    private static IEnumerable<double> Heights(ChartPoint point)
    {
        var ends = Ends(point);
        yield return Math.Abs(ends.Lower);
        yield return Math.Abs(ends.Upper);
        if (point.Limits is not { } limits) yield break;
        // Provisional limits of few checks are wide and would leave the checks no room.
        var (lower, upper) = (Math.Abs(Percent(limits.Lower)), Math.Abs(Percent(limits.Upper)));
        if (!point.InBaseline) yield return Math.Max(lower, upper);
    }

    private static Interval Ends(ChartPoint point) => point.Check.Error.Interval().Select(Percent);

    private static double Percent(double logError) => 100 * (Math.Exp(logError) - 1);

    private static double Place(DateTimeOffset moment) => DateTimeAxis.ToDouble(moment.DateTime);

    private enum Kind
    {
        Steady,
        SlowDrift,
        TwoOfThree,
        Beyond,
        Failed,
    }
}
