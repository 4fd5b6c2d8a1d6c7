using static System.FormattableString;

namespace HemoRheo;

/// <summary>Whether an export that gives shear rate beside speed, or stress beside torque, was made with the geometry it names.</summary>
internal static class ExportedGeometry
{
    // Definitions of one geometry's rate (inner wall, representative, narrow gap) lie within 10 % of each other up to a ratio of radii of 1.2; those of stress, with and without the end factor, within 30 %.
    private const double MostOfRate = 0.10;
    private const double MostOfStress = 0.30;

    /// <summary>A fault where they contradict each other; null where they agree or only one of each pair is exported.</summary>
    internal static Finding? Contradiction(Study study, Recording recording)
    {
        if (study.Geometries.FirstOrDefault(known => known.Name == recording.Geometry) is not { } geometry) return null;
        return Contradiction(recording, geometry, "shear rate", MostOfRate, reading => reading.Rate / (reading.Speed * geometry.RatePerSpeed()))
            ?? Contradiction(recording, geometry, "shear stress", MostOfStress, reading => reading.Stress / (reading.Torque * geometry.StressPerTorque()));
    }

    private static Finding? Contradiction(Recording recording, Geometry geometry, string what, double most, Func<Reading, double?> ratio)
    {
        var ratios = recording.Readings.Select(ratio).OfType<double>().Where(number => number > 0 && double.IsFinite(number)).Order().ToArray();
        if (ratios.Length == 0) return null;
        var middle = ratios[ratios.Length / 2];
        return middle <= 1 + most && middle >= 1 / (1 + most) ? null : CalibrationFindings.GeometryContradicted.At(
            recording.Where with { Sample = recording.Sample, Loading = recording.Loading },
            Invariant($"Check '{recording.Sample}' names '{geometry.Name}', and its exported {what} is {middle:G3} times what that geometry gives."),
            middle,
            1 + most);
    }
}
