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
    /// <summary>Correlation of neighboring readings that covariance and lack of fit know of; 0 for independent readings.</summary>
    public double Correlation { get; init; }

    /// <summary>Standard error of that correlation; 0 where it is taken as exact.</summary>
    public double CorrelationError { get; init; }

    /// <summary>Whether values may be taken from this fit: it converged, has a covariance and no fault among its findings.</summary>
    public bool Usable => Convergence.Converged && Covariance.Count > 0 && Findings.All(finding => finding.Severity != Severity.Fault);

    /// <summary>
    /// The same fit for readings that are correlated along the ramp: the estimates and their response to a constant stress stay, standard errors and lack of fit change.
    /// Readings number i and j are correlated by the correlation to the power of the difference of their numbers.
    /// </summary>
    /// <param name="correlation">Correlation of neighboring readings, from 0 to below 1; a study's own is <c>Pool.Correlation</c>.</param>
    /// <param name="standardError">Its standard error, so that lack of fit is not held against an estimate as if it were exact.</param>
    /// <remarks>
    /// Covariance (J'WJ)^-1 J'W^1/2 R W^1/2 J (J'WJ)^-1; an estimated scale is held against the expectation tr(MR) of the sum of squares, with tr(MR)^2/tr(MRMR) degrees of freedom
    /// (Satterthwaite 1946, Biometrics Bulletin 2:110-114).
    /// </remarks>
    /// <exception cref="ArgumentOutOfRangeException">The correlation is below 0, 1 or more; the standard error is below 0 or not finite.</exception>
    public FittedLaw WithCorrelation(double correlation, double standardError = 0)
    {
        if (!(correlation >= 0 && correlation < 1)) throw new ArgumentOutOfRangeException(nameof(correlation), FormattableString.Invariant($"A correlation of neighboring readings is from 0 to below 1; this one is {correlation}."));
        if (!(standardError >= 0 && double.IsFinite(standardError))) throw new ArgumentOutOfRangeException(nameof(standardError), FormattableString.Invariant($"A standard error is 0 or above and finite; this one is {standardError}."));
        return FitReport.Correlated(this with { Correlation = correlation, CorrelationError = standardError });
    }

    /// <inheritdoc/>
    public override string ToString() => $"{Law.Name}: {string.Join(", ", Parameters.Select(p => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{p.Parameter.Name} {p.Estimate:G5} {p.Parameter.Unit}")))}; {Convergence.Message}";
}
