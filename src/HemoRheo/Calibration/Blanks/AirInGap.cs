namespace HemoRheo;

/// <summary>Viscosity of the air that an empty gap holds: its drag is no torque zero, since it is not there when the gap is filled.</summary>
/// <remarks>Source: U.S. Standard Atmosphere 1976, equation 51 (Sutherland's law); within 1 % for air at rooms' pressure and humidity.</remarks>
internal static class AirInGap
{
    /// <summary>Viscosity of air.</summary>
    internal static Viscosity ViscosityAt(Temperature temperature)
    {
        var kelvins = temperature.DegreesCelsius + 273.15;
        return new(1.458e-6 * kelvins * Math.Sqrt(kelvins) / (kelvins + 110.4));
    }

    /// <summary>Torque of the air's drag, N.m.</summary>
    internal static double Torque(Geometry geometry, double radiansPerSecond, Temperature temperature) =>
        ViscosityAt(temperature).PascalSeconds * radiansPerSecond * geometry.RatePerSpeed() / geometry.StressPerTorque();
}
