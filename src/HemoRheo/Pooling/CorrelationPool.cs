using MathNet.Numerics.Distributions;

namespace HemoRheo;

/// <summary>Estimates the first-order correlation of the readings of a ramp from the residuals of all curves of a study together.</summary>
/// <remarks>
/// A fit takes out of its residuals much of what neighbors have in common, so their plain correlation is far too small. Here the ratio of pooled products of neighbors to pooled squares
/// is held equal to the ratio of their expectations, with the projection of each fit in it. What all curves have in common at a place is taken off first: that is misfit of the law, not correlation.
/// An estimate is used when it is above zero beyond one chance in a hundred, so that a study of independent readings stays as it is; the benchmark <c>correlation</c> shows what that costs.
/// </remarks>
internal static class CorrelationPool
{
    private const int FewestCurves = 8;
    private const double Certain = 0.01;
    private const double FarOff = 3;
    private const double Lowest = -0.95;
    private const double Highest = 0.95;
    private const double Step = 1e-4;

    // Standardized residuals below 1e-9 are rounding: curves without noise.
    private const double NoScatter = 1e-18;

    /// <summary>
    /// The fits whose residuals are asked: those of the law that decides, unless they have a common pattern and another law of the study fits.
    /// Misfit that varies from curve to curve looks like correlation, also when the common part is taken off.
    /// </summary>
    /// <param name="laws">Usable fits of each law to curves without faults; the law that decides first.</param>
    public static IReadOnlyList<FittedLaw> Asked(IReadOnlyList<(FlowLaw Law, FittedLaw[] Fits)> laws) => laws.FirstOrDefault(law => LawJudgment.Judge(law.Law, law.Fits).Fits, laws[0]).Fits;

    /// <summary>The correlation a study's fits are to know of.</summary>
    /// <param name="fits">Usable fits of one law to curves without faults.</param>
    /// <param name="declared">Declared correlation; null to have it estimated.</param>
    public static PointCorrelation Of(IReadOnlyList<FittedLaw> fits, double? declared)
    {
        const string independent = "readings of a ramp are taken as independent";
        if (Estimate(fits) is not { } found)
        {
            return declared is { } given
                ? new(given, 0, null, null, null, 0, FormattableString.Invariant($"Neighboring readings of a ramp are correlated by {given:G3}, as the study file declares."))
                : new(0, 0, null, null, null, 0, $"The {independent}: an estimate of their correlation needs {FewestCurves} curves.");
        }

        var said = FormattableString.Invariant($"the {fits[0].Law} residuals of {found.Curves} curves say {found.Correlation:F2} ± {found.Error:F2}");
        if (declared is { } known) return new(known, 0, found.Correlation, found.Error, found.Probability, found.Curves, FormattableString.Invariant($"Neighboring readings of a ramp are correlated by {known:G3}, as the study file declares; {said}."));
        return found.Probability < Certain
            ? new(found.Correlation, found.Error, found.Correlation, found.Error, found.Probability, found.Curves, $"Neighboring readings of a ramp are correlated, and standard errors and tests of fit know it: {said}.")
            : new(0, 0, found.Correlation, found.Error, found.Probability, found.Curves, FormattableString.Invariant($"The {independent}: {said}, which is not above zero beyond chance (p = {found.Probability:G2})."));
    }

    /// <summary>What is to be said of it.</summary>
    public static IEnumerable<Finding> Findings(PointCorrelation correlation)
    {
        if (correlation is { StandardError: > 0 }) yield return PoolingFindings.ReadingsCorrelated.At(Where.Nowhere, correlation.Words, correlation.Value);
        else if (Math.Abs(correlation.Value - correlation.Estimate ?? 0) > FarOff * correlation.EstimateError) yield return PoolingFindings.CorrelationOffDeclared.At(Where.Nowhere, correlation.Words, correlation.Estimate, correlation.Value);
    }

    /// <summary>Correlation, its standard error and the one-sided probability of one as large when there is none; null where there are too few curves.</summary>
    internal static (double Correlation, double Error, double Probability, int Curves)? Estimate(IReadOnlyList<FittedLaw> fits)
    {
        var free = fits.Where(fit => fit.Fit.DegreesOfFreedom > 0).ToArray();
        if (free.Length < FewestCurves) return null;
        var places = new ResidualPlaces(free);
        LagProducts[] curves = [.. free.Select((fit, i) => LagProducts.Of(fit, places.Centered(i)))];
        if (curves.Sum(curve => curve.Squares) <= NoScatter) return null;
        var correlation = Root(curves);
        var slope = (Ratio(curves, correlation + Step) - Ratio(curves, correlation - Step)) / (2 * Step);
        var excess = curves.Sum(curve => curve.Products) - Ratio(curves, 0) * curves.Sum(curve => curve.Squares);
        return (correlation, Error(curves, correlation) / (slope * curves.Sum(curve => curve.Squares)), StudentT.CDF(0, 1, curves.Length - 1, -excess / Error(curves, 0)), curves.Length);
    }

    private static double Root(LagProducts[] curves)
    {
        var ratio = curves.Sum(curve => curve.Products) / curves.Sum(curve => curve.Squares);
        var (low, high) = (Lowest, Highest);
        while (high - low > 1e-12)
        {
            var middle = 0.5 * (low + high);
            if (Ratio(curves, middle) < ratio) low = middle;
            else high = middle;
        }

        return 0.5 * (low + high);
    }

    private static double Ratio(LagProducts[] curves, double correlation) => curves.Sum(curve => curve.ExpectedProducts(correlation)) / curves.Sum(curve => curve.ExpectedSquares(correlation));

    /// <summary>Standard error of the pooled products less the expected share of the pooled squares, from their scatter between curves.</summary>
    private static double Error(LagProducts[] curves, double correlation)
    {
        var ratio = Ratio(curves, correlation);
        var each = curves.Select(curve => curve.Products - ratio * curve.Squares).ToArray();
        var mean = each.Average();
        return Math.Sqrt(each.Sum(excess => (excess - mean) * (excess - mean)) * curves.Length / (curves.Length - 1.0));
    }
}
