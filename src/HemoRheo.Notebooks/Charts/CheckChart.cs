using OxyPlot;
using OxyPlot.Annotations;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>Checks of an instrument over time: relative error with its interval, the limits, and the status the checks give.</summary>
internal static class CheckChart
{
    /// <summary>Height of the picture, in pixels.</summary>
    public const int Height = 380;

    /// <summary>The picture.</summary>
    /// <param name="history">The instrument's checks; there is at least one.</param>
    /// <param name="spans">Its status over time.</param>
    public static string Svg(InstrumentHistory history, IReadOnlyList<StatusSpan> spans) => Still.Svg(Model(history, spans), Height);

    /// <summary>The picture's model, which the interactive chart is made of too.</summary>
    public static PlotModel Model(InstrumentHistory history, IReadOnlyList<StatusSpan> spans)
    {
        var checks = history.Checks;
        var limit = 100 * history.Instrument.CheckLimit;
        var ends = checks.Select(check => check.Error.Interval().Select(Percent)).ToArray();
        var reach = 1.1 * Math.Max(1.3 * limit, ends.SelectMany(end => new[] { -end.Lower, end.Upper }).DefaultIfEmpty(0).Max());
        var from = spans.Select(span => span.From).Concat(checks.Select(check => check.At)).Min().AddDays(-1.5);
        var until = spans.Select(span => span.Until).Concat(checks.Select(check => check.At)).Max().AddDays(1.5);

        var model = Still.Model();
        model.Axes.Add(Still.Styled(new DateTimeAxis
        {
            Position = AxisPosition.Bottom,
            Title = "date (as recorded)",
            Minimum = Place(from),
            Maximum = Place(until),
            StringFormat = "yyyy-MM-dd",
            MajorStep = Step(from, until),
            MinorIntervalType = DateTimeIntervalType.Days,
            IntervalType = DateTimeIntervalType.Days,
        }));
        model.Axes.Add(Still.Linear(AxisPosition.Left, "measured less certified, %", -reach, reach));
        model.Legends.Add(Still.Legend());
        foreach (var span in spans.Where(span => span.Status != InstrumentStatus.InOrder)) model.Annotations.Add(Ground(span, reach));
        model.Series.Add(Still.Line(new(Place(from), 0), new(Place(until), 0), Ink.Muted));
        model.Series.Add(Still.Line(new(Place(from), limit), new(Place(until), limit), Ink.Text, LineStyle.Dash, title: "limit of a check"));
        model.Series.Add(Still.Line(new(Place(from), -limit), new(Place(until), -limit), Ink.Text, LineStyle.Dash));
        foreach (var outcome in (CheckOutcome[])[CheckOutcome.Passes, CheckOutcome.CannotTell, CheckOutcome.Fails]) Add(model, checks, outcome);
        return model;
    }

    private static void Add(PlotModel model, Items<InstrumentCheck> checks, CheckOutcome outcome)
    {
        var shown = checks.Where(check => check.Outcome == outcome).ToArray();
        if (shown.Length == 0) return;
        var color = outcome switch { CheckOutcome.Passes => Ink.Accent, CheckOutcome.Fails => Ink.Alert, _ => Ink.Muted };
        var marker = outcome switch { CheckOutcome.Passes => MarkerType.Circle, CheckOutcome.Fails => MarkerType.Square, _ => MarkerType.Diamond };
        model.Series.Add(Still.Strokes(shown.Select(check => (check.Error.Interval().Select(Percent), Place(check.At))).Select(one => (new DataPoint(one.Item2, one.Item1.Lower), new DataPoint(one.Item2, one.Item1.Upper))), color, 2));
        model.Series.Add(Still.Points(shown.Select(check => new ScatterPoint(Place(check.At), Percent(check.Error.X), tag: PointWords.Of(check))), color, marker, 6, outcome == CheckOutcome.CannotTell, Words.Of(outcome)));
    }

    private static RectangleAnnotation Ground(StatusSpan span, double reach) => new()
    {
        MinimumX = Place(span.From),
        MaximumX = Place(span.Until),
        MinimumY = -reach,
        MaximumY = reach,
        Fill = span.Status == InstrumentStatus.Failed ? Ink.Failure : Ink.Doubt,
        Layer = AnnotationLayer.BelowAxes,
        Text = Words.Of(span.Status),
        TextColor = Ink.Text,
        TextPosition = new((Place(span.From) + Place(span.Until)) / 2, -reach * 0.92),
        TextVerticalAlignment = VerticalAlignment.Bottom,
    };

    private static double Percent(double logError) => 100 * (Math.Exp(logError) - 1);

    private static double Place(DateTimeOffset moment) => DateTimeAxis.ToDouble(moment.DateTime);

    private static double Step(DateTimeOffset from, DateTimeOffset until) => Math.Max(1, Math.Ceiling((until - from).TotalDays / 6));
}
