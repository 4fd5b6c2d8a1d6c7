namespace HemoRheo;

/// <summary>What all curves of the study together say of one law.</summary>
/// <param name="Law">Name of the law.</param>
/// <param name="Curves">Number of usable fits.</param>
/// <param name="ChiSquare">Pooled weighted sum of squared residuals.</param>
/// <param name="DegreesOfFreedom">Pooled degrees of freedom.</param>
/// <param name="Probability">Probability of a sum as large if the law is right and the declared errors are.</param>
/// <param name="PatternProbability">Probability of mean residuals as large at the same places along the curves if the law is right, whatever the size of the errors.</param>
/// <param name="Fits">Whether the law may be decided by.</param>
/// <param name="Words">The judgment in one sentence.</param>
public sealed record LawEvidence(string Law, int Curves, double ChiSquare, int DegreesOfFreedom, double Probability, double PatternProbability, bool Fits, string Words)
{
    /// <summary>The kind of finding that keeps its values from being decided on; null where it fits.</summary>
    internal FindingKind? Unfit => Fits ? null : Curves == 0 ? PoolingFindings.LawNotJudged : PoolingFindings.LawDoesNotFit;
}
