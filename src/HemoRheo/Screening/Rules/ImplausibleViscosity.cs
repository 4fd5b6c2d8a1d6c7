using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// A curve of blood or plasma most of whose kept points lie, on one side, outside what blood or plasma can show: from 0.5 mPa.s, below water at 37 degC, to 50 mPa.s and a yield stress of 1 Pa.
/// Cause: a unit mistake, mostly a factor of 1000. Cure: correct the layout; nothing is rescaled. Judged here and not where curves are fitted, because here the curve is known to be of blood: a calibration oil may have any viscosity.
/// </summary>
internal sealed class ImplausibleViscosity : IScreeningRule
{
    private const int FewestPoints = 3;

    public Items<FindingKind> Kinds { get; } = [ScreeningFindings.ImplausibleViscosity];

    public IEnumerable<Finding> Judge(FlowCurve curve, Study study, SampleRecord? sample)
    {
        if (curve.Label.Recording is { Kind: not RecordingKind.Blood } || curve.Points.Count < FewestPoints) yield break;
        FlowPoint[] low = [.. curve.Points.Where(PlausibleViscosity.IsBelow)];
        FlowPoint[] high = [.. curve.Points.Where(PlausibleViscosity.IsAbove)];
        if (2 * low.Length > curve.Points.Count) yield return Found(curve, low, "below 0.5 mPa.s", PlausibleViscosity.Lowest);
        if (2 * high.Length > curve.Points.Count) yield return Found(curve, high, "above 50 mPa.s and a yield stress of 1 Pa", PlausibleViscosity.HighestAt(high[0]));
    }

    private static Finding Found(FlowCurve curve, FlowPoint[] points, string side, double limit) => ScreeningFindings.ImplausibleViscosity.At(
        curve.Label.Where,
        Invariant($"{points.Length} of {curve.Points.Count} kept points lie {side}, which blood or plasma cannot show: {points[0].ApparentViscosity.PascalSeconds:G3} Pa.s at {points[0].Rate}."),
        points[0].ApparentViscosity.PascalSeconds,
        limit);
}
