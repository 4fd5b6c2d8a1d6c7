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

    /// <summary>Residuals in standard deviations against shear rate. A pattern says that the law has another shape than the curve.</summary>
    /// <param name="fit">The fitted law.</param>
    /// <exception cref="InvalidOperationException">The fit has no residuals.</exception>
    public static InteractiveChart ResidualChart(this FittedLaw fit) => fit.Residuals.Count == 0
        ? throw new InvalidOperationException($"The fit of {fit.Law.Name} to {fit.Curve.Label.Sample} has no residuals: {fit.Convergence.Message}")
        : Drawn.Of($"residuals of {fit.Law.Name} on {fit.Curve.Label.Sample}", Notebooks.ResidualChart.Model([(fit.Law.Name, fit)]), Notebooks.ResidualChart.Height);

    /// <summary>How far the fit worsens when one quantity is held at other values, with the limit of the interval. Where the line stays under the limit the interval is open.</summary>
    /// <param name="profile">The profile, for example <c>fit.Profile("yield stress")</c>.</param>
    /// <exception cref="InvalidOperationException">The profile has no point.</exception>
    public static InteractiveChart Chart(this Profile profile) => Drawn.Of($"profile of {profile.Interval.Name}", ProfileChart.Model(profile), ProfileChart.Height);

    /// <summary>Readings and laws as percent differences from the law with the lowest AICc.</summary>
    /// <param name="comparison">The comparison.</param>
    /// <exception cref="InvalidOperationException">No law could be fitted.</exception>
    public static InteractiveChart Chart(this LawComparison comparison) => Drawn.Of("laws compared", ComparisonChart.Model(comparison), ComparisonChart.Height);

    private static InteractiveChart Of(string title, PlotModel picture) => Drawn.Of(title, picture, CurvePicture.Height);
}
