using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>One flow curve: points kept and set aside, and the law where one is fitted; shear stress or apparent viscosity against shear rate, logarithmic axes.</summary>
internal static class CurvePicture
{
    /// <summary>Height of the picture, in pixels.</summary>
    public const int Height = 450;

    private const int Places = 80;

    /// <summary>Shear stress against shear rate.</summary>
    public static PlotModel Stress(FlowCurve curve, FittedLaw? fit) => Of(curve, fit, "shear stress, mPa", (_, stress) => 1000 * stress);

    /// <summary>Apparent viscosity against shear rate.</summary>
    public static PlotModel Viscosity(FlowCurve curve, FittedLaw? fit) => Of(curve, fit, "apparent viscosity, mPa·s", (rate, stress) => 1000 * stress / rate);

    private static PlotModel Of(FlowCurve curve, FittedLaw? fit, string title, Func<double, double, double> height)
    {
        var kept = curve.Points.Where(Drawable).ToArray();
        var aside = curve.SetAside.Where(one => Drawable(one.Point)).ToArray();
        var points = kept.Concat(aside.Select(one => one.Point)).ToArray();
        if (points.Length == 0) throw new InvalidOperationException($"{curve} has no point above zero, so there is nothing to draw on logarithmic axes.");
        var (left, right) = (points.Min(point => point.Rate.ReciprocalSeconds) / 1.4, points.Max(point => point.Rate.ReciprocalSeconds) * 1.4);
        var heights = points.Select(Height).ToArray();

        var model = Still.Model();
        model.Axes.Add(Still.Log(AxisPosition.Bottom, "shear rate, 1/s", left, right));
        model.Axes.Add(Still.Log(AxisPosition.Left, title, heights.Min() / 1.3, heights.Max() * 1.3));
        model.Legends.Add(Still.Legend());
        if (fit is { Convergence.Converged: true } && kept.Length > 0) model.Series.Add(Law(fit, kept, height));
        if (kept.Length > 0) model.Series.Add(Marks(kept.Select(point => Mark(point, [])), MarkerType.Circle, Ink.Accent, "kept"));
        if (aside.Length > 0) model.Series.Add(Marks(aside.Select(one => Mark(one.Point, one.Findings)), MarkerType.Cross, Ink.Alert, "set aside"));
        return model;

        double Height(FlowPoint point) => height(point.Rate.ReciprocalSeconds, point.Stress.Pascals);

        ScatterPoint Mark(FlowPoint point, Items<Finding> findings) => new(point.Rate.ReciprocalSeconds, Height(point), tag: PointWords.Of(point, findings));
    }

    private static LineSeries Law(FittedLaw fit, FlowPoint[] kept, Func<double, double, double> height)
    {
        var (lowest, highest) = (kept.Min(point => point.Rate.ReciprocalSeconds), kept.Max(point => point.Rate.ReciprocalSeconds));
        var parameters = fit.Parameters.Select(one => one.Estimate).ToArray();
        var line = new LineSeries { Color = Ink.Accent, StrokeThickness = 1.6, Title = $"{fit.Law.Name}, fitted" };
        for (var i = 0; i <= Places; i++)
        {
            var rate = lowest * Math.Pow(highest / lowest, (double)i / Places);
            line.Points.Add(new(rate, height(rate, fit.Law.Stress(new ShearRate(rate), parameters).Pascals)));
        }

        return line;
    }

    private static ScatterSeries Marks(IEnumerable<ScatterPoint> points, MarkerType marker, OxyColor color, string title)
    {
        var series = Still.Points([], color, marker, 4.5, title: title);
        series.Points.AddRange(points);
        return series;
    }

    private static bool Drawable(FlowPoint point) => point.Rate.ReciprocalSeconds > 0 && point.Stress.Pascals > 0 && double.IsFinite(point.Stress.Pascals);
}
