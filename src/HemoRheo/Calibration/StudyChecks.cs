namespace HemoRheo;

/// <summary>Judges the checks of a study's instruments.</summary>
public static class StudyChecks
{
    /// <summary>
    /// The history of every instrument: its blank runs, its checks with their outcome, and the periods that failed checks and adjustments part.
    /// A recording that gives no check is a finding of its instrument's history. An instrument that only checks name, not the study file, has a history of findings alone.
    /// </summary>
    /// <param name="study">The study.</param>
    /// <param name="readings">What was read for it.</param>
    /// <remarks>
    /// A check is judged twice: on its own uncertainty, which settles what the checks' scatter is pooled over, then with that scatter as well.
    /// A check that fails is never averaged into a correction and takes no part in the scatter.
    /// </remarks>
    public static Items<InstrumentHistory> CheckInstruments(this Study study, StudyReadings readings)
    {
        var declared = study.Instruments.Select(instrument => InstrumentHistories.Of(study, instrument, readings.Checks.Where(check => check.Instrument == instrument.Name), readings.Blanks));
        var undeclared = readings.Checks
            .Where(check => study.Instruments.All(instrument => instrument.Name != check.Instrument))
            .GroupBy(check => check.Instrument)
            .OrderBy(checks => checks.Key, StringComparer.Ordinal)
            .Select(checks => InstrumentHistories.OfUndeclared(study, checks.Key, [.. checks]));
        return declared.Concat(undeclared).ToItems();
    }
}
