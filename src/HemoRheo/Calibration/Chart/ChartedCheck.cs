namespace HemoRheo;

/// <summary>A check as a control chart takes it: one number a filling. A filling that was read again is one check.</summary>
/// <param name="Name">Name of the check.</param>
/// <param name="At">When it was taken.</param>
/// <param name="Error">ln(measured/expected) with its contributions.</param>
/// <param name="Fluid">Fluid and lot.</param>
/// <param name="Outcome">Its own verdict; a failed check is drawn and judged but makes no baseline.</param>
public sealed record ChartedCheck(string Name, DateTimeOffset At, Value Error, string Fluid, CheckOutcome Outcome)
{
    internal Where Where => Where.Nowhere with { Sample = Name };

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"check '{Name}' of {At:yyyy-MM-dd}");
}
