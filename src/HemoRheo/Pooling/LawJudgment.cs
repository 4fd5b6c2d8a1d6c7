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
    private const double LeastVariance = 1e-18;
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
        var probability = known ? SpecialFunctions.GammaUpperRegularized(df / 2.0, chiSquare / 2) : 1;
        var places = Places(free);
        var searched = free.Length >= FewestCurves && places > law.Parameters.Count;
        var (pattern, largest) = searched ? Pattern(free, places, law.Parameters.Count) : (1, 0);
        var reduced = chiSquare / df;
        var patterned = pattern < Certain && largest > PatternThatMatters;
        var oversized = known && probability < Certain && reduced > ReducedThatMatters;
        var fitsTheStudy = !patterned && !oversized;
        var numbers = string.Create(
            System.Globalization.CultureInfo.InvariantCulture,
            $"{free.Length} curves, chi-square {chiSquare:F0} on {df} degrees of freedom{(known ? $" ({Shown(probability)})" : "")}, {(searched ? FormattableString.Invariant($"mean residual up to {largest:F2} standard deviations at one place ({Shown(pattern)})") : "too few to look for a common pattern of residuals")}");
        var words = patterned ? $"{law.Name} does not fit: the residuals have a common pattern; {numbers}."
            : oversized ? $"{law.Name} does not fit within the declared errors; {numbers}."
            : known && probability < Certain ? $"{law.Name} fits, but the scatter is larger than declared; {numbers}."
            : $"{law.Name} fits; {numbers}.";
        return new(law.Name, free.Length, chiSquare, df, probability, pattern, fitsTheStudy, words);
    }

    private static string Shown(double probability) => probability < 1e-4 ? "p below 0.0001" : string.Create(System.Globalization.CultureInfo.InvariantCulture, $"p = {probability:G2}");

    private static int Places(IReadOnlyCollection<FittedLaw> fits) => (int)Math.Round((double)fits.Sum(fit => fit.Residuals.Count) / fits.Count);

    private static (double Probability, double Largest) Pattern(IReadOnlyList<FittedLaw> fits, int places, int parameters)
    {
        var residuals = fits.SelectMany((fit, curve) => fit.Residuals.Select((residual, i) => (Curve: curve, Rate: fit.Curve.Points[i].Rate.ReciprocalSeconds, Residual: residual))).OrderBy(item => item.Rate).ToArray();
        var statistic = 0.0;
        var largest = 0.0;
        var smallest = double.PositiveInfinity;
        for (var place = 0; place < places; place++)
        {
            var slice = residuals[(place * residuals.Length / places)..((place + 1) * residuals.Length / places)];
            double n = slice.Length;
            var mean = slice.Average(item => item.Residual);
            var variance = Math.Max(LeastVariance, slice.Sum(item => (item.Residual - mean) * (item.Residual - mean)) / (n - 1));
            statistic += n * mean * mean / variance;
            largest = Math.Max(largest, Math.Abs(mean) / Math.Sqrt(variance));
            smallest = Math.Min(smallest, n);
        }

        // Residuals of a fit are orthogonal to its gradients, so their means live in as many dimensions fewer as there are parameters.
        var (above, below) = (places - parameters, smallest - 1);
        return (SpecialFunctions.BetaRegularized(below / 2, above / 2.0, below / (below + above * statistic / places)), largest);
    }
}
