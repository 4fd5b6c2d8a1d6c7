using static System.FormattableString;

namespace HemoRheo;

/// <summary>Several curves fitted together, some parameters shared.</summary>
/// <param name="Laws">The law of each curve; all have the same parameters.</param>
/// <param name="Curves">The curves that took part; all of them where so few are left that the fit was refused.</param>
/// <param name="Errors">The error model of each curve.</param>
/// <param name="Convergence">How the fit ended.</param>
/// <param name="Parameters">Estimates on the natural scale: shared ones, then each curve's own, then the factors of loadings.</param>
/// <param name="Scaled">Estimates on the fitting scale (log or logit where bounded), in the order of the parameters; infinite for a parameter that is held at its bound.</param>
/// <param name="Covariance">Covariance of the estimates on the fitting scale, row by row, with zero rows for a parameter that is held; empty where there is none. With an unknown scale it is already multiplied by the scale estimated from all residuals together.</param>
/// <param name="StressResponse">Change of each estimate on the fitting scale when a constant stress of 1 Pa is added to every reading of every curve (linear response at the solution).</param>
/// <param name="RelativeResponse">The same when every reading is raised by one relative amount, a unit of that amount.</param>
/// <param name="Residuals">Standardized residuals, (reading - law) / standard deviation, of each curve in the order of its kept points.</param>
/// <param name="Fit">All residuals held against the error models.</param>
/// <param name="Compatibility">Whether the curves share these parameters; null where nothing is shared or it could not be tested, which a finding then says.</param>
/// <param name="Findings">Findings about the fit.</param>
/// <remarks>
/// Standard errors hold the errors of the readings and nothing else: neither the scatter between loadings nor instrument, temperature, hematocrit or torque zero.
/// Curves of different loadings share no loading error, so a shared parameter that a loading's error moves (a viscosity, a yield stress) is less certain than its standard error says; one that it does not move (a critical rate, a ratio) is not.
/// </remarks>
public sealed record JointFit(
    Items<FlowLaw> Laws,
    Items<FlowCurve> Curves,
    Items<ErrorModel> Errors,
    Convergence Convergence,
    Items<JointParameter> Parameters,
    Items<double> Scaled,
    Items<double> Covariance,
    Items<double> StressResponse,
    Items<double> RelativeResponse,
    Items<Items<double>> Residuals,
    LackOfFit Fit,
    Compatibility? Compatibility,
    Items<Finding> Findings)
{
    /// <summary>Whether values may be taken from this fit: it converged, has a covariance and no fault among its findings.</summary>
    public bool Usable => Convergence.Converged && Covariance.Count > 0 && Findings.All(finding => finding.Severity != Severity.Fault);

    /// <summary>A parameter by its name.</summary>
    /// <param name="name">Its name, as the law has it.</param>
    /// <param name="curve">Number of the curve, from 0; needed where the parameter is not shared.</param>
    /// <exception cref="ArgumentException">There is no such parameter, or it is a curve's own and no curve is given; the message lists those there are.</exception>
    public FittedParameter this[string name, int? curve = null] =>
        Parameters.FirstOrDefault(parameter => parameter.Number.Parameter.Name == name && (parameter.Shared || parameter.Curve == curve))?.Number
        ?? throw new ArgumentException($"There is no parameter '{name}' {(curve is null ? "that all curves share" : $"of curve {curve}")}; there are {string.Join(", ", Parameters.Select(Words).Distinct())}.", nameof(name));

    /// <summary>One row a parameter: estimate and standard error from the fit alone, and whose it is.</summary>
    public Table ToTable() => Table.Of("parameter", "curve", "estimate", "standard error", "unit", "why no error").WithRows(Parameters, parameter =>
    {
        var (number, unit) = (parameter.Number, parameter.Number.Parameter.Shown);
        var (estimate, error) = (unit.FromSi(number.Estimate), number.StandardError / unit.Factor);
        return
        [
            number.Parameter.Name,
            parameter.Curve is { } curve ? JointText.Name(this, curve) : "all",
            error is { } known ? Cell.Rounded(estimate, known) : estimate,
            error is { } shown ? Cell.Rounded(shown, Rounding.Uncertainty(shown)) : Cell.Empty,
            unit.Symbol,
            number.WhyNoError,
        ];
    });

    /// <inheritdoc/>
    public override string ToString() => JointText.Of(this);

    /// <summary>Name of the law.</summary>
    internal string LawName => Laws[0].Name;

    /// <summary>Samples of the curves, each once.</summary>
    internal string Samples => string.Join("+", Curves.Select(curve => curve.Label.Sample).Distinct());

    /// <summary>As a place for findings.</summary>
    internal Where Where => Where.Nowhere with { Sample = Samples };

    /// <summary>Column of a parameter of a curve's law.</summary>
    internal int Place(int curve, int parameter)
    {
        var name = Laws[curve].Parameters[parameter].Name;
        for (var k = 0; ; k++)
        {
            if (Parameters[k].Number.Parameter.Name == name && (Parameters[k].Shared || Parameters[k].Curve == curve)) return k;
        }
    }

    /// <summary>One curve's part of this fit as a fit of that curve: parameters of its law with their covariance, and the joint fit's judgment of the errors.</summary>
    internal FittedLaw Part(int curve, FlowCurve seen)
    {
        var law = Laws[curve];
        int[] places = [.. Enumerable.Range(0, law.Parameters.Count).Select(k => Place(curve, k))];
        return new(
            law,
            seen,
            Errors[curve],
            Convergence,
            places.Select(k => Parameters[k].Number).ToItems(),
            places.Select(k => Scaled[k]).ToItems(),
            places.SelectMany(r => places.Select(c => Covariance[r * Scaled.Count + c])).ToItems(),
            places.Select(k => StressResponse[k]).ToItems(),
            Residuals[curve],
            Fit,
            Findings);
    }

    private string Words(JointParameter parameter) => parameter.Curve is { } curve ? Invariant($"{parameter.Number.Parameter.Name} of curve {curve}") : parameter.Number.Parameter.Name;
}
