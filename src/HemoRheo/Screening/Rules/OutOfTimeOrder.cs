using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// A reading whose time lies before that of a reading above it in the file. Cause: a file sorted or edited by hand. Cure: export again. Equal times are in order.
/// </summary>
internal sealed class OutOfTimeOrder : IScreeningRule
{
    public Items<FindingKind> Kinds { get; } = [ScreeningFindings.OutOfTimeOrder];

    public IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample)
    {
        FlowPoint? latest = null;
        foreach (var point in curve.Points)
        {
            if (point.Reading?.Elapsed is not { } elapsed) continue;
            if (latest?.Reading?.Elapsed is { } before && elapsed < before)
            {
                yield return ScreeningFindings.OutOfTimeOrder.At(
                    curve.PlaceOf(point), Invariant($"Reading {point.Number} was taken at {elapsed:G6} s, before reading {latest.Number} at {before:G6} s."), elapsed, before);
            }
            else
            {
                latest = point;
            }
        }
    }
}
