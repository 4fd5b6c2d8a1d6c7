using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// Viscosity of liquid water at 0.1 MPa: viscosity = sum of a (T/300 K)^b in uPa.s, T the temperature in K, from 253.15 to 383.15 K.
/// </summary>
/// <remarks>Source: IAPWS SR6-08(2011), equation 7 and table 5; Patek, Hruby, Klomfar, Souckova and Harvey 2009, J Phys Chem Ref Data 38:21-29. Stated uncertainty 1 %, taken as expanded with k = 2.</remarks>
public static class Water
{
    private static readonly double[] Factors = [280.68, 511.45, 61.131, 0.45903];
    private static readonly double[] Powers = [-1.9, -7.7, -19.6, -40];

    private static readonly (double Factor, int Power)[] Warm = [(6.74458446e3, 4), (-2.22521604e5, 5), (1.00231247e8, 7), (-1.63552118e9, 8), (8.32299658e9, 9)];
    private static readonly (double Factor, int Power)[] Cold = [(5.78545292e-3, 1), (-1.53195665e-2, 2), (3.11337859e-2, 3), (-4.23546241e-2, 4), (3.38713507e-2, 5), (-1.19946761e-2, 6)];

    /// <summary>Relative expanded uncertainty of the formula, 0.01.</summary>
    public const double RelativeExpandedUncertainty = 0.01;

    /// <summary>Coverage factor of that uncertainty, 2.</summary>
    public const double CoverageFactor = 2;

    /// <summary>Where the formula was published.</summary>
    public static Citation Source { get; } = new("IAPWS", 2011, "SR6-08(2011), Revised Supplementary Release on Properties of Liquid Water at 0.1 MPa, equation 7");

    /// <summary>Temperatures for which the formula holds, in K.</summary>
    public static Interval ValidKelvins { get; } = new(253.15, 383.15);

    /// <summary>Viscosity of water at 0.1 MPa.</summary>
    /// <param name="temperature">Temperature, 253.15 to 383.15 K.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the formula's range.</exception>
    public static Viscosity ViscosityAt(Temperature temperature)
    {
        var t = Reduced(temperature);
        return new(1e-6 * Factors.Zip(Powers, (a, b) => a * Math.Pow(t, b)).Sum());
    }

    /// <summary>Local temperature coefficient, -d ln(viscosity)/dT, in 1/K.</summary>
    /// <param name="temperature">Temperature, 253.15 to 383.15 K.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the formula's range.</exception>
    public static double PerKelvinAt(Temperature temperature)
    {
        var t = Reduced(temperature);
        var slope = Factors.Zip(Powers, (a, b) => a * b * Math.Pow(t, b - 1)).Sum() / 300;
        return -1e-6 * slope / ViscosityAt(temperature).PascalSeconds;
    }

    /// <summary>Density of water at 0.1 MPa, kg/m3.</summary>
    /// <param name="temperature">Temperature, 253.15 to 383.15 K.</param>
    /// <exception cref="ArgumentOutOfRangeException">The temperature is outside the formula's range.</exception>
    /// <remarks>Source: IAPWS SR6-08(2011), equation 2.</remarks>
    public static double DensityAt(Temperature temperature)
    {
        var t = 300 * Reduced(temperature);
        var (warm, cold) = (10 / (593 - t), 10 / (t - 232));
        var volume = 1.93763157e-2 + Warm.Sum(term => term.Factor * Math.Pow(warm, term.Power)) + Cold.Sum(term => term.Factor * Math.Pow(cold, term.Power));
        return 1e5 / (461.51805 * 10 * volume);
    }

    /// <summary>Water as a calibration fluid, certified at 25 degC by the formula.</summary>
    /// <param name="name">Name that check exports use.</param>
    public static CalibrationFluid AsFluid(string name = "water")
    {
        var at = new Temperature(25);
        return new(name, "IAPWS SR6-08", at, ViscosityAt(at), RelativeExpandedUncertainty, CoverageFactor, PerKelvinAt(at), 0, true);
    }

    private static double Reduced(Temperature temperature) => ValidKelvins.Contains(temperature.Kelvins)
        ? temperature.Kelvins / 300
        : throw new ArgumentOutOfRangeException(
            nameof(temperature), Invariant($"Water's viscosity is known from {ValidKelvins.Lower - 273.15:F0} to {ValidKelvins.Upper - 273.15:F0} degC, not at {temperature}."));
}
