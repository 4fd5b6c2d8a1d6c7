using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace HemoRheo.Notebooks;

/// <summary>One flow curve: points kept and set aside, and the law where one is fitted; shear stress or apparent viscosity against shear rate, logarithmic axes.</summary>
internal static class CurvePicture
{
    /// <summary>Height of the picture, in pixels.</summary>
    public const int Height = 450;

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
        if (fit is { Convergence.Converged: true } && kept.Length > 0) model.Series.Add(Law(fit, height));
        if (kept.Length > 0) model.Series.Add(Still.Points(kept.Select(point => Mark(point, [])), Ink.Accent, MarkerType.Circle, 4.5, title: "kept"));
        if (aside.Length > 0) model.Series.Add(Still.Points(aside.Select(one => Mark(one.Point, one.Findings)), Ink.Alert, MarkerType.Cross, 4.5, title: "set aside"));
        return model;

        double Height(FlowPoint point) => height(point.Rate.ReciprocalSeconds, point.Stress.Pascals);

        ScatterPoint Mark(FlowPoint point, Items<Finding> findings) => new(point.Rate.ReciprocalSeconds, Height(point), tag: PointWords.Of(point, findings));
    }

    private static LineSeries Law(FittedLaw fit, Func<double, double, double> height)
    {
        var line = new LineSeries { Color = Ink.Accent, StrokeThickness = 1.6, Title = $"{fit.Law.Name}, fitted" };
        line.Points.AddRange(LawLine.Of(fit).Select(point => new DataPoint(point.Rate, height(point.Rate, point.Viscosity / 1000 * point.Rate))));
        return line;
    }

    private static bool Drawable(FlowPoint point) => point.Rate.ReciprocalSeconds > 0 && point.Stress.Pascals > 0 && double.IsFinite(point.Stress.Pascals);
}
