namespace HemoRheo;

/// <summary>Water as a calibration fluid.</summary>
internal static class WaterFluid
{
    /// <summary>
    /// Water with the uncertainty the study file declares. Its named point is the primary one of viscometry, 1.0016 mPa.s at 20 degC
    /// (ISO/TR 3666:1998); at any other temperature its viscosity and slope come from IAPWS SR6-08, so its coefficient carries no uncertainty of its own.
    /// </summary>
    public static CalibrationFluid Of(string name, string lot, double relativeExpandedUncertainty, double coverageFactor) => new(
        name,
        lot,
        Temperature.FromDegreesCelsius(20),
        Viscosity.FromMillipascalSeconds(1.0016),
        relativeExpandedUncertainty,
        coverageFactor,
        PerKelvin: SlopeAtTwentyDegrees,
        PerKelvinUncertainty: 0,
        IsWater: true);

    private const double SlopeAtTwentyDegrees = 0.0245;
}
