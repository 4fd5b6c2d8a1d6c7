using MathNet.Numerics;

namespace HemoRheo;

/// <summary>Judges a law on the residuals of all curves of a study together.</summary>
/// <remarks>
/// Two tests, since single curves of a dozen points have no power: the pooled chi-square against the declared errors, and the pattern of mean standardized residuals
/// along the curves, which holds whatever the size of the errors. Misfit of a law has one sign at a place; noise has not.
/// </remarks>
internal static class LawJudgment
{
    private const double Certain = 1e-3;
    private const double ReducedThatMatters = 2;
    private const double PatternThatMatters = 1.0 / 3;
    private const int FewestCurves = 8;

    /// <summary>The evidence for one law.</summary>
    /// <param name="law">The law.</param>
    /// <param name="fits">Its usable fits to curves without faults.</param>
    public static LawEvidence Judge(FlowLaw law, IReadOnlyList<FittedLaw> fits)
    {
        var free = fits.Where(fit => fit.Fit.DegreesOfFreedom > 0).ToArray();
        if (free.Length == 0) return new(law.Name, 0, 0, 0, 1, 1, false, $"{law.Name}: no curve could be used, so the study says nothing of it.");
        var chiSquare = free.Sum(fit => fit.Fit.ChiSquare);
        var df = free.Sum(fit => fit.Fit.DegreesOfFreedom);
        var known = free[0].Errors.ScaleKnown;
        var expected = free.Sum(fit => fit.Fit.Expected);
        var probability = known ? ProbabilityAbove(chiSquare, free) : 1;
        var places = new ResidualPlaces(free);
        var searched = free.Length >= FewestCurves && places.Count > law.Parameters.Count;
        var (pattern, largest) = searched ? (Pattern(free, places, law.Parameters.Count), places.Largest) : (1, 0);
        var reduced = chiSquare / expected;
        var patterned = pattern < Certain && largest > PatternThatMatters;
        var oversized = known && probability < Certain && reduced > ReducedThatMatters;
        var fitsTheStudy = !patterned && !oversized;
        var numbers = string.Create(
            System.Globalization.CultureInfo.InvariantCulture,
            $"{free.Length} curves, chi-square {chiSquare:F0} on {df} degrees of freedom{(expected < df ? FormattableString.Invariant($", {expected:F0} to be expected of correlated readings") : "")}{(known ? $" ({Shown(probability)})" : "")}, {(searched ? FormattableString.Invariant($"mean residual up to {largest:F2} standard deviations at one place ({Shown(pattern)})") : "too few to look for a common pattern of residuals")}");
        var words = patterned ? $"{law.Name} does not fit: the residuals have a common pattern; {numbers}."
            : oversized ? $"{law.Name} does not fit within the declared errors; {numbers}."
            : known && probability < Certain ? $"{law.Name} fits, but the scatter is larger than declared; {numbers}."
            : $"{law.Name} fits; {numbers}.";
        return new(law.Name, free.Length, chiSquare, df, probability, pattern, fitsTheStudy, words);
    }

    private static string Shown(double probability) => probability < 1e-4 ? "p below 0.0001" : string.Create(System.Globalization.CultureInfo.InvariantCulture, $"p = {probability:G2}");

    /// <summary>All curves share one correlation, so it is off for all of them by the same amount.</summary>
    private static double ProbabilityAbove(double chiSquare, FittedLaw[] fits)
    {
        if (fits[0].Correlation == 0) return SquaresDistribution.Independent(fits.Sum(fit => fit.Fit.DegreesOfFreedom)).ProbabilityAbove(chiSquare);
        var designs = fits.Select(fit => WeightedDesign.Of(fit)!).ToArray();
        return CorrelationSpread.Of(fits[0].Correlation, fits[0].CorrelationError)
            .Sum(node => node.Weight * designs.Select(design => design.Squares(node.Correlation)).Aggregate((a, b) => a + b).ProbabilityAbove(chiSquare));
    }

    /// <summary>
    /// Means at the places are compared with the scatter between curves, which are independent of each other, so correlation within a curve does not make the single mean too large;
    /// but it ties the means of neighboring places together, which leaves fewer dimensions for them to scatter in.
    /// </summary>
    private static double Pattern(FittedLaw[] fits, ResidualPlaces places, int parameters)
    {
        // Residuals of a fit are orthogonal to its gradients, so their means live in as many dimensions fewer as there are parameters.
        var (above, below) = (fits[0].Correlation == 0 ? places.Count - parameters : fits.Average(Dimensions), places.Fewest - 1);
        return SpecialFunctions.BetaRegularized(below / 2, above / 2, below / (below + above * places.Statistic / places.Count));
    }

    private static double Dimensions(FittedLaw fit)
    {
        var design = WeightedDesign.Of(fit)!;
        var covariance = design.Projection * design.Correlations(fit.Correlation) * design.Projection;
        var standard = covariance.MapIndexed((i, j, c) => c / Math.Sqrt(covariance[i, i] * covariance[j, j]));
        return design.Points * design.Points / standard.PointwisePower(2).ReduceRows((a, b) => a + b).Sum();
    }
}
