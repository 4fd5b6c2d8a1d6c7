using static System.FormattableString;

namespace HemoRheo;

/// <summary>How often a rule signals on an instrument that has not changed.</summary>
/// <param name="Baseline">Checks that the limits were made of; null for limits known exactly.</param>
/// <param name="Within52">Share of steady instruments with at least one such signal among 52 checks (a year of weekly ones).</param>
/// <param name="Within52Known">The same with limits known exactly.</param>
public sealed record ChartFalseAlarm(int? Baseline, double Within52, double Within52Known)
{
    /// <inheritdoc/>
    public override string ToString() => Baseline is { } checks
        ? Invariant($"an instrument that has not changed gives such a signal among 52 checks in {100 * Within52:F0} of 100 cases (limits from {checks} checks; {100 * Within52Known:F0} of 100 were they known exactly)")
        : Invariant($"an instrument that has not changed gives such a signal among 52 checks in {100 * Within52:F0} of 100 cases");
}
