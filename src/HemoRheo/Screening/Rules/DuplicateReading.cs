using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// A reading whose rate differs from that of an earlier kept reading of its ramp by less than the study's relative tolerance. Cause: a step read twice. The earlier one is kept.
/// </summary>
internal sealed class DuplicateReading : IScreeningRule
{
    public Items<FindingKind> Kinds { get; } = [ScreeningFindings.DuplicateReading];

    public IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample)
    {
        var tolerance = study.Screening.DuplicateTolerance;
        var kept = new List<FlowPoint>();
        foreach (var point in curve.Points)
        {
            var earlier = kept.Find(other => other.Ramp == point.Ramp && Repeats(point, other, tolerance));
            if (earlier is null)
            {
                kept.Add(point);
                continue;
            }

            var (rate, first) = (point.Rate.ReciprocalSeconds, earlier.Rate.ReciprocalSeconds);
            yield return ScreeningFindings.DuplicateReading.At(
                curve.PlaceOf(point), Invariant($"Reading {point.Number} at {rate:G5} 1/s repeats reading {earlier.Number} at {first:G5} 1/s; readings of a ramp lie at least {100 * tolerance:G3} % apart."), rate, first);
        }
    }

    private static bool Repeats(FlowPoint point, FlowPoint earlier, double tolerance) =>
        Math.Abs(point.Rate.ReciprocalSeconds - earlier.Rate.ReciprocalSeconds) < tolerance * earlier.Rate.ReciprocalSeconds;
}
