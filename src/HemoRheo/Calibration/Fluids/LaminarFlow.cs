using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// The operating window of a check's fluid: readings taken above the speed at which vortices set in between the cylinders read too much torque though the instrument is right,
/// so they are set aside.
/// </summary>
internal static class LaminarFlow
{
    // No calibration liquid is denser; where even this density would leave flow laminar nothing need be said.
    private const double DensestLiquid = 2000;

    /// <summary>Faults at points beyond laminar flow; notes where it could not be judged, or which cylinder turns is not known.</summary>
    internal static IEnumerable<Finding> Judge(Study study, FlowCurve curve, CalibrationFluid fluid)
    {
        var geometry = study.Geometries.FirstOrDefault(known => known.Name == curve.Label.Recording?.Geometry);
        if (geometry is null or { Turning: TurningCylinder.Outer } || geometry.CriticalReynoldsNumber() is not { } critical) return [];
        var temperature = curve.MeanTemperature!.Value;
        var viscosity = fluid.ViscosityAt(temperature);
        double Reynolds(FlowPoint point, double density) => geometry.ReynoldsNumber(SpeedOf(point, geometry), viscosity, density);
        if (fluid.DensityAt(temperature) is not { } density)
        {
            var densest = curve.Points.Max(point => Reynolds(point, DensestLiquid));
            return densest <= critical ? [] : [CalibrationFindings.DensityUnknown.At(
                curve.Label.Where, Invariant($"The fastest readings of check '{curve.Label.Sample}' leave laminar flow if '{fluid.Name}' is denser than {DensestLiquid * critical / densest:F0} kg/m3."), null, DensestLiquid * critical / densest)];
        }

        return Judge(curve, geometry, critical, point => Reynolds(point, density));
    }

    private static IEnumerable<Finding> Judge(FlowCurve curve, Geometry geometry, double critical, Func<FlowPoint, double> reynolds)
    {
        var beyond = curve.Points.Where(point => reynolds(point) > critical).ToArray();
        foreach (var point in beyond)
        {
            yield return CalibrationFindings.FlowNotLaminar.At(
                curve.PlaceOf(point),
                Invariant($"Reading {point.Number} was taken at {SpeedOf(point, geometry):G4} rad/s, a Reynolds number of {reynolds(point):F0}; with this fluid vortices set in at {critical:F0} in '{geometry.Name}'."),
                reynolds(point),
                critical);
        }

        if (beyond.Length > 0 && geometry.Turning is null)
        {
            yield return CalibrationFindings.TurningUnknown.At(curve.Label.Where, $"Which cylinder of '{geometry.Name}' turns is not declared, so {beyond.Length} readings of check '{curve.Label.Sample}' were set aside as if the inner one did.");
        }
    }

    private static double SpeedOf(FlowPoint point, Geometry geometry) => point.Reading?.Speed ?? point.Rate.ReciprocalSeconds / geometry.RatePerSpeed();
}
