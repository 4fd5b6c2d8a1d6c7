namespace HemoRheo;

/// <summary>The checks of one instrument in order of time, and the periods they make. Asked for a status by <c>At</c>.</summary>
/// <param name="Instrument">The instrument.</param>
/// <param name="Checks">All its checks, failed ones included.</param>
/// <param name="Periods">Its periods.</param>
/// <param name="Findings">Findings about the history as a whole.</param>
public sealed record InstrumentHistory(Instrument Instrument, Items<InstrumentCheck> Checks, Items<InstrumentPeriod> Periods, Items<Finding> Findings)
{
    /// <summary>Its blank runs, by time. Asked by <see cref="InstrumentTorques.TorqueAt"/>.</summary>
    public Items<BlankRun> Blanks { get; init; } = Items<BlankRun>.None;

    /// <inheritdoc/>
    public override string ToString() => $"{Instrument.Name}: {Checks.Count} checks, {Periods.Count} periods, {Findings.Count} findings";
}
