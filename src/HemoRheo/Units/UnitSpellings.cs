namespace HemoRheo;

/// <summary>
/// The rows of the unit table. Factors: the SI brochure (9th edition, 2019), tables 4, 7 and 8, for minute, hour, day and the prefixes; dyne = 1e-5 N and
/// poise = 0.1 Pa.s by the same brochure (8th edition, table 9); a revolution is 2 pi rad; degC by the brochure's 2.3.4. UCUM codes: the Unified Code for
/// Units of Measure. 1/s and s^-1 are shear rates only: as a rotational speed they might mean revolutions or radians.
/// </summary>
internal static class UnitSpellings
{
    private const double Revolution = 2 * Math.PI;

    public static IReadOnlyList<UnitSpelling> All { get; } =
    [
        .. Rows(new(Quantity.Number, "1", "1", 1), "1"),

        .. Rows(new(Quantity.ShearRate, "1/s", "/s", 1), "1/s", "s^-1", "s-1", "/s"),
        .. Rows(new(Quantity.ShearRate, "1/min", "/min", 1.0 / 60), "1/min", "min^-1", "min-1", "/min"),

        .. Rows(new(Quantity.ShearStress, "Pa", "Pa", 1), "Pa", "N/m^2", "N/m2"),
        .. Rows(new(Quantity.ShearStress, "mPa", "mPa", 1e-3), "mPa"),
        .. Rows(new(Quantity.ShearStress, "µPa", "uPa", 1e-6), "µPa", "uPa"),
        .. Rows(new(Quantity.ShearStress, "kPa", "kPa", 1e3), "kPa"),
        .. Rows(new(Quantity.ShearStress, "dyn/cm²", "dyn/cm2", 0.1), "dyn/cm^2", "dyn/cm2"),

        .. Rows(new(Quantity.Viscosity, "Pa·s", "Pa.s", 1), "Pa.s", "Pa s", "Pas"),
        .. Rows(new(Quantity.Viscosity, "mPa·s", "mPa.s", 1e-3), "mPa.s", "mPa s", "mPas"),
        .. Rows(new(Quantity.Viscosity, "µPa·s", "uPa.s", 1e-6), "µPa.s", "µPa s", "µPas", "uPa.s"),
        .. Rows(new(Quantity.Viscosity, "P", "P", 0.1), "P"),
        .. Rows(new(Quantity.Viscosity, "cP", "cP", 1e-3), "cP"),

        .. Rows(new(Quantity.Temperature, "°C", "Cel", 1), "°C", "degC", "Cel", "\u2103"),
        .. Rows(new(Quantity.Temperature, "K", "K", 1, -273.15), "K"),
        .. Rows(new(Quantity.TemperatureDifference, "K", "K", 1), "K", "°C", "degC", "\u2103"),
        .. Rows(new(Quantity.TemperatureDifference, "mK", "mK", 1e-3), "mK"),
        .. Rows(new(Quantity.PerKelvin, "1/K", "/K", 1), "1/K", "K^-1", "/K", "1/°C", "1/degC"),
        .. Rows(new(Quantity.PerKelvin, "%/K", "%/K", 1e-2), "%/K", "%/°C", "%/degC"),

        .. Rows(new(Quantity.Torque, "N·m", "N.m", 1), "N.m", "N m", "Nm"),
        .. Rows(new(Quantity.Torque, "mN·m", "mN.m", 1e-3), "mN.m", "mN m", "mNm"),
        .. Rows(new(Quantity.Torque, "µN·m", "uN.m", 1e-6), "µN.m", "µN m", "µNm", "uN.m", "uNm"),
        .. Rows(new(Quantity.Torque, "nN·m", "nN.m", 1e-9), "nN.m", "nN m", "nNm"),
        .. Rows(new(Quantity.Torque, "dyn·cm", "dyn.cm", 1e-7), "dyn.cm", "dyn cm"),

        .. Rows(new(Quantity.RotationalSpeed, "rad/s", "rad/s", 1), "rad/s", "rad.s^-1"),
        .. Rows(new(Quantity.RotationalSpeed, "mrad/s", "mrad/s", 1e-3), "mrad/s"),
        .. Rows(new(Quantity.RotationalSpeed, "rpm", "{rev}/min", Revolution / 60), "rpm", "1/min", "min^-1", "min-1", "/min", "r/min", "rev/min"),
        .. Rows(new(Quantity.RotationalSpeed, "rps", "{rev}/s", Revolution), "rps", "r/s", "rev/s"),

        .. Rows(new(Quantity.Length, "m", "m", 1), "m"),
        .. Rows(new(Quantity.Length, "cm", "cm", 1e-2), "cm"),
        .. Rows(new(Quantity.Length, "mm", "mm", 1e-3), "mm"),
        .. Rows(new(Quantity.Length, "µm", "um", 1e-6), "µm", "um"),

        .. Rows(new(Quantity.Time, "s", "s", 1), "s"),
        .. Rows(new(Quantity.Time, "ms", "ms", 1e-3), "ms"),
        .. Rows(new(Quantity.Time, "min", "min", 60), "min"),
        .. Rows(new(Quantity.Time, "h", "h", 3600), "h"),
        .. Rows(new(Quantity.Time, "d", "d", 86400), "d"),

        .. Rows(new(Quantity.Fraction, "L/L", "L/L", 1), "L/L", "l/l", "1"),
        .. Rows(new(Quantity.Fraction, "%", "%", 1e-2), "%"),

        .. Rows(new(Quantity.Concentration, "g/L", "g/L", 1), "g/L", "g/l", "mg/mL", "mg/ml"),
        .. Rows(new(Quantity.Concentration, "g/dL", "g/dL", 10), "g/dL", "g/dl"),
        .. Rows(new(Quantity.Concentration, "mg/dL", "mg/dL", 1e-2), "mg/dL", "mg/dl"),

        .. Rows(new(Quantity.KinematicViscosity, "m²/s", "m2/s", 1), "m^2/s", "m2/s"),
        .. Rows(new(Quantity.KinematicViscosity, "mm²/s", "mm2/s", 1e-6), "mm^2/s", "mm2/s"),
        .. Rows(new(Quantity.KinematicViscosity, "cSt", "cSt", 1e-6), "cSt"),

        .. Rows(new(Quantity.Density, "kg/m³", "kg/m3", 1), "kg/m^3", "kg/m3"),
        .. Rows(new(Quantity.Density, "g/cm³", "g/cm3", 1e3), "g/cm^3", "g/cm3", "g/mL", "g/ml"),
    ];

    private static IEnumerable<UnitSpelling> Rows(Unit unit, params string[] spellings) => spellings.Select(spelling => new UnitSpelling(spelling, unit));
}
