using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// Mixtures of glycerol and water: viscosity = water^a glycerol^(1 - a), with a from mass fraction and temperature, from 0 to 100 degC.
/// The formula lies within 3 % of the tables it was made from. As a calibration fluid that bound is the half width of a rectangular distribution: standard uncertainty 3 % / sqrt(3) = 1.7 %.
/// </summary>
/// <remarks>
/// Source: Cheng 2008, Ind Eng Chem Res 47:3285-3288; the bound by comparison with Segur and Oberstar 1951, Ind Eng Chem 43:2117-2120. Density: Volk and Kaehler 2018, Exp Fluids 59:75,
/// made from data of 15 to 30 degC.
/// </remarks>
public static class GlycerolWater
{
    /// <summary>Largest relative departure of the formula from measured tables, 0.03.</summary>
    public const double Bound = 0.03;

    /// <summary>Factor from standard uncertainty to that bound, sqrt(3).</summary>
    public const double BoundFactor = 1.7320508075688772;

    /// <summary>Temperatures for which the formula holds, in degC.</summary>
    public static Interval ValidTemperatures { get; } = new(0, 100);

    /// <summary>Where the formula was published.</summary>
    public static Citation Source { get; } = new("Cheng", 2008, "Industrial and Engineering Chemistry Research 47:3285-3288, equations 6 to 22");

    /// <summary>Viscosity of a mixture.</summary>
    /// <param name="massFraction">Mass of glycerol over mass of the mixture, 0 to 1.</param>
    /// <param name="temperature">Temperature, 0 to 100 degC.</param>
    /// <exception cref="ArgumentOutOfRangeException">Mass fraction or temperature is outside the formula's range.</exception>
    public static Viscosity ViscosityAt(double massFraction, Temperature temperature)
    {
        Check(massFraction, temperature);
        return new(Math.Exp(LnViscosity(massFraction, temperature.DegreesCelsius)));
    }

    /// <summary>Local temperature coefficient, -d ln(viscosity)/dT, in 1/K.</summary>
    /// <param name="massFraction">Mass of glycerol over mass of the mixture, 0 to 1.</param>
    /// <param name="temperature">Temperature, 0 to 100 degC.</param>
    /// <exception cref="ArgumentOutOfRangeException">Mass fraction or temperature is outside the formula's range.</exception>
    public static double PerKelvinAt(double massFraction, Temperature temperature)
    {
        Check(massFraction, temperature);
        return -LocalSlope.Of(t => LnViscosity(massFraction, t), temperature.DegreesCelsius);
    }

    /// <summary>Change of ln(viscosity) per mass fraction: what an error of mixing does.</summary>
    /// <param name="massFraction">Mass of glycerol over mass of the mixture, 0 to 1.</param>
    /// <param name="temperature">Temperature, 0 to 100 degC.</param>
    /// <exception cref="ArgumentOutOfRangeException">Mass fraction or temperature is outside the formula's range.</exception>
    public static double PerMassFractionAt(double massFraction, Temperature temperature)
    {
        Check(massFraction, temperature);
        return LocalSlope.Of(c => LnViscosity(c, temperature.DegreesCelsius), massFraction);
    }

    /// <summary>Density, kg/m3.</summary>
    /// <param name="massFraction">Mass of glycerol over mass of the mixture, 0 to 1.</param>
    /// <param name="temperature">Temperature, 0 to 100 degC.</param>
    /// <exception cref="ArgumentOutOfRangeException">Mass fraction or temperature is outside the formula's range.</exception>
    public static double DensityAt(double massFraction, Temperature temperature)
    {
        Check(massFraction, temperature);
        var t = temperature.DegreesCelsius;
        var glycerol = 1273.3 - 0.6121 * t;
        var water = 1000 * (1 - Math.Pow(Math.Abs(t - 3.98) / 615, 1.71));
        var contraction = (1.78e-6 * t * t - 1.82e-4 * t + 1.41e-2) * Math.Pow(Math.Max(0, Math.Sin(Math.PI * Math.Pow(massFraction, 1.31))), 0.81);
        return (1 + contraction) / (massFraction / glycerol + (1 - massFraction) / water);
    }

    private static double LnViscosity(double c, double t)
    {
        var water = Math.Log(1.790e-3) + (-1230 - t) * t / (36100 + 360 * t);
        var glycerol = Math.Log(12.1) + (-1233 + t) * t / (9900 + 70 * t);
        var a = 0.705 - 0.0017 * t;
        var b = (4.9 + 0.036 * t) * Math.Pow(a, 2.5);
        var share = 1 - c + a * b * c * (1 - c) / (a * c + b * (1 - c));
        return share * water + (1 - share) * glycerol;
    }

    private static void Check(double massFraction, Temperature temperature)
    {
        if (massFraction is not (>= 0 and <= 1)) throw new ArgumentOutOfRangeException(nameof(massFraction), Invariant($"A mass fraction lies from 0 to 1, not at {massFraction:G6}."));
        if (!ValidTemperatures.Contains(temperature.DegreesCelsius)) throw new ArgumentOutOfRangeException(nameof(temperature), Invariant($"The viscosity of glycerol and water is known from 0 to 100 degC, not at {temperature}."));
    }
}
