using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// Speed, or else shear rate, away from the one asked for by more than the study's relative tolerance. Cause: read while the speed still changed. Cure: more time a step.
/// Exports that do not say what was asked for give it nothing to judge.
/// </summary>
internal sealed class SpeedNotReached : IScreeningRule
{
    public Items<FindingKind> Kinds { get; } = [ScreeningFindings.SpeedNotReached];

    public IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample)
    {
        var tolerance = study.Screening.SpeedTolerance;
        foreach (var point in curve.Points)
        {
            var reading = point.Reading;
            if (reading?.SetSpeed is { } askedSpeed && reading.Speed is { } speed)
            {
                if (IsAway(speed, askedSpeed, tolerance)) yield return Away(curve, point, "speed", speed, askedSpeed, "rad/s", tolerance);
            }
            else if (reading?.SetRate is { } askedRate && IsAway(point.Rate.ReciprocalSeconds, askedRate, tolerance))
            {
                yield return Away(curve, point, "shear rate", point.Rate.ReciprocalSeconds, askedRate, "1/s", tolerance);
            }
        }
    }

    private static bool IsAway(double reached, double asked, double tolerance) => Math.Abs(reached - asked) > tolerance * Math.Abs(asked);

    private static Finding Away(FlowCurve curve, FlowPoint point, string what, double reached, double asked, string unit, double tolerance) =>
        ScreeningFindings.SpeedNotReached.At(
            curve.PlaceOf(point), Invariant($"Reading {point.Number} has a {what} of {reached:G5} {unit} where {asked:G5} {unit} was asked for; {100 * tolerance:G3} % is allowed."), reached, asked);
}
