namespace HemoRheo;

/// <summary>First-order correlation of the readings within a ramp: readings number i and j are correlated by it to the power of the difference of their numbers.</summary>
/// <param name="Value">What standard errors and tests of fit know of: the declared correlation, the estimated one, or 0.</param>
/// <param name="StandardError">Standard error of that; 0 where it is declared or 0.</param>
/// <param name="Estimate">What the study's residuals say, used or not; null where there are too few curves.</param>
/// <param name="EstimateError">Standard error of the estimate; null where there is none.</param>
/// <param name="Probability">Probability of an estimate as large if readings are independent; null where there is none.</param>
/// <param name="Curves">Curves the estimate rests on.</param>
/// <param name="Words">What is used and why, in one sentence.</param>
public sealed record PointCorrelation(double Value, double StandardError, double? Estimate, double? EstimateError, double? Probability, int Curves, string Words)
{
    /// <inheritdoc/>
    public override string ToString() => Words;
}
