namespace HemoRheo;

/// <summary>What an instrument's checks say of a moment.</summary>
public static class InstrumentStandings
{
    /// <summary>
    /// The instrument's status at a moment from the checks around it. Unknown: no check before, or none since an adjustment. Failed: after a failed check and before the next passed one.
    /// In doubt: the next decided check failed, the last could not tell, or the last passed one is longer ago than it vouches. In order: else.
    /// </summary>
    /// <param name="history">The instrument's history.</param>
    /// <param name="moment">The moment; a check at this very moment lies before it.</param>
    /// <returns>The status, and the period whose correction applies: the last that began before the moment, unless the instrument was adjusted since its last check.</returns>
    public static InstrumentStanding At(this InstrumentHistory history, DateTimeOffset moment)
    {
        var standing = Vouching.At(history.Instrument, [.. history.Checks.Select(VouchingCheck.Of)], moment);
        if (standing.Status == InstrumentStatus.Unknown) return standing;
        var last = history.Checks.Last(check => check.At <= moment);
        return standing with
        {
            Period = Vouching.AdjustedSince(history.Instrument, last.At, moment) is null ? history.Periods.LastOrDefault(period => period.From <= moment) : null,
            Findings = history.Findings.Where(finding => finding.Kind == CalibrationFindings.ScatterUnknown).Concat(standing.Findings).ToItems(),
        };
    }

    /// <summary>
    /// The instrument's status at a moment for readings of one torque, by the same rule: a check counts there as its decade of torque does (<see cref="InstrumentCheck.BandAt"/>), and not at all where it has no reading in it.
    /// </summary>
    /// <param name="history">The instrument's history.</param>
    /// <param name="moment">The moment; a check at this very moment lies before it.</param>
    /// <param name="newtonMeters">The torque, N.m, above zero.</param>
    /// <returns>The status there, and the period whose correction applies, which is that of the whole instrument.</returns>
    public static InstrumentStanding At(this InstrumentHistory history, DateTimeOffset moment, double newtonMeters)
    {
        var checks = history.Checks.Select(check => (VouchingCheck.Of(check), check.BandAt(newtonMeters)?.Outcome));
        return Vouching.At(history.Instrument, checks, moment, newtonMeters) with { Period = history.At(moment).Period };
    }
}
