namespace HemoRheo;

/// <summary>The instrument's status at a moment, and why.</summary>
/// <param name="Status">The status.</param>
/// <param name="Reason">One sentence naming the checks it rests on.</param>
/// <param name="Period">The period whose correction applies; null where there is none.</param>
/// <param name="Findings">Findings; none when in order with a correction.</param>
public sealed record InstrumentStanding(InstrumentStatus Status, string Reason, InstrumentPeriod? Period, Items<Finding> Findings)
{
    /// <inheritdoc/>
    public override string ToString() => $"{Status.Words()}: {Reason}";
}
