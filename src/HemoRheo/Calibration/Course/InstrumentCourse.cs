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

    /// <summary>The instrument's status at a moment for readings of one torque, by the same rule: a check counts there as its decade of torque does, and not at all where it has no reading in it.</summary>
    /// <param name="moment">The moment; a check at this very moment lies before it.</param>
    /// <param name="newtonMeters">The torque, N.m, above zero.</param>
    public InstrumentStanding At(DateTimeOffset moment, double newtonMeters) =>
        Vouching.At(Instrument, Checks.Select(check => (VouchingCheck.Of(check), check.BandAt(newtonMeters)?.Outcome)), moment, newtonMeters);

    /// <summary>The instrument's status at a moment in every decade of torque that its checks have readings in, by ascending torque.</summary>
    /// <param name="moment">The moment; a check at this very moment lies before it.</param>
    public Items<TorqueStanding> ByTorque(DateTimeOffset moment) => Checks.SelectMany(check => check.Bands).Select(band => band.Torque).Distinct()
        .OrderBy(decade => decade.Lower)
        .Select(decade => new TorqueStanding(decade, At(moment, decade.Lower)))
        .ToItems();

    /// <inheritdoc/>
    public override string ToString() => $"course of {Instrument.Name}: {Checks.Count} checks";
}
