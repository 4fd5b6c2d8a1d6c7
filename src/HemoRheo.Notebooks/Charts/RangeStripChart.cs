using OxyPlot;
using OxyPlot.Annotations;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>Values against their reference range: one row a group or a measurand, the range as a band, the limits' own intervals darker.</summary>
internal static class RangeStripChart
{
    private const int RowHeight = 62;

    /// <summary>Height of the picture, in pixels.</summary>
    public static int Height(int rows) => 105 + RowHeight * Math.Max(1, rows);

    /// <summary>The picture.</summary>
    /// <param name="rows">Rows from top to bottom; their measurands share one unit and the logarithmic scale.</param>
    /// <param name="title">Title of the axis, with the unit.</param>
    /// <param name="whiskers">Whether each value's 95 % interval is drawn.</param>
    public static string Svg(IReadOnlyList<StripRow> rows, string title, bool whiskers) => Still.Svg(Model(rows, title, whiskers), Height(rows.Count));

    /// <summary>The picture's model, which the interactive chart is made of too.</summary>
    public static PlotModel Model(IReadOnlyList<StripRow> rows, string title, bool whiskers)
    {
        var (lowest, highest) = Reach(rows, whiskers);
        var model = Still.Model();
        model.Axes.Add(Still.Names([.. rows.Select(row => row.Name)]));
        model.Axes.Add(Still.Log(AxisPosition.Bottom, title, lowest, highest));
        model.Legends.Add(Still.Legend());
        foreach (var (row, place) in rows.Select((row, place) => (row, place)))
        {
            if (row.Range is not null) AddRange(model, row.Range, place);
        }

        foreach (var outcome in (Outcome?[])[Outcome.Within, Outcome.Below, Outcome.Above, Outcome.Undecided, null])
        {
            Add(model, rows, outcome, false, whiskers);
        }

        Add(model, rows, null, true, whiskers);
        return model;
    }

    private static void AddRange(PlotModel model, ReferenceRange range, int place)
    {
        var limits = range.Limits.Select(range.Measurand.ToShown);
        model.Annotations.Add(Box(limits, place, 0.42, Ink.Range));
        foreach (var limit in new[] { range.LowerLimit, range.UpperLimit }.OfType<Interval>())
        {
            model.Annotations.Add(Box(limit.Select(range.Measurand.ToShown), place, 0.42, Ink.LimitInterval));
        }

        foreach (var end in new[] { limits.Lower, limits.Upper }.Where(double.IsFinite))
        {
            model.Series.Add(Still.Line(new(end, place - 0.42), new(end, place + 0.42), Ink.Accent));
        }
    }

    private static void Add(PlotModel model, IReadOnlyList<StripRow> rows, Outcome? outcome, bool marked, bool whiskers)
    {
        var drawn = rows.SelectMany((row, place) => row.Values.Select((value, i) => (value, sample: row.SampleOf(i), row: place, at: place + Spread(i, row.Values.Count))))
            .Where(one => marked ? one.value.Marked : !one.value.Marked && one.value.Verdict?.Outcome == outcome).ToArray();
        if (drawn.Length == 0) return;
        var (marker, color, hollow, words) = Style(outcome, marked);
        if (whiskers)
        {
            model.Series.Add(Still.Strokes(drawn.Select(one => (one.value.Value.Interval(), one.at)).Select(one => (new DataPoint(one.Item1.Lower, one.at), new DataPoint(one.Item1.Upper, one.at))), color, 1.6));
        }

        model.Series.Add(Still.Points(drawn.Select(one => new ScatterPoint(one.value.Value.Shown, one.at, tag: PointWords.Of(one.sample, one.value))), color, marker, whiskers ? 6 : 4, hollow, words));
    }

    private static (MarkerType Marker, OxyColor Color, bool Hollow, string Words) Style(Outcome? outcome, bool marked) => (outcome, marked) switch
    {
        (_, true) => (MarkerType.Cross, Ink.Muted, false, "instrument not in order"),
        (Outcome.Within, _) => (MarkerType.Circle, Ink.Accent, false, "within"),
        (Outcome.Below, _) => (MarkerType.Square, Ink.Alert, false, "below"),
        (Outcome.Above, _) => (MarkerType.Triangle, Ink.Alert, false, "above"),
        (Outcome.Undecided, _) => (MarkerType.Circle, Ink.Muted, true, "undecided"),
        _ => (MarkerType.Plus, Ink.Muted, false, "not judged"),
    };

    private static RectangleAnnotation Box(Interval x, int place, double half, OxyColor color) => new()
    {
        MinimumX = x.Lower,
        MaximumX = x.Upper,
        MinimumY = place - half,
        MaximumY = place + half,
        Fill = color,
        Layer = AnnotationLayer.BelowSeries,
    };

    private static double Spread(int i, int count) => count <= 1 ? 0 : (i * 7 % 13 - 6) / 18.0;

    private static (double Lowest, double Highest) Reach(IReadOnlyList<StripRow> rows, bool whiskers)
    {
        var ends = rows.SelectMany(row => row.Values).SelectMany(value => whiskers ? [value.Value.Interval().Lower, value.Value.Interval().Upper] : new[] { value.Value.Shown })
            .Concat(rows.Select(row => row.Range).OfType<ReferenceRange>().SelectMany(Ends))
            .Where(end => double.IsFinite(end) && end > 0).ToArray();
        return ends.Length == 0 ? (1, 10) : (ends.Min() / 1.05, ends.Max() * 1.05);
    }

    private static IEnumerable<double> Ends(ReferenceRange range) =>
        new[] { range.Limits, range.LowerLimit, range.UpperLimit }.OfType<Interval>().SelectMany(interval => new[] { range.Measurand.ToShown(interval.Lower), range.Measurand.ToShown(interval.Upper) });
}
