using HemoRheo.Notebooks;
using OxyPlot;

namespace HemoRheo;

/// <summary>Charts of flow curves and fitted laws. Points set aside are shown apart; the pointer on a point shows its numbers and the line of its file.</summary>
public static class CurveCharts
{
    /// <summary>Shear stress against shear rate.</summary>
    /// <param name="curve">The curve.</param>
    /// <exception cref="InvalidOperationException">No point has a rate and stress above zero.</exception>
    public static InteractiveChart Chart(this FlowCurve curve) => Of($"flow curve of {curve.Label.Sample}", CurvePicture.Stress(curve, null));

    /// <summary>Apparent viscosity against shear rate.</summary>
    /// <param name="curve">The curve.</param>
    /// <exception cref="InvalidOperationException">No point has a rate and stress above zero.</exception>
    public static InteractiveChart ViscosityChart(this FlowCurve curve) => Of($"viscosity of {curve.Label.Sample}", CurvePicture.Viscosity(curve, null));

    /// <summary>Shear stress against shear rate, with the fitted law over the kept points.</summary>
    /// <param name="fit">The fitted law.</param>
    /// <exception cref="InvalidOperationException">No point has a rate and stress above zero.</exception>
    public static InteractiveChart Chart(this FittedLaw fit) => Of($"flow curve of {fit.Curve.Label.Sample} with {fit.Law.Name}", CurvePicture.Stress(fit.Curve, fit));

    /// <summary>Apparent viscosity against shear rate, with the fitted law over the kept points.</summary>
    /// <param name="fit">The fitted law.</param>
    /// <exception cref="InvalidOperationException">No point has a rate and stress above zero.</exception>
    public static InteractiveChart ViscosityChart(this FittedLaw fit) => Of($"viscosity of {fit.Curve.Label.Sample} with {fit.Law.Name}", CurvePicture.Viscosity(fit.Curve, fit));

    private static InteractiveChart Of(string title, PlotModel picture) => Drawn.Of(title, picture, CurvePicture.Height);
}
