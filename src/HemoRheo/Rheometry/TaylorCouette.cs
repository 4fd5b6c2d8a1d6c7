namespace HemoRheo;

/// <summary>
/// Where laminar flow between concentric cylinders ends. With the inner cylinder turning and the outer at rest, vortices set in at a Reynolds number
/// density * speed * inner radius * gap / viscosity that depends on the ratio of radii; above it the torque is too large for the viscosity.
/// With the outer cylinder turning and the inner at rest no such vortices arise.
/// </summary>
/// <remarks>
/// Source: Taylor 1923, Phil Trans R Soc A 223:289-343; critical values as DiPrima and Swinney 1981 (in Hydrodynamic Instabilities and the Transition to Turbulence, ch. 6)
/// print them, calculated anew by collocation. Between them Re sqrt(gap / inner radius) is interpolated linearly in gap / inner radius, which is good to 0.15 %; in a gap that vanishes it is the
/// root of the Taylor number 1695.
/// </remarks>
public static class TaylorCouette
{
    private static readonly (double Gap, double Number)[] Nodes =
    [
        .. new (double Ratio, double Reynolds)[]
        {
            (0.5, 68.18627), (0.6, 71.71572), (0.7, 79.49068), (0.75, 85.77646), (0.8, 94.73362),
            (0.85, 108.31308), (0.9, 131.61452), (0.95, 184.98565), (0.975, 260.94989),
        }.Select(critical => (1 / critical.Ratio - 1, critical.Reynolds * Math.Sqrt(1 / critical.Ratio - 1))),
        (0, Math.Sqrt(1694.95)),
    ];

    /// <summary>Smallest ratio of inner to outer radius for which critical values are known, 0.5.</summary>
    public const double SmallestRadiusRatio = 0.5;

    /// <summary>Reynolds number of the gap.</summary>
    /// <param name="geometry">The cylinders.</param>
    /// <param name="radiansPerSecond">Speed of the one that turns, rad/s.</param>
    /// <param name="viscosity">Viscosity of the liquid.</param>
    /// <param name="kilogramsPerCubicMeter">Density of the liquid.</param>
    public static double ReynoldsNumber(this Geometry geometry, double radiansPerSecond, Viscosity viscosity, double kilogramsPerCubicMeter) =>
        kilogramsPerCubicMeter * radiansPerSecond * geometry.InnerRadius * (geometry.OuterRadius - geometry.InnerRadius) / viscosity.PascalSeconds;

    /// <summary>The Reynolds number at which vortices set in with the inner cylinder turning; null where the inner radius is less than half the outer one.</summary>
    /// <param name="geometry">The cylinders.</param>
    public static double? CriticalReynoldsNumber(this Geometry geometry)
    {
        var ratio = geometry.InnerRadius / geometry.OuterRadius;
        if (!(ratio >= SmallestRadiusRatio)) return null;
        var gap = 1 / ratio - 1;
        var at = Array.FindIndex(Nodes, node => gap >= node.Gap);
        var (wide, narrow) = (Nodes[Math.Max(at - 1, 0)], Nodes[at]);
        var share = at == 0 ? 0 : (gap - narrow.Gap) / (wide.Gap - narrow.Gap);
        return (narrow.Number + (wide.Number - narrow.Number) * share) / Math.Sqrt(gap);
    }
}
