namespace HemoRheo;

/// <summary>A value held against two limits, with the probability of each outcome.</summary>
/// <param name="Outcome">The most probable outcome if it reaches the level, else undecided.</param>
/// <param name="Below">Probability of lying below the lower limit.</param>
/// <param name="Within">Probability of lying between the limits.</param>
/// <param name="Above">Probability of lying above the upper limit.</param>
/// <param name="Level">The level a probability must reach to decide.</param>
/// <remarks>Source: JCGM 106:2012, 7 (conformance probability).</remarks>
public sealed record Verdict(Outcome Outcome, double Below, double Within, double Above, double Level)
{
    /// <summary>Probability that it is wrong to take the value for one between the limits.</summary>
    public double WrongAcceptance => 1 - Within;

    /// <summary>Probability that it is wrong to take the value for one beyond the limits.</summary>
    public double WrongRejection => Within;

    /// <summary>Judges a value against limits on its working scale.</summary>
    /// <param name="value">The value, with the contributions it shares with the limits already taken out.</param>
    /// <param name="limits">Limits on the value's working scale, taken as exact; an end may be infinite.</param>
    /// <param name="level">Probability that decides, above 0.5 and below 1.</param>
    /// <exception cref="ArgumentException">The value is not a finite number, or the limits are not in order.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The level does not lie above 0.5 and below 1.</exception>
    public static Verdict Of(Value value, Interval limits, double level = 0.95)
    {
        if (level is not (> 0.5 and < 1)) throw new ArgumentOutOfRangeException(nameof(level), level, "The level of a verdict lies above 0.5 and below 1.");
        if (!double.IsFinite(value.X) || !double.IsFinite(value.Variance)) throw new ArgumentException(FormattableString.Invariant($"A value of {value.X} with variance {value.Variance} cannot be judged: both must be finite numbers."), nameof(value));
        if (!(limits.Lower <= limits.Upper)) throw new ArgumentException($"The limits {limits} are not in order: the lower one may not lie above the upper one.", nameof(limits));
        var below = value.ProbabilityBelow(limits.Lower);
        var above = value.ProbabilityAbove(limits.Upper);
        var within = Math.Max(0, 1 - below - above);
        var best = Math.Max(within, Math.Max(below, above));
        var outcome = best < level ? Outcome.Undecided : best == within ? Outcome.Within : best == below ? Outcome.Below : Outcome.Above;
        return new(outcome, below, within, above, level);
    }
}
