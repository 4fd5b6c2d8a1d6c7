using OxyPlot;
using OxyPlot.Axes;

namespace HemoRheo.Notebooks;

/// <summary>Standardized residuals of a sample's loadings against shear rate.</summary>
internal static class ResidualChart
{
    /// <summary>Height of the picture, in pixels.</summary>
    public const int Height = 300;

    /// <summary>The picture.</summary>
    /// <param name="loadings">Loadings of one sample.</param>
    /// <param name="law">Name of the law.</param>
    public static string Svg(IReadOnlyList<LoadingResult> loadings, string law) => Still.Svg(Model(loadings, law), Height);

    /// <summary>The picture's model, which the interactive chart is made of too.</summary>
    public static PlotModel Model(IReadOnlyList<LoadingResult> loadings, string law) => Model(
        [.. loadings.Select(loading => (Title: $"loading {loading.Recording.Loading}", Fit: loading.Fits.FirstOrDefault(fit => fit.Law.Name == law))).Where(pair => pair.Fit is { Residuals.Count: > 0 }).Select(pair => (pair.Title, pair.Fit!))]);

    /// <summary>The model for fits, each under a title of its own.</summary>
    public static PlotModel Model(IReadOnlyList<(string Title, FittedLaw Fit)> fits)
    {
        var residuals = fits.SelectMany(pair => pair.Fit.Residuals).Where(double.IsFinite).ToArray();
        var rates = fits.SelectMany(pair => pair.Fit.Curve.Points).Select(point => point.Rate.ReciprocalSeconds).ToArray();
        var reach = Math.Max(3, residuals.Select(Math.Abs).DefaultIfEmpty(0).Max() * 1.15);
        var (lowest, highest) = rates.Length == 0 ? (1, 100) : (rates.Min() / 1.3, rates.Max() * 1.3);

        var model = Still.Model();
        model.Axes.Add(Still.Log(AxisPosition.Bottom, "shear rate, 1/s", lowest, highest));
        model.Axes.Add(Still.Linear(AxisPosition.Left, "standardized residual, 1", -reach, reach));
        model.Legends.Add(Still.Legend());
        model.Series.Add(Still.Line(new(lowest, 0), new(highest, 0), Ink.Text));
        model.Series.Add(Still.Line(new(lowest, 2), new(highest, 2), Ink.Muted, LineStyle.LongDash, 1.3, "two standard deviations"));
        model.Series.Add(Still.Line(new(lowest, -2), new(highest, -2), Ink.Muted, LineStyle.LongDash, 1.3));
        foreach (var ((title, fit), i) in fits.Select((pair, i) => (pair, i)))
        {
            var points = fit.Curve.Points.Zip(fit.Residuals, (point, residual) => new DataPoint(point.Rate.ReciprocalSeconds, residual)).Where(point => double.IsFinite(point.Y));
            model.Series.Add(Still.Points(points, Ink.Member(i), Ink.Marker(i), title: title));
        }

        return model;
    }
}
