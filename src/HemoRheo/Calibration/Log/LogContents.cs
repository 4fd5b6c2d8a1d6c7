namespace HemoRheo;

/// <summary>A log as it was read.</summary>
/// <param name="Instrument">Name of the instrument.</param>
/// <param name="Entries">All entries that can be read, as they were written.</param>
/// <param name="Standing">Checks, adjustments and blank runs as they stand after corrections, by the time they happened; withdrawn ones are not among them.</param>
/// <param name="Verification">Whether the log is as it was written.</param>
/// <param name="Findings">Findings, those of the entries included.</param>
public sealed record LogContents(string Instrument, Items<LogEntry> Entries, Items<StandingEntry> Standing, LogVerification Verification, Items<Finding> Findings)
{
    /// <summary>Checks as they stand, by time; several of one filling are readings of one check.</summary>
    public Items<LoggedCheck> Checks => Standing.Select(entry => entry.What).OfType<LoggedCheck>().ToItems();

    /// <summary>Adjustments as they stand, by time.</summary>
    public Items<LoggedAdjustment> Adjustments => Standing.Select(entry => entry.What).OfType<LoggedAdjustment>().ToItems();

    /// <summary>Blank runs as they stand, by time.</summary>
    public Items<LoggedBlankRun> BlankRuns => Standing.Select(entry => entry.What).OfType<LoggedBlankRun>().ToItems();

    /// <inheritdoc/>
    public override string ToString() => $"log of {Instrument}: {Entries.Count} entries, {Checks.Count} checks, {Findings.Count} findings";
}
