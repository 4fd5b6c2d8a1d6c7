namespace HemoRheo;

/// <summary>A calibration fluid: what its certificate says, or water.</summary>
/// <param name="Name">Name that check exports use.</param>
/// <param name="Lot">Lot of the certificate; for water, the formulation.</param>
/// <param name="At">Temperature of the certified value.</param>
/// <param name="Certified">Certified viscosity at that temperature.</param>
/// <param name="RelativeExpandedUncertainty">Relative expanded uncertainty U of the certified value.</param>
/// <param name="CoverageFactor">Coverage factor k of U.</param>
/// <param name="PerKelvin">Temperature coefficient, -d ln(viscosity)/dT, 1/K.</param>
/// <param name="PerKelvinUncertainty">Its standard uncertainty, 1/K.</param>
/// <param name="IsWater">Water: its viscosity at any temperature of the range is taken from IAPWS SR6-08 and the coefficient above is its local slope.</param>
public sealed record CalibrationFluid(
    string Name,
    string Lot,
    Temperature At,
    Viscosity Certified,
    double RelativeExpandedUncertainty,
    double CoverageFactor,
    double PerKelvin,
    double PerKelvinUncertainty,
    bool IsWater);
