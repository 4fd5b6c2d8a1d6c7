namespace HemoRheo;

/// <summary>One law among those of a study, on the curves that all of them were fitted to.</summary>
/// <param name="Law">Name of the law.</param>
/// <param name="Standing">Where it stands.</param>
/// <param name="Curves">Curves it was compared on; 0 where it took no part.</param>
/// <param name="Criterion">AIC summed over the curves; AICc where each fit estimates the size of the errors. Null where it took no part.</param>
/// <param name="Difference">That less the one of the best law that fits.</param>
/// <param name="DifferenceError">Standard error of the difference from its scatter between curves; null for the best law, and for a single curve.</param>
/// <param name="Weight">Akaike weight among the laws compared.</param>
/// <param name="AtBound">Curves on which its fit ended at its boundary.</param>
public sealed record PooledLaw(string Law, LawStanding Standing, int Curves = 0, double? Criterion = null, double? Difference = null, double? DifferenceError = null, double? Weight = null, int AtBound = 0)
{
    /// <inheritdoc/>
    public override string ToString() => Difference is { } above ? FormattableString.Invariant($"{Law}: {Standing.Words()}, AIC {above:F1} above the best on {Curves} curves") : $"{Law}: {Standing.Words()}";
}
