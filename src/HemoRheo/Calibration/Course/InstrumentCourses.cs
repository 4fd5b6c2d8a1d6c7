namespace HemoRheo;

/// <summary>Makes courses of histories and logs.</summary>
public static class InstrumentCourses
{
    /// <summary>The course by the checks of a study.</summary>
    /// <param name="history">The instrument's history.</param>
    /// <param name="readings">What the checks were read from; names the digests of exports.</param>
    public static InstrumentCourse Course(this InstrumentHistory history, StudyReadings readings) =>
        new(history.Instrument, history.Checks.Select(check => check.ToLog(readings)).ToItems());

    /// <summary>The course by a log, with its corrections applied; adjustments are those of the log and those of the study file.</summary>
    /// <param name="log">The log as it was read.</param>
    /// <param name="instrument">The instrument as the study file declares it: how long a check vouches.</param>
    /// <exception cref="ArgumentException">The log is of another instrument.</exception>
    public static InstrumentCourse Course(this LogContents log, Instrument instrument)
    {
        if (log.Instrument != instrument.Name) throw new ArgumentException($"The log is of instrument '{log.Instrument}', not of '{instrument.Name}'.", nameof(instrument));
        var adjusted = instrument.Adjusted.Concat(log.Adjustments.Select(adjustment => adjustment.At)).Distinct().Order().ToItems();
        return new(instrument with { Adjusted = adjusted }, log.Checks);
    }

    /// <summary>Whether the log holds a check already: the same filling at the same moment, from the same export or with the same readings, also where a correction withdrew it.</summary>
    /// <param name="log">The log as it was read.</param>
    /// <param name="check">The check.</param>
    public static bool Holds(this LogContents log, LoggedCheck check) =>
        log.Like(check).Any(own => (own.ExportDigest is not null && own.ExportDigest == check.ExportDigest) || own.Readings.Equals(check.Readings));

    /// <summary>Whether the log holds a check otherwise: the same filling at the same moment, but with other readings, so that its export was changed since.</summary>
    /// <param name="log">The log as it was read.</param>
    /// <param name="check">The check.</param>
    public static bool HoldsOtherwise(this LogContents log, LoggedCheck check) => log.Like(check).Any() && !log.Holds(check);

    private static IEnumerable<LoggedCheck> Like(this LogContents log, LoggedCheck check) => log.Entries
        .Select(entry => entry.What is LoggedCorrection correction ? correction.Instead : entry.What)
        .OfType<LoggedCheck>()
        .Where(own => own.Name == check.Name && own.Filling == check.Filling && own.At == check.At);
}
