using System.Globalization;

namespace HemoRheo;

/// <summary>Wald intervals: quantile times standard error on the working scale, by the delta method for what is derived.</summary>
/// <remarks>Sources: Wald 1943, Transactions of the American Mathematical Society 54:426-482; JCGM 100:2008 (GUM), 5.1.2, for the delta method.</remarks>
internal static class WaldInterval
{
    public static FitInterval Of(FittedLaw fit, FitFunction function, double level)
    {
        const IntervalMethod Method = IntervalMethod.Wald;
        if (IntervalAnswer.Refusal(fit, function, level, Method) is { } refusal) return refusal;
        if (WhyNone(fit, function, level) is { } why) return IntervalAnswer.None(fit, function, level, Method, why);
        var (estimate, half) = (function.Estimate(fit), IntervalAnswer.Quantile(fit, level) * function.StandardError(fit));
        var range = BelievableRange.Of(fit, function);
        return IntervalAnswer.Of(fit, function, Limit(estimate - half), Limit(estimate + half), level, Method, []);

        double? Limit(double working) => range.Contains(working) ? function.ToSi(working) : null;
    }

    private static string? WhyNone(FittedLaw fit, FitFunction function, double level)
    {
        if (!double.IsFinite(function.Estimate(fit))) return "it is held at its bound; ask for profile likelihood";
        if (fit.Covariance.Count == 0) return "the fit has no covariance";
        if (function.Parameter is not { } k || k != fit.Law.Boundary?.Parameter) return null;
        var distance = (fit.Parameters[k].Estimate - fit.Law.Parameters[k].Lower) / fit.Parameters[k].StandardError!.Value;
        return distance > IntervalAnswer.Quantile(fit, level) ? null : string.Create(
            CultureInfo.InvariantCulture,
            $"the estimate is {distance:F1} standard errors from its bound, too near to say whether the bound is excluded; ask for profile likelihood");
    }
}
