using static System.FormattableString;

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
        return curve.Points.Select(curve.TorqueOf).OfType<double>().Where(torque => torque > 0)
            .GroupBy(TorqueDecade.Of)
            .OrderBy(decade => decade.Key.Lower)
            .Select(decade => (Readings: decade.Count(), Standing: course.At(moment, decade.First())))
            .Where(decade => Failed(decade.Standing))
            .Select(decade => CalibrationFindings.TorquesInDoubt.At(
                curve.Label.Where,
                Invariant($"{decade.Readings} of {curve.Points.Count} kept readings lie where the check failed: {decade.Standing.Reason}"),
                decade.Readings));
    }

    /// <summary>Whether any check failed in a decade of torque.</summary>
    internal static bool HasFailedBand(InstrumentCourse course) => course.Checks.Any(check => check.Bands.Any(band => band.Outcome == CheckOutcome.Fails));

    private static bool Failed(InstrumentStanding standing) =>
        standing.Findings.Any(finding => finding.Kind == CalibrationFindings.InstrumentFailed || finding.Kind == CalibrationFindings.FailureReachesBack);
}
