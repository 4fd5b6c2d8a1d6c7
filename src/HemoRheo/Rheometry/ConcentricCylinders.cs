namespace HemoRheo;

/// <summary>
/// Relations of concentric cylinders with a driven inner cylinder: what torque and speed are as shear stress and shear rate.
/// With d = outer radius / inner radius, M torque, w angular speed, L length, R inner radius, C end factor:
/// wall stress M / (2 pi L R^2 C); representative stress (1 + d^2) / (2 d^2) of it; representative rate w (1 + d^2) / (d^2 - 1).
/// </summary>
/// <remarks>
/// Source: ISO 3219:1993, annex B. Representative values hold for d up to <see cref="LargestRadiusRatio"/>; in wider gaps they depend on the liquid.
/// For a Newtonian liquid stress over rate is its viscosity at any d.
/// </remarks>
public static class ConcentricCylinders
{
    /// <summary>Largest ratio of radii for which representative values are used, 1.2.</summary>
    public const double LargestRadiusRatio = 1.2;

    /// <summary>Ratio of outer to inner radius.</summary>
    public static double RadiusRatio(this Geometry geometry) => geometry.OuterRadius / geometry.InnerRadius;

    /// <summary>Representative shear stress per torque, Pa/(N.m).</summary>
    public static double StressPerTorque(this Geometry geometry)
    {
        var d2 = SquaredRatio(geometry);
        return (1 + d2) / (2 * d2) * geometry.InnerWallStressPerTorque();
    }

    /// <summary>Representative shear rate per angular speed, (1/s)/(rad/s).</summary>
    public static double RatePerSpeed(this Geometry geometry)
    {
        var d2 = SquaredRatio(geometry);
        return (d2 + 1) / (d2 - 1);
    }

    /// <summary>Shear stress at the inner wall per torque, Pa/(N.m).</summary>
    public static double InnerWallStressPerTorque(this Geometry geometry) =>
        1 / (2 * Math.PI * geometry.Length * geometry.InnerRadius * geometry.InnerRadius * geometry.EndFactor);

    /// <summary>Shear rate at the inner wall per angular speed in a Newtonian liquid, (1/s)/(rad/s).</summary>
    public static double InnerWallRatePerSpeed(this Geometry geometry)
    {
        var d2 = SquaredRatio(geometry);
        return 2 * d2 / (d2 - 1);
    }

    /// <summary>Shear rate at the outer wall per angular speed in a Newtonian liquid, (1/s)/(rad/s).</summary>
    public static double OuterWallRatePerSpeed(this Geometry geometry) => 2 / (SquaredRatio(geometry) - 1);

    private static double SquaredRatio(Geometry geometry) => geometry.RadiusRatio() * geometry.RadiusRatio();
}
