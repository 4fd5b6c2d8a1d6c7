namespace HemoRheo;

/// <summary>One law among those compared on a curve.</summary>
/// <param name="Fit">Its fit; <see cref="LackOfFit"/> holds its weighted sum of squares and the probability of that.</param>
/// <param name="Parameters">Parameters that the data had to give: those of the law, also one that ended at its bound, and the scale of the errors where it is not known.</param>
/// <param name="MinusTwiceLogLikelihood">-2 log likelihood with the logarithms of the variances, which are taken at the fitted stress; null where the fit is not usable.</param>
/// <param name="Criterion">AICc; null where the fit is not usable or there are too few points for it.</param>
/// <param name="Difference">AICc less the lowest of the laws compared.</param>
/// <param name="Weight">Akaike weight among the laws compared.</param>
/// <param name="Residuals">How its residuals follow each other along the curve; null where the fit is not usable.</param>
/// <param name="WhyNotCompared">Why it takes no part in the weights; null where it does.</param>
/// <param name="Against">What contradicts it; null where nothing does.</param>
public sealed record ComparedLaw(
    FittedLaw Fit,
    int Parameters,
    double? MinusTwiceLogLikelihood,
    double? Criterion,
    double? Difference,
    double? Weight,
    ResidualPattern? Residuals,
    string? WhyNotCompared,
    string? Against)
{
    /// <summary>The law.</summary>
    public FlowLaw Law => Fit.Law;

    /// <summary>Whether these data cannot part it from the best law: compared, not contradicted, and at most <see cref="LawComparison.LargestAlike"/> units of AICc above the lowest.</summary>
    public bool Possible => Against is null && Difference <= LawComparison.LargestAlike;

    /// <inheritdoc/>
    public override string ToString() => WhyNotCompared is { } why
        ? $"{Law}: {why}"
        : FormattableString.Invariant($"{Law}: AICc {Criterion:F2}, difference {Difference:F2}, weight {Weight:F3}{(Against is null ? "" : $", contradicted: {Against}")}");
}
