using static System.FormattableString;

namespace HemoRheo;

/// <summary>A guard band between a limit of tolerance and the limit of acceptance: w = r U, where U = k u is the expanded uncertainty of the value that is judged.</summary>
/// <param name="Multiple">r: above zero accepts with more certainty, 0 shares the risk, below zero rejects with more certainty.</param>
/// <param name="CoverageFactor">k, the factor from standard to expanded uncertainty.</param>
/// <remarks>Source: JCGM 106:2012, clause 8.</remarks>
public sealed record GuardBand(double Multiple, double CoverageFactor = 2)
{
    /// <summary>No guard band: the limits of acceptance are those of tolerance.</summary>
    public static GuardBand None { get; } = new(0);

    /// <summary>The guard band whose largest probability of a wrong acceptance at one limit is 1 - level.</summary>
    /// <param name="level">Above 0.5 and below 1.</param>
    /// <param name="degreesOfFreedom">Of the value's uncertainty; positive infinity where it is known.</param>
    /// <exception cref="ArgumentOutOfRangeException">The level does not lie above 0.5 and below 1.</exception>
    public static GuardBand ForLevel(double level, double degreesOfFreedom = double.PositiveInfinity)
    {
        if (level is not (> 0.5 and < 1)) throw new ArgumentOutOfRangeException(nameof(level), level, "The level of a guard band lies above 0.5 and below 1.");
        return new(StudentQuantile.At(degreesOfFreedom, level) / 2);
    }

    /// <summary>Width w of the band for a value of this standard uncertainty.</summary>
    /// <param name="standardUncertainty">On the value's working scale.</param>
    public double Width(double standardUncertainty) => Multiple * CoverageFactor * standardUncertainty;

    /// <summary>Limits of acceptance within limits of tolerance; null where the bands meet, so that nothing can be accepted.</summary>
    /// <param name="limits">Limits of tolerance on the value's working scale; an end may be infinite.</param>
    /// <param name="standardUncertainty">On that scale.</param>
    public Interval? AcceptanceLimits(Interval limits, double standardUncertainty)
    {
        var width = Width(standardUncertainty);
        var inner = new Interval(limits.Lower + width, limits.Upper - width);
        return inner.Lower <= inner.Upper ? inner : null;
    }

    /// <inheritdoc/>
    public override string ToString() => Invariant($"guard band of {Multiple:G3} times the expanded uncertainty (k = {CoverageFactor:G3})");
}
