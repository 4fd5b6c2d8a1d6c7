namespace HemoRheo;

/// <content>Instruments, geometries, calibration fluids, hematocrit counters.</content>
public static partial class StudyFileKeys
{
    private static StudyFileKey[] Apparatus =>
    [
        Text("[[instruments]]", "name", "Name that exports and tables use.", "R1"),
        Optional(Amount("[[instruments]]", "torque_floor", Quantity.Torque, KeyBounds.Positive, "Torque below which readings are set aside; without it every reading is marked.", "0.1 µN.m")),
        Amount("[[instruments]]", "torque_zero", Quantity.Torque, KeyBounds.NotNegative, "Standard uncertainty of the day's torque zero, where no blank run of the day tells it.", "0.005 µN.m"),
        Default("false", Truth("[[instruments]]", "correct_torque_zero", "true: the zero of a blank run is taken from every torque. false: it is not, and its size is part of the uncertainty.", "true")),
        Optional(Amount("[[instruments]]", "torque_resolution", Quantity.Torque, KeyBounds.Positive, "Step in which the instrument gives torques; joins the floor of the readings' errors by each curve's geometry.", "0.01 µN.m")),
        Amount("[[instruments]]", "thermometer", Quantity.TemperatureDifference, KeyBounds.NotNegative, "Standard uncertainty of the thermometer.", "0.1 K"),
        Amount("[[instruments]]", "check_every", Quantity.Time, KeyBounds.Positive, "How long a passed check vouches for the instrument.", "8 d"),
        Amount("[[instruments]]", "check_limit", Quantity.Fraction, KeyBounds.BetweenZeroAndOne, "Largest relative error a check may show.", "3 %"),
        Optional(Amount("[[instruments]]", "check_scatter", Quantity.Fraction, KeyBounds.Positive, "Standard deviation of one check's relative error, used while there are too few checks to estimate it.", "1 %")),
        Default("[]", new("[[instruments]]", "adjusted", StudyFileKeyKind.Moments, "When the instrument was adjusted or repaired; each starts a new period.", "[2026-03-02T09:00:00+01:00]")),

        Text("[[geometries]]", "name", "Name that exports and tables use. A geometry is concentric cylinders.", "CYL-1"),
        Amount("[[geometries]]", "inner_radius", Quantity.Length, KeyBounds.Positive, "Radius of the inner cylinder.", "12.5 mm"),
        Amount("[[geometries]]", "outer_radius", Quantity.Length, KeyBounds.Positive, "Radius of the outer cylinder.", "13.56 mm"),
        Amount("[[geometries]]", "length", Quantity.Length, KeyBounds.Positive, "Length of the inner cylinder.", "37.5 mm"),
        Number("[[geometries]]", "end_factor", KeyBounds.Positive, "Factor on the torque for the cylinder's ends; 1.10 for the standard shape of ISO 3219.", "1.10"),
        Optional(Word("[[geometries]]", "turning", "Which cylinder turns. Without it laminar flow is judged as if the inner one did, which is the stricter.", "inner", "outer")),

        Text("[[fluids]]", "name", "Name that check exports use.", "oil-5"),
        Word("[[fluids]]", "kind", "certified: by its certificate. water: by the IAPWS formulation (SR6-08). glycerol-water: by Cheng 2008, known to 3 %. sucrose-40: 40 % by mass in water, by Bingham and Jackson 1918, known to 5 %.", "certified", "water", "glycerol-water", "sucrose-40"),
        Optional(Text("[[fluids]]", "certificate", "Certificate file below the study's folder, for a certified fluid; it says lot, viscosities and their uncertainty, which then do not stand here.", "oil-5.toml")),
        Optional(Text("[[fluids]]", "lot", "Lot of the certificate; for water, how it was made pure; for a mixture or solution, its batch.", "24-117")),
        Optional(Amount("[[fluids]]", "viscosity", Quantity.Viscosity, KeyBounds.Positive, "Certified viscosity. Not for water.", "4.85 mPa.s")),
        Optional(Amount("[[fluids]]", "at", Quantity.Temperature, KeyBounds.BodyOrRoom, "Temperature of the certified viscosity. Not for water.", "37 °C")),
        Optional(Amount("[[fluids]]", "expanded_uncertainty", Quantity.Fraction, KeyBounds.Positive, "Relative expanded uncertainty of the viscosity.", "0.4 %")),
        Optional(Number("[[fluids]]", "coverage_factor", KeyBounds.Positive, "Coverage factor k of the expanded uncertainty, as the certificate states it.", "2")),
        Optional(Amount("[[fluids]]", "per_kelvin", Quantity.PerKelvin, KeyBounds.Positive, "Relative fall of its viscosity per kelvin. Not for water.", "2.2 %/K")),
        Optional(Amount("[[fluids]]", "per_kelvin_uncertainty", Quantity.PerKelvin, KeyBounds.NotNegative, "Standard uncertainty of that. Not for water.", "0.03 %/K")),
        Optional(Amount("[[fluids]]", "mass_fraction", Quantity.Fraction, KeyBounds.BetweenZeroAndOne, "Mass of glycerol over mass of the mixture; glycerol-water only.", "50 %")),
        Optional(Amount("[[fluids]]", "mass_fraction_uncertainty", Quantity.Fraction, KeyBounds.NotNegative, "Standard uncertainty of that.", "0.1 %")),
        Optional(Amount("[[fluids]]", "density", Quantity.Density, KeyBounds.Positive, "Its density, by which laminar flow is judged; known for water and glycerol-water.", "849 kg/m3")),
        Optional(Amount("[[fluids]]", "bath", Quantity.Temperature, KeyBounds.BodyOrRoom, "Temperature to which the bath of its checks is set; a check that reads another is marked.", "37 °C")),

        Text("[[counters]]", "name", "Name that the samples table uses.", "centrifuge"),
        Amount("[[counters]]", "uncertainty", Quantity.Fraction, KeyBounds.NotNegative, "Standard uncertainty of one sample's hematocrit, without the shared part.", "0.006 L/L"),
        Amount("[[counters]]", "shared_uncertainty", Quantity.Fraction, KeyBounds.NotNegative, "Standard uncertainty of the bias that all its samples share.", "0.003 L/L"),
    ];
}
