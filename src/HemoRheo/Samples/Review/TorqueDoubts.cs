namespace HemoRheo;

/// <summary>Finds readings at torques where a check failed, or failed afterwards, while the check as a whole did not.</summary>
internal static class TorqueDoubts
{
    /// <summary>A finding for each such decade of torque in which the curve has kept readings, by ascending torque.</summary>
    /// <param name="course">The instrument's checks.</param>
    /// <param name="curve">A screened curve of blood.</param>
    /// <param name="moment">When it was measured.</param>
    internal static IEnumerable<Finding> Of(InstrumentCourse course, FlowCurve curve, DateTimeOffset moment)
    {
        if (!HasFailedBand(course) || Failed(course.At(moment))) return [];
        var partly = course with { Checks = NotFailed(course).ToItems() };
        return curve.Points.Select(curve.TorqueOf).OfType<double>().Where(torque => torque > 0)
            .GroupBy(TorqueDecade.Of)
            .OrderBy(decade => decade.Key.Lower)
            .Select(decade => (Readings: decade.Count(), Standing: partly.At(moment, decade.First())))
            .Where(decade => Failed(decade.Standing))
            .Select(decade => CalibrationFindings.TorquesInDoubt.At(
                curve.Label.Where,
                $"Kept readings lie where the check failed: {decade.Standing.Reason}",
                decade.Readings));
    }

    /// <summary>Whether any check failed in a decade of torque and not as a whole.</summary>
    internal static bool HasFailedBand(InstrumentCourse course) => NotFailed(course).Any(check => check.Bands.Any(band => band.Outcome == CheckOutcome.Fails));

    // What a check that failed as a whole puts in doubt is said by the instrument's status.
    private static IEnumerable<LoggedCheck> NotFailed(InstrumentCourse course) => course.Checks.Where(check => check.Outcome != CheckOutcome.Fails);

    private static bool Failed(InstrumentStanding standing) =>
        standing.Findings.Any(finding => finding.Kind == CalibrationFindings.InstrumentFailed || finding.Kind == CalibrationFindings.FailureReachesBack);
}
