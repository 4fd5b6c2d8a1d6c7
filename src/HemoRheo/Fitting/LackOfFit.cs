namespace HemoRheo;

/// <summary>Residuals held against the error model.</summary>
/// <param name="ChiSquare">Weighted sum of squared residuals.</param>
/// <param name="DegreesOfFreedom">Points less free parameters.</param>
/// <param name="Probability">Probability of a sum as large or larger if the law is right and the error model's sizes are known; null where there are no degrees of freedom or the scale is estimated.</param>
public sealed record LackOfFit(double ChiSquare, int DegreesOfFreedom, double? Probability)
{
    /// <summary>Whether the curve contradicts the law: a sum as large has a probability below 0.001.</summary>
    public bool Contradicts => Probability < SmallestProbability;

    internal const double SmallestProbability = 1e-3;
}
