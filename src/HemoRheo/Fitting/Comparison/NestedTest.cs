using MathNet.Numerics;
using static System.FormattableString;

namespace HemoRheo;

/// <summary>A test of a simple law within a more general one on the same curve.</summary>
/// <param name="Simple">The simple law: the hypothesis.</param>
/// <param name="General">The general law.</param>
/// <param name="Kind">Where the simple law lies in the general one.</param>
/// <param name="Where">At which numbers.</param>
/// <param name="Statistic">Scale known: the likelihood ratio (chi-square). Scale estimated: F.</param>
/// <param name="DegreesOfFreedom">Parameters of the general law less those of the simple one.</param>
/// <param name="ResidualDegreesOfFreedom">Points less parameters of the general law, the second degrees of freedom of F; null where the scale is known.</param>
/// <param name="Probability">Probability of a statistic as large or larger if the simple law is right; null where other parameters of the general law mean nothing there, since no chi-square holds then and AICc alone compares the two.</param>
/// <remarks>
/// The likelihood ratio holds the logarithms of the variances, which are taken at the fitted stress. F = (exp(ratio / n) - 1) (n - p) / q, which is the usual F where the variances of both laws agree.
/// At a bound: half the probability with q and half with q - 1 degrees of freedom (Self and Liang 1987, JASA 82:605-610).
/// Where other parameters mean nothing: Davies 1977, Biometrika 64:247-254.
/// </remarks>
public sealed record NestedTest(FlowLaw Simple, FlowLaw General, NestingKind Kind, string Where, double Statistic, int DegreesOfFreedom, int? ResidualDegreesOfFreedom, double? Probability)
{
    /// <inheritdoc/>
    public override string ToString() => Invariant($"{Simple} within {General} ({Where}): {(ResidualDegreesOfFreedom is null ? "chi-square" : "F")} {Statistic:G4}, {(Probability is { } p ? Invariant($"p {p:G3}") : "no probability")}");

    /// <summary>The test of two fits to one curve with one error model; null where no degrees of freedom are left.</summary>
    internal static NestedTest? Of(FittedLaw simple, FittedLaw general, NestingKind kind, string where)
    {
        var n = general.Residuals.Count;
        var (q, left) = (general.Law.Parameters.Count - simple.Law.Parameters.Count, n - general.Law.Parameters.Count);
        if (left < 1) return null;
        var sameCurve = kind == NestingKind.AtBound && general.Parameters.Any(parameter => parameter.AtBound) && q == 1;
        var ratio = sameCurve ? 0 : Math.Max(0, Likelihood.MinusTwiceLog(simple) - Likelihood.MinusTwiceLog(general));
        var known = general.Errors.ScaleKnown;
        var gain = Math.Exp(ratio / n) - 1;
        double Above(int df) => df == 0 ? ratio > 0 ? 0 : 1
            : known ? SpecialFunctions.GammaUpperRegularized(df / 2.0, ratio / 2)
            : SpecialFunctions.BetaRegularized(left / 2.0, df / 2.0, 1 / (1 + gain));
        double? probability = kind switch
        {
            NestingKind.Inside => Above(q),
            NestingKind.AtBound => (Above(q - 1) + Above(q)) / 2,
            _ => null,
        };
        return new(simple.Law, general.Law, kind, where, known ? ratio : gain * left / q, q, known ? null : left, probability);
    }
}
