namespace HemoRheo;

/// <summary>What a calibration fluid is at a temperature.</summary>
public static class CalibrationFluidWords
{
    /// <summary>
    /// Viscosity at a temperature T: certified * exp(-coefficient * (T - certificate's temperature)); for water by IAPWS SR6-08, whatever is certified.
    /// </summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperature">The temperature; for water within 253.15 to 383.15 K.</param>
    public static Viscosity ViscosityAt(this CalibrationFluid fluid, Temperature temperature) => fluid.IsWater
        ? Water.ViscosityAt(temperature)
        : new(fluid.Certified.PascalSeconds * Math.Exp(-fluid.PerKelvin * (temperature.DegreesCelsius - fluid.At.DegreesCelsius)));

    /// <summary>Temperature coefficient -d ln(viscosity)/dT at a temperature, 1/K: the certificate's, or water's local one.</summary>
    /// <param name="fluid">The fluid.</param>
    /// <param name="temperature">The temperature; for water within 253.15 to 383.15 K.</param>
    public static double PerKelvinAt(this CalibrationFluid fluid, Temperature temperature) =>
        fluid.IsWater ? Water.PerKelvinAt(temperature) : fluid.PerKelvin;
}
