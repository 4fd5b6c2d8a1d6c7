namespace HemoRheo;

/// <summary>Makes the answers of all methods.</summary>
internal static class IntervalAnswer
{
    /// <summary>Quantile of the two-sided interval: normal where the sizes of the errors are known, Student's t where their scale is estimated.</summary>
    public static double Quantile(FittedLaw fit, double level) => StudentQuantile.At(fit.Errors.ScaleKnown ? double.PositiveInfinity : fit.Fit.EffectiveDegreesOfFreedom, 0.5 + level / 2);

    /// <summary>An answer with limits, SI; null where a side is open.</summary>
    public static FitInterval Of(FittedLaw fit, FitFunction function, double? lower, double? upper, double level, IntervalMethod method, Items<Finding> findings) =>
        new(function.Name, function.Shown, EstimateOf(fit, function), lower, upper, function.Range, level, method, null, findings.With(FarExtrapolation.Of(fit, function, upper)));

    /// <summary>No answer, with the reason.</summary>
    public static FitInterval None(FittedLaw fit, FitFunction function, double level, IntervalMethod method, string why) =>
        new(function.Name, function.Shown, EstimateOf(fit, function), null, null, function.Range, level, method, why, []);

    /// <summary>What any method answers where the fit is no ground for an interval; null where it is. A fit without a unique solution is ground for a profile alone, which finds out what is not unique.</summary>
    public static FitInterval? Refusal(FittedLaw fit, FitFunction function, double level, IntervalMethod method) =>
        fit.Convergence.Reason == StopReason.Singular ? Singular(fit, function, level, method)
        : !fit.Convergence.Converged ? None(fit, function, level, method, $"there is no fit: {fit.Convergence.Message.TrimEnd('.')}")
        : !fit.Errors.ScaleKnown && fit.Fit.DegreesOfFreedom == 0 ? None(fit, function, level, method, "no degrees of freedom are left to estimate the size of the errors")
        : null;

    private static FitInterval? Singular(FittedLaw fit, FitFunction function, double level, IntervalMethod method) =>
        method == IntervalMethod.ProfileLikelihood && fit.Scaled.All(double.IsFinite) && fit.Fit.DegreesOfFreedom > 0 ? null
        : function.Parameter is not null ? Of(fit, function, null, null, level, method, [])
        : None(fit, function, level, method, "the fit has no unique solution; ask for profile likelihood");

    private static double? EstimateOf(FittedLaw fit, FitFunction function) => fit.Convergence.Converged ? function.ToSi(function.Estimate(fit)) : null;
}
