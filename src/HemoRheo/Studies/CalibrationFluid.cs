namespace HemoRheo;

/// <summary>A calibration fluid: what its certificate says, or water, a mixture of glycerol and water, or a sucrose solution by their formulas. Its viscosity at a temperature: <c>fluid.ViscosityAt</c>.</summary>
/// <param name="Name">Name that check exports use.</param>
/// <param name="Lot">Lot of the certificate; for water, the formulation.</param>
/// <param name="At">Temperature of the certified value; with a certificate file its lowest one, with a formula 20 degC.</param>
/// <param name="Certified">Certified viscosity at that temperature.</param>
/// <param name="RelativeExpandedUncertainty">Relative expanded uncertainty U of the certified value; with a formula its bound, with the factor from standard uncertainty to that bound.</param>
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
    bool IsWater)
{
    /// <summary>Its certificate file, by which viscosity is interpolated; null where the study file declares one temperature, or a formula says it.</summary>
    public Certificate? Certificate { get; init; }

    /// <summary>The mixture where it is one of glycerol and water; else null.</summary>
    public GlycerolMixture? Glycerol { get; init; }

    /// <summary>Whether it is sucrose in water, 40 % by mass.</summary>
    public bool IsSucrose { get; init; }

    /// <summary>Declared density, kg/m3; null where none is.</summary>
    public double? Density { get; init; }

    /// <summary>Declared temperature of the bath it is checked in; null where none is.</summary>
    public Temperature? Bath { get; init; }
}
