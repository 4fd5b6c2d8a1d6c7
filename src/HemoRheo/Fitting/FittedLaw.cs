namespace HemoRheo;

/// <summary>A flow law fitted to one curve.</summary>
/// <param name="Law">The law.</param>
/// <param name="Curve">The curve; its set-aside points took no part.</param>
/// <param name="Errors">The error model.</param>
/// <param name="Convergence">How the fit ended.</param>
/// <param name="Parameters">Estimates on the natural scale.</param>
/// <param name="Scaled">Estimates on the fitting scale (log or logit where bounded); minus infinity for a parameter that is held at its lower bound.</param>
/// <param name="Covariance">Covariance of the estimates on the fitting scale, row by row, with zero rows for a parameter that is held; empty where there is none. With an unknown scale it is already multiplied by the scale estimated from the residuals.</param>
/// <param name="StressResponse">Change of each estimate on the fitting scale when a constant stress of 1 Pa is added to every reading (linear response at the solution).</param>
/// <param name="Residuals">Standardized residuals, (reading - law) / standard deviation, in the order of the curve's kept points.</param>
/// <param name="Fit">Residuals held against the error model.</param>
/// <param name="Findings">Findings about the fit.</param>
public record FittedLaw(
    FlowLaw Law,
    FlowCurve Curve,
    ErrorModel Errors,
    Convergence Convergence,
    Items<FittedParameter> Parameters,
    Items<double> Scaled,
    Items<double> Covariance,
    Items<double> StressResponse,
    Items<double> Residuals,
    LackOfFit Fit,
    Items<Finding> Findings)
{
    /// <summary>Whether values may be taken from this fit: it converged, has a covariance and no fault among its findings.</summary>
    public bool Usable => Convergence.Converged && Covariance.Count > 0 && Findings.All(finding => finding.Severity != Severity.Fault);

    /// <inheritdoc/>
    public override string ToString() => $"{Law.Name}: {string.Join(", ", Parameters.Select(p => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{p.Parameter.Name} {p.Estimate:G5} {p.Parameter.Unit}")))}; {Convergence.Message}";
}
