using static System.FormattableString;

namespace HemoRheo;

/// <summary>What rooms that judge curves do with their findings.</summary>
internal static class FlowCurveWords
{
    /// <summary>
    /// The curve with more findings. A fault at a point sets that point aside with all faults at it; every other finding is kept with the curve, once.
    /// </summary>
    internal static FlowCurve WithFindings(this FlowCurve curve, IEnumerable<Finding> findings)
    {
        var all = findings.ToArray();
        var faults = all.Where(finding => finding.Severity == Severity.Fault && finding.Where.Point is not null).ToLookup(finding => finding.Where.Point!.Value);
        var ofCurve = all.Where(finding => finding.Severity != Severity.Fault || finding.Where.Point is null);
        return curve with
        {
            Points = curve.Points.Where(point => !faults.Contains(point.Number)).ToItems(),
            SetAside = curve.SetAside.With(curve.Points.Where(point => faults.Contains(point.Number)).Select(point => new SetAside(point, faults[point.Number].ToItems()))),
            Findings = curve.Findings.Concat(ofCurve).Distinct().ToItems(),
        };
    }

    /// <summary>The place of a point, with its line where it comes from a file. Without a column: a reading knows only that of its stress or torque.</summary>
    internal static Where PlaceOf(this FlowCurve curve, FlowPoint point) => curve.PlaceOfStress(point) with { Column = null };

    /// <summary>The place of a point's shear stress, or of its torque where it has no other; with line and column where it comes from a file.</summary>
    internal static Where PlaceOfStress(this FlowCurve curve, FlowPoint point) =>
        (point.Reading?.Where ?? curve.Label.Where) with { Sample = curve.Label.Sample, Loading = curve.Label.Loading, Point = point.Number };

    /// <summary>Rotational speed of a point, rad/s: as read, or by the geometry; null where neither is known.</summary>
    internal static double? SpeedOf(this FlowCurve curve, FlowPoint point, Study study) =>
        point.Reading?.Speed ?? point.Rate.ReciprocalSeconds / study.Geometries.FirstOrDefault(known => known.Name == curve.Label.Recording?.Geometry)?.RatePerSpeed();

    /// <summary>A finding where rate or stress is not above zero and finite; null where both are.</summary>
    internal static Finding? NotPositive(this FlowCurve curve, FlowPoint point)
    {
        var (rate, stress) = (point.Rate.ReciprocalSeconds, point.Stress.Pascals);
        if (!IsPositive(rate)) return RheometryFindings.NotPositive.At(curve.PlaceOf(point), Invariant($"Reading {point.Number} has a shear rate of {rate:G6} 1/s; it must be above 0."), rate, 0);
        if (!IsPositive(stress)) return RheometryFindings.NotPositive.At(curve.PlaceOfStress(point), Invariant($"Reading {point.Number} has a shear stress of {stress:G6} Pa; it must be above 0."), stress, 0);
        return null;
    }

    private static bool IsPositive(double number) => number > 0 && double.IsFinite(number);
}
