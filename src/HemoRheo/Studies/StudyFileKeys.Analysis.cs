namespace HemoRheo;

/// <content>What is assumed, screened, fitted, standardised and decided.</content>
public static partial class StudyFileKeys
{
    private static StudyFileKey[] Assumptions =>
    [
        Amount("[blood]", "per_kelvin", Quantity.PerKelvin, KeyBounds.NotNegative, "Relative fall of the viscosity of blood per kelvin.", "2.6 %/K"),
        Amount("[blood]", "per_kelvin_uncertainty", Quantity.PerKelvin, KeyBounds.NotNegative, "Standard uncertainty of that.", "0.4 %/K"),
        Amount("[blood]", "plasma_per_kelvin", Quantity.PerKelvin, KeyBounds.NotNegative, "Relative fall of the viscosity of plasma per kelvin.", "2.0 %/K"),
        Amount("[blood]", "plasma_uncertainty", Quantity.Fraction, KeyBounds.NotNegative, "Relative standard uncertainty of one plasma viscosity.", "1 %"),

        Amount("[errors]", "relative", Quantity.Fraction, KeyBounds.NotNegative, "Relative standard deviation of one reading's stress.", "1 %"),
        Amount("[errors]", "floor", Quantity.ShearStress, KeyBounds.NotNegative, "Standard deviation of one reading's stress near zero.", "0.3 mPa"),
        Truth("[errors]", "known", "true: these sizes are known. false: known up to a factor that each fit estimates.", "true"),
        Optional(Amount("[errors]", "loading", Quantity.Fraction, KeyBounds.Positive, "Relative standard deviation between loadings of one sample, used when no sample is loaded twice.", "2 %")),
        Optional(Number("[errors]", "point_correlation", KeyBounds.Correlation, "Correlation of neighboring readings of a ramp; 0 declares that there is none. Left out, it is estimated over the study.", "0.3")),

        Default("\"37 °C\"", Amount("[screening]", "temperature", Quantity.Temperature, KeyBounds.BodyOrRoom, "Temperature at which blood is to be measured.", "37 °C")),
        Default("\"0.5 K\"", Amount("[screening]", "temperature_tolerance", Quantity.TemperatureDifference, KeyBounds.Positive, "Largest departure from it.", "0.5 K")),
        Default("\"5 %\"", Amount("[screening]", "speed_tolerance", Quantity.Fraction, KeyBounds.Positive, "Largest relative difference of the speed reached from the speed asked for.", "5 %")),
        Default("\"4 h\"", Amount("[screening]", "longest_since_draw", Quantity.Time, KeyBounds.Positive, "Longest time from draw to measurement.", "4 h")),
        Default("\"0.1 %\"", Amount("[screening]", "duplicate_tolerance", Quantity.Fraction, KeyBounds.NotNegative, "Readings of one ramp whose rates differ by less are duplicates.", "0.1 %")),
        Default("\"0.20 L/L\"", Amount("[screening]", "lowest_hematocrit", Quantity.Fraction, KeyBounds.BetweenZeroAndOne, "Hematocrit below which a value is questioned.", "0.20 L/L")),
        Default("\"0.70 L/L\"", Amount("[screening]", "highest_hematocrit", Quantity.Fraction, KeyBounds.BetweenZeroAndOne, "Hematocrit above which a value is questioned.", "0.70 L/L")),
    ];

    private static StudyFileKey[] Decisions =>
    [
        new("[analysis]", "laws", StudyFileKeyKind.Words, "Flow laws fitted to every curve.", Listed(LawNames)) { Allowed = [.. LawNames] },
        Word("[analysis]", "decide_by", "The law whose values are decided on; one of laws.", LawNames),
        new("[analysis]", "standard_rates", StudyFileKeyKind.Quantities, "Shear rates at which viscosity is reported, ascending.", "[\"1 1/s\", \"10 1/s\", \"100 1/s\"]") { Quantity = Quantity.ShearRate, Bounds = KeyBounds.Positive },
        Default("\"down\"", Word("[analysis]", "ramp", "The ramp that is analyzed; the other serves hysteresis.", "down", "up")),
        Default("true", Truth("[analysis]", "correct_bias", "true: values are corrected by the mean of the period's checks. false: the bias is a part of the uncertainty.", "true")),
        Default("0.95", Number("[analysis]", "level", KeyBounds.Level, "Probability that decides a verdict.", "0.95")),

        Amount("[standard_hematocrit]", "hematocrit", Quantity.Fraction, KeyBounds.BetweenZeroAndOne, "The hematocrit to which values are moved.", "0.45 L/L"),
        Word("[standard_hematocrit]", "decide_by", "plasma-power: by the sample's plasma viscosity. study-slope: by the study's slope of log viscosity against hematocrit.", "plasma-power", "study-slope"),

        Truth("[reference]", "from_controls", "true: reference limits come from the control group where it is large enough. false: from declared limits alone.", "true"),
        Amount("[[reference.declared]]", "rate", Quantity.ShearRate, KeyBounds.Positive, "Shear rate of the viscosity these limits speak of; one of standard_rates.", "100 1/s"),
        Truth("[[reference.declared]]", "at_standard_hematocrit", "Whether they speak of values at the standard hematocrit.", "true"),
        Amount("[[reference.declared]]", "lower", Quantity.Viscosity, KeyBounds.Positive, "Lower limit.", "3.9 mPa.s"),
        Amount("[[reference.declared]]", "upper", Quantity.Viscosity, KeyBounds.Positive, "Upper limit.", "5.3 mPa.s"),
        Text("[[reference.declared]]", "source", "Where they were published or how they were obtained.", "our laboratory, 60 adults, 2024"),

        Text("[[groups]]", "code", "Code that the people table uses.", "A"),
        Text("[[groups]]", "label", "Label shown in the cohort summary.", "controls"),
        Truth("[[groups]]", "controls", "Whether reference limits come from it.", "true"),
    ];

    internal static string[] LawNames => ["Newtonian", "Power law", "Bingham", "Casson", "Herschel-Bulkley", "Quemada", "Carreau", "Cross", "Carreau-Yasuda"];
}
