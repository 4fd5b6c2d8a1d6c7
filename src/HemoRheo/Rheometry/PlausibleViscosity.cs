namespace HemoRheo;

/// <summary>What blood or plasma can show: from 0.5 mPa.s, below water at 37 degC, to 50 mPa.s and a yield stress of 1 Pa. Common practice, no source; far wider than any published value.</summary>
internal static class PlausibleViscosity
{
    /// <summary>Lowest viscosity, Pa.s.</summary>
    public const double Lowest = 0.0005;

    private const double Highest = 0.05;
    private const double LargestYieldStress = 1;

    /// <summary>Whether a point lies below it.</summary>
    public static bool IsBelow(FlowPoint point) => point.ApparentViscosity.PascalSeconds < Lowest;

    /// <summary>Whether a point lies above it.</summary>
    public static bool IsAbove(FlowPoint point) => point.ApparentViscosity.PascalSeconds > HighestAt(point);

    /// <summary>Highest viscosity at the rate of a point, Pa.s.</summary>
    public static double HighestAt(FlowPoint point) => Highest + LargestYieldStress / point.Rate.ReciprocalSeconds;
}
