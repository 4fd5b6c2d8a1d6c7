using static System.FormattableString;

namespace HemoRheo;

/// <summary>A value held against limits with a guard band: accepted or not, and how probable it is that this is wrong.</summary>
/// <param name="Accepted">Whether the value lies within the limits of acceptance.</param>
/// <param name="Limits">The limits of acceptance on the value's working scale; null where the guard bands leave none.</param>
/// <param name="WrongAcceptance">Probability that accepting this value is wrong: that the quantity lies beyond the limits of tolerance (specific consumer's risk).</param>
/// <param name="WrongRejection">Probability that rejecting this value is wrong: that the quantity lies within them (specific producer's risk).</param>
/// <param name="LargestWrongAcceptance">Largest probability of a wrong acceptance among values that are accepted, which is that of a value at a limit of acceptance; 0 where none can be accepted.</param>
/// <param name="LargestWrongRejection">Largest probability of a wrong rejection among values that are rejected.</param>
/// <remarks>Source: JCGM 106:2012, clauses 7 to 9.</remarks>
public sealed record Acceptance(bool Accepted, Interval? Limits, double WrongAcceptance, double WrongRejection, double LargestWrongAcceptance, double LargestWrongRejection)
{
    /// <summary>Judges a value by limits of acceptance.</summary>
    /// <param name="value">The value, with the contributions it shares with the limits already taken out.</param>
    /// <param name="limits">Limits of tolerance on the value's working scale, taken as exact; an end may be infinite.</param>
    /// <param name="guard">The guard band.</param>
    /// <exception cref="ArgumentException">The value is not a finite number, or the limits are not in order.</exception>
    public static Acceptance Of(Value value, Interval limits, GuardBand guard) => By(value, limits, guard.AcceptanceLimits(limits, value.StandardUncertainty));

    /// <summary>
    /// Judges a value by the limits of acceptance at which a wrong acceptance has the probability 1 - level, the far limit's part included: values between them are those of which <see cref="Verdict"/> says within.
    /// </summary>
    /// <param name="value">The value, with the contributions it shares with the limits already taken out.</param>
    /// <param name="limits">Limits of tolerance on the value's working scale, taken as exact; an end may be infinite.</param>
    /// <param name="level">Above 0.5 and below 1.</param>
    /// <exception cref="ArgumentException">The value is not a finite number, or the limits are not in order.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The level does not lie above 0.5 and below 1.</exception>
    public static Acceptance AtLevel(Value value, Interval limits, double level)
    {
        var oneSided = GuardBand.ForLevel(level, value.DegreesOfFreedom).AcceptanceLimits(limits, value.StandardUncertainty);
        if (oneSided is not { } inner || !double.IsFinite(limits.Lower) || !double.IsFinite(limits.Upper)) return By(value, limits, oneSided);
        var middle = (limits.Lower + limits.Upper) / 2;
        bool Sure(double x) => Within(value with { X = x }, limits) >= level;
        return By(value, limits, Sure(middle) ? new(Edge(inner.Lower, middle, Sure), Edge(inner.Upper, middle, Sure)) : null);
    }

    private static Acceptance By(Value value, Interval limits, Interval? accepted)
    {
        var within = Within(value, limits);
        double[] ends = accepted is { } inner ? [.. new[] { inner.Lower, inner.Upper }.Where(double.IsFinite)] : [];
        var atEnds = ends.Select(end => Within(value with { X = end }, limits)).ToArray();
        var largestWrongRejection = accepted is null ? Within(value with { X = (limits.Lower + limits.Upper) / 2 }, limits) : atEnds.DefaultIfEmpty(0).Max();
        return new(accepted?.Contains(value.X) ?? false, accepted, 1 - within, within, atEnds.Select(inside => 1 - inside).DefaultIfEmpty(0).Max(), largestWrongRejection);
    }

    /// <inheritdoc/>
    public override string ToString() => Accepted
        ? Invariant($"accepted, wrongly with a probability of {WrongAcceptance:G3} (at most {LargestWrongAcceptance:G3})")
        : Invariant($"not accepted, wrongly with a probability of {WrongRejection:G3} (at most {LargestWrongRejection:G3})");

    private static double Edge(double unsure, double sure, Func<double, bool> isSure)
    {
        for (var step = 0; step < 40 && unsure != sure; step++)
        {
            var middle = (unsure + sure) / 2;
            if (isSure(middle)) sure = middle;
            else unsure = middle;
        }

        return sure;
    }

    private static double Within(Value value, Interval limits) => Verdict.Of(value, limits).Within;
}
