namespace HemoRheo;

/// <summary>Residuals held against the error model.</summary>
/// <param name="ChiSquare">Weighted sum of squared residuals.</param>
/// <param name="DegreesOfFreedom">Points less free parameters.</param>
/// <param name="Probability">Probability of a sum as large or larger if the law is right and the error model's sizes are known; null where there are no degrees of freedom or the scale is estimated.</param>
public sealed record LackOfFit(double ChiSquare, int DegreesOfFreedom, double? Probability)
{
    /// <summary>The sum to expect if the law is right and the error model's sizes are known: the degrees of freedom, and less where readings are correlated.</summary>
    public double Expected { get; init; } = DegreesOfFreedom;

    /// <summary>Degrees of freedom of a scale estimated from the sum: <see cref="DegreesOfFreedom"/>, and less where readings are correlated.</summary>
    public double EffectiveDegreesOfFreedom { get; init; } = DegreesOfFreedom;

    /// <summary>Whether the curve contradicts the law: a sum as large has a probability below 0.001.</summary>
    public bool Contradicts => Probability < SmallestProbability;

    internal const double SmallestProbability = 1e-3;
}
