using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// Sucrose in water, 40 % by mass (39.99 %): t = 0.597 (f + 20) - 1438.6 / (f + 20) + 38.24, t in degC and f the fluidity in 1/P, taken from 20 to 40 degC.
/// Two published formulas and a table agree there within 5 %. As a calibration fluid that bound is the half width of a rectangular distribution: standard uncertainty 5 % / sqrt(3) = 2.9 %.
/// </summary>
/// <remarks>Source: Bingham and Jackson 1918, Bull Bur Stand 14:59-86; the bound by comparison with Genotelle 1978.</remarks>
public static class Sucrose
{
    /// <summary>Largest relative departure between published values, 0.05.</summary>
    public const double Bound = 0.05;

    /// <summary>Factor from standard uncertainty to that bound, sqrt(3).</summary>
    public const double BoundFactor = 1.7320508075688772;

    /// <summary>Temperatures for which the bound holds, in degC.</summary>
    public static Interval ValidTemperatures { get; } = new(20, 40);

    /// <summary>Where the formula was published.</summary>
    public static Citation Source { get; } = new("Bingham and Jackson", 1918, "Bulletin of the Bureau of Standards 14:59-86");

    /// <summary>Viscosity of the solution.</summary>
    /// <param name="temperature">Temperature, 20 to 40 degC.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the range.</exception>
    public static Viscosity ViscosityAt(Temperature temperature)
    {
        Check(temperature);
        return new(Math.Exp(LnViscosity(temperature.DegreesCelsius)));
    }

    /// <summary>Local temperature coefficient, -d ln(viscosity)/dT, in 1/K.</summary>
    /// <param name="temperature">Temperature, 20 to 40 degC.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the range.</exception>
    public static double PerKelvinAt(Temperature temperature)
    {
        Check(temperature);
        return -LocalSlope.Of(LnViscosity, temperature.DegreesCelsius);
    }

    private static double LnViscosity(double t)
    {
        var half = (t - 38.24) / (2 * 0.597);
        var fluidity = half + Math.Sqrt(half * half + 1438.6 / 0.597) - 20;
        return Math.Log(0.1 / fluidity);
    }

    private static void Check(Temperature temperature)
    {
        if (!ValidTemperatures.Contains(temperature.DegreesCelsius)) throw new ArgumentOutOfRangeException(nameof(temperature), Invariant($"The viscosity of the sucrose solution is taken from 20 to 40 degC, not at {temperature}."));
    }
}
