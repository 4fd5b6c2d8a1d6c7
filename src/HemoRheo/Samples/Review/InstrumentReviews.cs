namespace HemoRheo;

/// <summary>Looks at instruments.</summary>
public static class InstrumentReviews
{
    /// <summary>
    /// An instrument at a moment. With a log its checks are those of the log, corrections applied; without one, those of the study.
    /// Checks and samples later than the moment are left out, as if nobody knew of them yet.
    /// </summary>
    /// <param name="history">The instrument's history in the study.</param>
    /// <param name="readings">What was read for the study.</param>
    /// <param name="at">The moment; the library has no clock.</param>
    /// <param name="log">The instrument's log; null for none.</param>
    /// <exception cref="ArgumentException">The log is of another instrument.</exception>
    public static InstrumentReview Review(this InstrumentHistory history, StudyReadings readings, DateTimeOffset at, LogContents? log = null)
    {
        var own = history.Course(readings).Until(at);
        var course = (log?.Course(history.Instrument) ?? own).Until(at);
        var chart = course.ControlChart();
        var blood = readings.Blood.Where(recording => recording.Instrument == history.Instrument.Name && recording.StartedAt <= at).ToArray();
        return new(
            readings.Study.Name,
            course,
            at,
            course.At(at),
            chart,
            blood.Select(recording => recording.Sample).Distinct().Count(),
            SamplesInDoubt.Of(readings, course, chart, blood),
            log?.Verification,
            log is null ? [] : own.Checks.Where(check => !log.Holds(check)).ToItems());
    }

    /// <summary>An instrument at the last moment that the study knows of: its last check or sample.</summary>
    /// <param name="history">The instrument's history in the study.</param>
    /// <param name="readings">What was read for the study.</param>
    /// <returns>The review; null where the study has neither check nor sample of it.</returns>
    public static InstrumentReview? ReviewAtLast(this InstrumentHistory history, StudyReadings readings)
    {
        var moments = readings.Blood.Where(recording => recording.Instrument == history.Instrument.Name).Select(recording => recording.StartedAt)
            .Concat(history.Checks.Select(check => check.At)).ToArray();
        return moments.Length == 0 ? null : history.Review(readings, moments.Max());
    }

    private static InstrumentCourse Until(this InstrumentCourse course, DateTimeOffset at) => course with
    {
        Instrument = course.Instrument with { Adjusted = course.Instrument.Adjusted.Where(adjusted => adjusted <= at).ToItems() },
        Checks = course.Checks.Where(check => check.At <= at).ToItems(),
    };
}
