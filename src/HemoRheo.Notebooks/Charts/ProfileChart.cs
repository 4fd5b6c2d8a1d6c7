using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>How far a curve's fit worsens when one quantity is held away from its estimate: a curve that stays below the limit on a side is open there.</summary>
internal static class ProfileChart
{
    /// <summary>Height of the picture, in pixels.</summary>
    public const int Height = 380;

    private const double Headroom = 1.6;
    private const double WideRange = 30;

    /// <summary>The picture.</summary>
    /// <exception cref="InvalidOperationException">The profile has no point.</exception>
    public static PlotModel Model(Profile profile)
    {
        var interval = profile.Interval;
        var points = profile.Points.Select(point => new DataPoint(interval.Shown.FromSi(point.Value), Math.Abs(point.Rise))).ToArray();
        if (points.Length == 0) throw new InvalidOperationException($"There is no profile to draw: {interval}.");
        var model = Still.Model();
        var (left, right) = Ends(points, interval);
        var title = interval.Shown == ShownUnits.One ? interval.Name : $"{interval.Name}, {interval.Shown.Symbol}";
        model.Axes.Add(left > 0 && right / left > WideRange ? Still.Log(AxisPosition.Bottom, title, left, right) : Still.Linear(AxisPosition.Bottom, title, left, right));
        model.Axes.Add(Still.Linear(AxisPosition.Left, "rise of the misfit, standard deviations", 0, Math.Max(profile.Limit * Headroom, Math.Min(points.Max(point => point.Y), 2 * profile.Limit) * 1.05)));
        model.Legends.Add(Still.Legend());
        model.Series.Add(Still.Line(new(left, profile.Limit), new(right, profile.Limit), Ink.Muted, LineStyle.LongDash, 1.3, FormattableString.Invariant($"limit for {100 * interval.Level:G4} %")));
        var line = new LineSeries { Color = Ink.Accent, StrokeThickness = 1.6, Title = "profile" };
        line.Points.AddRange(points);
        model.Series.Add(line);
        foreach (var end in new[] { interval.Lower, interval.Upper }.OfType<double>()) model.Series.Add(Still.Line(new(interval.Shown.FromSi(end), 0), new(interval.Shown.FromSi(end), profile.Limit), Ink.Alert, LineStyle.Dash, 1.4, end == interval.Lower || interval.Lower is null ? "end of the interval" : null));
        if (interval.Estimate is { } estimate) model.Series.Add(Still.Points([new DataPoint(interval.Shown.FromSi(estimate), 0)], Ink.Accent, MarkerType.Circle, 5, title: "estimate"));
        return model;
    }

    /// <summary>A little beyond the profile; down to the end of the quantity's range where the interval is open there.</summary>
    private static (double Left, double Right) Ends(DataPoint[] points, FitInterval interval)
    {
        var (left, right) = (points.Min(point => point.X), points.Max(point => point.X));
        if (interval.Kind == IntervalKind.Closed && left > 0 && right / left > WideRange) return (left / 1.2, right * 1.2);
        var margin = left < right ? 0.06 * (right - left) : 1;
        var end = interval.Shown.FromSi(interval.Range.Lower);
        return (interval.Kind == IntervalKind.AtMost && double.IsFinite(end) ? end : Math.Max(left - margin, Math.Min(left, end)), right + margin);
    }
}
