using static System.FormattableString;

namespace HemoRheo;

/// <summary>A yield stress far below every stress that was read: the form of the law gives it, not the curve.</summary>
internal static class FarExtrapolation
{
    /// <summary>The finding, where the limits of a yield stress lie so far below the readings.</summary>
    public static IEnumerable<Finding> Of(FittedLaw fit, FitFunction function, double? upper)
    {
        if (function.Parameter is not { } k || fit.Law.Parameters[k] is not { Name: "yield stress" } || upper is not > 0) yield break;
        var lowest = fit.Curve.Points.Min(point => point.Stress.Pascals);
        if (!(lowest > YieldStressEvidence.NearEnough * upper)) yield break;
        yield return FittingFindings.YieldStressByForm.At(
            fit.Curve.Label.Where,
            Invariant($"Right only if the form of {fit.Law.Name} is: the lowest stress read is {lowest / upper:F1} times the upper limit."),
            lowest / upper,
            YieldStressEvidence.NearEnough);
    }
}
