using MathNet.Numerics.Distributions;

namespace HemoRheo;

/// <summary>Bootstrap intervals by percentiles on the working scale. Where the size of the noise is estimated from the curve, the percentiles are moved out from those of the normal distribution to those of Student's t.</summary>
/// <remarks>Sources: Efron and Tibshirani 1993, An Introduction to the Bootstrap, chapters 9 and 13; Hesterberg 2015, The American Statistician 69:371-386 (percentiles moved out).</remarks>
internal static class BootstrapInterval
{
    private const double MostFailed = 0.01;

    public static FitInterval Of(FittedLaw fit, FitFunction function, double level, IntervalMethod method, BootstrapDraws draws) =>
        Refusal(fit, function, level, method) ?? From(fit, function, level, method, Refitted(fit, method, draws));

    /// <summary>Why there is nothing to refit; null where there is.</summary>
    public static FitInterval? Refusal(FittedLaw fit, FitFunction function, double level, IntervalMethod method) =>
        IntervalAnswer.Refusal(fit, function, level, method)
        ?? (fit.Covariance.Count == 0 ? IntervalAnswer.None(fit, function, level, method, "the fit has no covariance")
        : fit.Correlation != 0 && method == IntervalMethod.ResidualBootstrap ? IntervalAnswer.None(fit, function, level, method, "residuals of correlated readings cannot change places; ask for profile likelihood or the parametric bootstrap")
        : fit.Fit.DegreesOfFreedom == 0 && method == IntervalMethod.ResidualBootstrap ? IntervalAnswer.None(fit, function, level, method, "no degrees of freedom are left, so there are no residuals to draw from")
        : null);

    /// <summary>Estimates of all refits, on the fitting scale.</summary>
    public static double[] Refitted(FittedLaw fit, IntervalMethod method, BootstrapDraws draws)
    {
        var name = $"{fit.Curve.Label.Sample}/{fit.Curve.Label.Loading}/{fit.Law.Name}/{method}";
        var noise = BootstrapNoise.Of(fit, method);
        return Refits.Of(fit, draws.Replicates, (replicate, stresses) => noise.Draw(RandomStream.Of(draws.Seed, name, replicate), stresses));
    }

    /// <summary>The interval of a quantity from refits that are already there.</summary>
    public static FitInterval From(FittedLaw fit, FitFunction function, double level, IntervalMethod method, double[] refits)
    {
        var values = Values(function, refits, fit.Scaled.Count);
        var count = refits.Length / fit.Scaled.Count;
        var failed = count - values.Length;
        if (values.Length < BootstrapDraws.FewestReplicates) return IntervalAnswer.None(fit, function, level, method, $"{failed} of {count} refits failed");
        var tail = Tail(fit, level, method);
        var (lower, upper) = (Percentile(values, tail), Percentile(values, 1 - tail));
        if (double.IsNegativeInfinity(upper) || double.IsPositiveInfinity(lower)) return IntervalAnswer.None(fit, function, level, method, "nearly every refit ends at the bound; ask for profile likelihood");
        var range = BelievableRange.Of(fit, function);
        Items<Finding> findings = failed <= MostFailed * count ? [] : [FittingFindings.FailedRefits.At(fit.Curve.Label.Where, $"{fit.Law.Name}: {failed} of {count} refits failed.", (double)failed / count, MostFailed)];
        return IntervalAnswer.Of(fit, function, Limit(lower), Limit(upper), level, method, findings);

        double? Limit(double working) => double.IsFinite(working) && !(working < range.Lower || working > range.Upper) ? function.ToSi(working) : null;
    }

    /// <summary>Probability of each tail of the percentiles.</summary>
    private static double Tail(FittedLaw fit, double level, IntervalMethod method)
    {
        if (method == IntervalMethod.ParametricBootstrap && fit.Errors.ScaleKnown) return (1 - level) / 2;
        return Normal.CDF(0, 1, -StudentQuantile.At(fit.Fit.EffectiveDegreesOfFreedom, 0.5 + level / 2));
    }

    private static double[] Values(FitFunction function, double[] refits, int size)
    {
        var values = new List<double>(refits.Length / size);
        Span<double> gradient = stackalloc double[size];
        for (var at = 0; at < refits.Length; at += size)
        {
            var value = double.IsNaN(refits[at]) ? double.NaN : function.At(refits.AsSpan(at, size), gradient);
            if (!double.IsNaN(value)) values.Add(value);
        }

        values.Sort();
        return [.. values];
    }

    /// <summary>Between order statistics at p (n + 1), linear; refits at a bound are minus infinity and stay so.</summary>
    private static double Percentile(double[] sorted, double p)
    {
        var place = Math.Clamp(p * (sorted.Length + 1), 1, sorted.Length) - 1;
        var below = (int)place;
        var share = place - below;
        return share == 0 || double.IsInfinity(sorted[below]) ? sorted[below] : sorted[below] + share * (sorted[below + 1] - sorted[below]);
    }
}
