using static System.FormattableString;

namespace HemoRheo;

/// <summary>What of a check vouches for the instrument: its moment and its outcome.</summary>
/// <param name="Name">Name of the check.</param>
/// <param name="At">When.</param>
/// <param name="Outcome">What it said.</param>
/// <param name="Where">Where it is recorded.</param>
internal sealed record VouchingCheck(string Name, DateTimeOffset At, CheckOutcome Outcome, Where Where)
{
    internal static VouchingCheck Of(InstrumentCheck check) => new(check.Name, check.At, check.Outcome, check.Fit.Curve.Label.Where);

    internal static VouchingCheck Of(LoggedCheck check) => new(check.Name, check.At, check.Outcome, new(File: check.Export, Sample: check.Name, Loading: check.Filling));

    /// <inheritdoc/>
    public override string ToString() => Invariant($"check '{Name}' of {At:yyyy-MM-dd}");
}
