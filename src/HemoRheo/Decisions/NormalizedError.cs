namespace HemoRheo;

/// <summary>E_n, a difference over its expanded uncertainty: 1 or less in size is acceptable.</summary>
/// <remarks>Source: ISO 13528:2015, clause 9 (there called an E_n score).</remarks>
public static class NormalizedError
{
    /// <summary>Coverage of the expanded uncertainties: that of two standard deviations of a normal distribution, so that k is 2 where variances are known and Student's t where not (GUM, G.4).</summary>
    public const double Coverage = 0.9544997361036416;

    /// <summary>E_n of two results: (x - reference) / sqrt(U^2 + U_reference^2).</summary>
    /// <param name="x">A result.</param>
    /// <param name="expanded">Its expanded uncertainty.</param>
    /// <param name="reference">The reference value.</param>
    /// <param name="referenceExpanded">Its expanded uncertainty.</param>
    public static double Of(double x, double expanded, double reference, double referenceExpanded) =>
        (x - reference) / Math.Sqrt(expanded * expanded + referenceExpanded * referenceExpanded);

    /// <summary>E_n of a difference that has the whole budget of both results, what they share included once.</summary>
    /// <param name="difference">The difference on its working scale.</param>
    public static double Of(Value difference) => difference.X / difference.ExpandedUncertainty(Coverage);
}
