namespace HemoRheo;

/// <summary>What the study assumes of blood and plasma.</summary>
/// <param name="PerKelvin">Temperature coefficient of blood, -d ln(viscosity)/dT, 1/K.</param>
/// <param name="PerKelvinUncertainty">Its standard uncertainty, 1/K.</param>
/// <param name="PlasmaPerKelvin">Temperature coefficient of plasma, 1/K.</param>
/// <param name="PlasmaUncertainty">Relative standard uncertainty of one plasma viscosity.</param>
public sealed record Blood(double PerKelvin, double PerKelvinUncertainty, double PlasmaPerKelvin, double PlasmaUncertainty);
