namespace HemoRheo;

/// <summary>The change of a value when one input, as used, is raised by one standard uncertainty.</summary>
/// <param name="Source">Where it comes from.</param>
/// <param name="Amount">Signed change on the value's working scale.</param>
/// <param name="Estimate">The variance estimate it comes from; contributions of one estimate are right or wrong together. Empty when the variance is taken as known.</param>
/// <param name="DegreesOfFreedom">Degrees of freedom of that estimate for this contribution; positive infinity when known.</param>
public readonly record struct Contribution(Source Source, double Amount, string Estimate = "", double DegreesOfFreedom = double.PositiveInfinity)
{
    internal Contribution Times(double factor) => this with { Amount = factor * Amount };
}
