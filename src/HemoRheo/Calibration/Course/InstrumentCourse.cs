namespace HemoRheo;

/// <summary>
/// The checks of an instrument in order of time as they stand, from a study or from the instrument's log, and the moments at which it was adjusted: asked for a status at a moment, and for the control chart.
/// </summary>
/// <param name="Instrument">The instrument as the study file declares it, with the adjustments that the log knows as well.</param>
/// <param name="Checks">Its checks by time, failed ones included.</param>
public sealed record InstrumentCourse(Instrument Instrument, Items<LoggedCheck> Checks)
{
    /// <summary>The instrument's status at a moment, by the same rule as <c>history.At</c>; without a period.</summary>
    /// <param name="moment">The moment; a check at this very moment lies before it.</param>
    public InstrumentStanding At(DateTimeOffset moment) => Vouching.At(Instrument, [.. Checks.Select(VouchingCheck.Of)], moment);

    /// <inheritdoc/>
    public override string ToString() => $"course of {Instrument.Name}: {Checks.Count} checks";
}
