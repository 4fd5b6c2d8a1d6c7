using static System.FormattableString;

namespace HemoRheo;

/// <summary>Structure parameters of Quemada's law (intrinsic viscosities of the cells) from one fit, a hematocrit and a plasma viscosity, with the uncertainties of all three by source.</summary>
/// <param name="AtRest">k0, of the aggregated cells: an extrapolation to zero rate. Its own scale, no unit.</param>
/// <param name="AtHighShear">kinf, of the dispersed and elongated cells. Its own scale, no unit.</param>
/// <param name="Findings">What is out of range.</param>
/// <remarks>
/// k0 = (2/H)(1 - r sqrt(p/h)), kinf = (2/H)(1 - sqrt(p/h)), with p the plasma viscosity, h the high-shear viscosity, r the ratio of the fit and H the hematocrit.
/// Scatter between loadings and the instrument are not in it. Source: Quemada 1978, Rheologica Acta 17:632-642.
/// </remarks>
public sealed record QuemadaStructure(Value AtRest, Value AtHighShear, Items<Finding> Findings)
{
    /// <inheritdoc/>
    public override string ToString() => Invariant($"k0 {AtRest.X:G4} ± {AtRest.StandardUncertainty:G2}, kinf {AtHighShear.X:G4} ± {AtHighShear.StandardUncertainty:G2}{string.Concat(Findings.Select(finding => $"; {finding.Code}"))}");

    /// <summary>From a usable fit, hematocrit in L/L and the natural logarithm of the plasma viscosity.</summary>
    internal static QuemadaStructure Of(FittedLaw fit, Value hematocrit, Value logPlasma)
    {
        var (h, plasma) = (new Hematocrit(hematocrit.X), new Viscosity(Math.Exp(logPlasma.X)));
        var (rest, high) = (new StructureParameter(true, h, plasma).From(fit)!, new StructureParameter(false, h, plasma).From(fit)!);
        return new(With(fit, rest, hematocrit, logPlasma), With(fit, high, hematocrit, logPlasma), Look(fit, rest, high, plasma).ToItems());
    }

    /// <summary>The fit's part, and those of hematocrit and plasma through their slopes: -k/H, and the negative of that of the log high-shear viscosity.</summary>
    private static Value With(FittedLaw fit, FitValue k, Value hematocrit, Value logPlasma) => Value.Combine([
        (1, k.ToValue(fit)),
        (-k.X / hematocrit.X, hematocrit with { X = 0 }),
        (-k.Gradient[0], logPlasma with { X = 0 })]);

    private static IEnumerable<Finding> Look(FittedLaw fit, FitValue rest, FitValue high, Viscosity plasma)
    {
        var where = fit.Curve.Label.Where;
        if (fit.Parameters[2].AtBound)
        {
            yield return DerivedFindings.StructureAtBoundary.At(where, Invariant($"Ratio {fit.Parameters[2].Estimate}: k0 is 2/H = {rest.X:G4}, without a part of the fit."), fit.Parameters[2].Estimate, 0);
        }

        if (rest.X < 0 || high.X < 0)
        {
            yield return DerivedFindings.StructureOutOfRange.At(where, Invariant($"Plasma viscosity {plasma} is above the high-shear viscosity {Viscosity.FromPascalSeconds(fit.Parameters[0].Estimate)} of the blood."), plasma.PascalSeconds, fit.Parameters[0].Estimate);
        }
    }
}
