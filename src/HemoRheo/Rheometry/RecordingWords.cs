using static System.FormattableString;

namespace HemoRheo;

/// <summary>Makes flow curves of recordings.</summary>
public static class RecordingWords
{
    /// <summary>
    /// The flow curve of one ramp: from speed and torque where the geometry is known and a reading has both, else from shear rate and stress as exported.
    /// A reading that gives no point above zero is set aside with its reason, never dropped: kept and set-aside points are all readings of the ramp.
    /// </summary>
    /// <param name="recording">The recording.</param>
    /// <param name="study">The study, which declares the geometry and the ramp that is analyzed.</param>
    /// <param name="ramp">The ramp. Readings whose ramp is not stated belong to the one the study analyzes.</param>
    /// <param name="torque">How far its torques can be trusted; a zero that is corrected is taken from every torque. Left out: as the study file declares.</param>
    /// <returns>The curve, not screened. A number that a set-aside reading does not give is NaN in its point.</returns>
    public static FlowCurve ToCurve(this Recording recording, Study study, Ramp ramp, TorqueTrust? torque = null)
    {
        var label = new CurveLabel(recording.Sample, recording.Loading, ramp, recording);
        var geometry = study.Geometries.FirstOrDefault(known => known.Name == recording.Geometry);
        var unknown = recording.Geometry is not null && geometry is null;
        var points = recording.Readings.Where(reading => Belongs(reading.Ramp, ramp, study)).Select(reading => Point(reading, ramp, geometry, torque)).ToItems();
        var curve = new FlowCurve(label, points, [], geometry?.StressPerTorque(), []) { Torque = torque };
        var ofCurve = OfCurve(curve, geometry, unknown, study).ToArray();
        var ofPoints = points.Select(point => OfPoint(curve, point, unknown)).OfType<Finding>();
        return curve.WithFindings(ofCurve.Concat(ofPoints));
    }

    private static bool Belongs(Ramp stated, Ramp asked, Study study) =>
        stated == asked || (stated == Ramp.Unstated && asked == study.Analysis.Ramp);

    private static FlowPoint Point(Reading reading, Ramp ramp, Geometry? geometry, TorqueTrust? standing)
    {
        if (geometry is not null && reading.Speed is { } speed && reading.Torque is { } torque)
        {
            return new(reading.Number, new(speed * geometry.RatePerSpeed()), new((torque - (standing?.Correction(speed) ?? 0)) * geometry.StressPerTorque()), ramp, reading);
        }

        var zero = geometry is not null && standing is not null ? standing.Correction(reading.Rate / geometry.RatePerSpeed()) * geometry.StressPerTorque() : 0;
        return new(reading.Number, new(reading.Rate ?? double.NaN), new(reading.Stress - zero ?? double.NaN), ramp, reading);
    }

    private static IEnumerable<Finding> OfCurve(FlowCurve curve, Geometry? geometry, bool unknown, Study study)
    {
        var where = curve.Label.Where;
        if (unknown)
        {
            var declared = study.Geometries.Count == 0 ? "none" : string.Join(", ", study.Geometries.Select(known => known.Name));
            yield return RheometryFindings.UnknownGeometry.At(where, $"Geometry '{curve.Label.Recording!.Geometry}' is not declared; declared: {declared}.");
        }

        if (geometry?.RadiusRatio() > ConcentricCylinders.LargestRadiusRatio)
        {
            var ratio = geometry.RadiusRatio();
            yield return RheometryFindings.WideGap.At(
                where, Invariant($"Geometry '{geometry.Name}' has a ratio of radii of {ratio:G4}; representative values hold up to {ConcentricCylinders.LargestRadiusRatio}."), ratio, ConcentricCylinders.LargestRadiusRatio);
        }

        if (curve.Points.Count == 0 && curve.Label.Ramp == study.Analysis.Ramp)
        {
            yield return RheometryFindings.NoReadings.At(where, $"None of {curve.Label.Recording!.Readings.Count} readings belongs to the {curve.Label.Ramp.Words()} ramp, which is analyzed.");
        }
    }

    private static Finding? OfPoint(FlowCurve curve, FlowPoint point, bool unknownGeometry)
    {
        var where = curve.PlaceOf(point);
        if (unknownGeometry) return RheometryFindings.UnknownGeometry.At(where, $"Reading {point.Number} was taken with the undeclared geometry '{curve.Label.Recording!.Geometry}'.");
        var reading = point.Reading!;
        var complete = (reading.Rate.HasValue && reading.Stress.HasValue) || (curve.StressPerTorque.HasValue && reading.Speed.HasValue && reading.Torque.HasValue);
        if (!complete)
        {
            var why = reading.Speed.HasValue && reading.Torque.HasValue
                ? "gives speed and torque, but its recording names no geometry"
                : "gives neither speed and torque nor shear rate and stress";
            return RheometryFindings.IncompleteReading.At(where, $"Reading {point.Number} {why}.");
        }

        return curve.NotPositive(point);
    }
}
