namespace HemoRheo;

/// <summary>Findings about a sample and its values.</summary>
public static class SampleFindings
{
    /// <summary>No correction is known for the instrument at that moment.</summary>
    public static FindingKind NotCalibrated { get; } = new(
        "not-calibrated", Severity.Fault,
        "No check of the instrument vouches for this loading, so its value is not corrected and its budget lacks the calibration.",
        "Samples measured before the first check, or checks that could not be read.",
        "Check the instrument with a calibration fluid before each series.");

    /// <summary>The viscosity lies outside the kept shear rates.</summary>
    public static FindingKind Extrapolated { get; } = new(
        "extrapolated", Severity.Fault,
        "The shear rate lies outside the kept shear rates; the law is extrapolated.",
        "Readings at the end of the curve were set aside, or the program of rates does not reach the standard rate.",
        "Measure over a range that encloses the standard shear rates.");

    /// <summary>The yield stress is an extrapolation.</summary>
    public static FindingKind YieldStressExtrapolated { get; } = new(
        "yield-stress-extrapolated", Severity.Note,
        "A Casson yield stress is the law continued to zero rate; no reading shows it.",
        "Nature of the quantity.",
        "Report it with the lowest kept shear rate; compare only values from the same range of rates.",
        "Casson 1959; common practice");

    /// <summary>The lowest kept rate is too high for a yield stress.</summary>
    public static FindingKind YieldStressTooFar { get; } = new(
        "yield-stress-too-far", Severity.Fault,
        "The lowest kept shear rate is above 10 1/s, too far from zero to speak of a yield stress.",
        "Low-rate readings lie below the torque floor.",
        "Measure to 1 1/s or lower with a more sensitive geometry.");

    /// <summary>The number is held at its bound.</summary>
    public static FindingKind ValueAtBound { get; } = new(
        "value-at-bound", Severity.Fault,
        "The number ended at its bound in the fit of a loading, where its logarithm and its uncertainty do not exist; it is shown and not decided on.",
        "Blood without a measurable yield stress, or no readings at low shear rates.",
        "Report that none was found, with the lowest kept shear rate.");

    /// <summary>The readings do not tell the value.</summary>
    public static FindingKind NotIdentified { get; } = new(
        "not-identified", Severity.Fault,
        "These shear rates do not tell this value: the fit knows it no better than to a factor.",
        "Blood with almost no yield stress, or lowest rates that are too high.",
        "Report that it could not be told; measure to lower rates.",
        "This project: a standard uncertainty of the logarithm above a half");

    /// <summary>A loading takes no part in a value.</summary>
    public static FindingKind LoadingLeftOut { get; } = new(
        "loading-left-out", Severity.Note,
        "A loading takes no part in this value, since another one is free of faults or reaches the rate.",
        "A fault of that loading, or a curve that does not reach the rate.",
        "Look at the findings of that loading.");

    /// <summary>No usable fit.</summary>
    public static FindingKind NoUsableFit { get; } = new(
        "no-usable-fit", Severity.Fault,
        "No loading of this sample has a usable fit of this law.",
        "Too few kept points, or readings that do not follow any law.",
        "Look at the curve and its findings.");

    /// <summary>All loadings have faults.</summary>
    public static FindingKind LoadingFaulty { get; } = new(
        "loading-faulty", Severity.Fault,
        "Every loading of this sample has a fault, so its values are shown and not decided on.",
        "See the faults of its loadings.",
        "Measure the sample again, or let a person decide.");

    /// <summary>The curve contradicts the law.</summary>
    public static FindingKind CurveDoesNotFit { get; } = new(
        "curve-does-not-fit", Severity.Fault,
        "The residuals of this curve are far larger than the error model allows (probability below 0.001).",
        "An outlying reading, a disturbed filling, or a law that does not describe this blood.",
        "Look at the residuals; use the value interpolated from the readings to judge how much it matters.");

    /// <summary>The law is not the one the study decides by.</summary>
    public static FindingKind ShownBeside { get; } = new(
        "shown-beside", Severity.Note,
        "Shown beside the value that is decided on: the study file decides by another law or rule.",
        "The study file.",
        "Look at the value that is decided on.");

    /// <summary>There is no temperature in the readings.</summary>
    public static FindingKind NoTemperature { get; } = new(
        "no-temperature", Severity.Fault,
        "The readings carry no temperature, so the value cannot be moved to 37 degC.",
        "The export lacks the column, or the layout does not name it.",
        "Export the temperature and name its column in the layout.");

    /// <summary>No hematocrit.</summary>
    public static FindingKind NoHematocrit { get; } = new(
        "no-hematocrit", Severity.Warning,
        "The samples table has no usable hematocrit for this sample; it has native values only.",
        "Missing or impossible entry.",
        "Enter the hematocrit and its counter.");

    /// <summary>No plasma viscosity.</summary>
    public static FindingKind NoPlasma { get; } = new(
        "no-plasma-viscosity", Severity.Warning,
        "The samples table has no usable plasma viscosity with its temperature, so there are no relative viscosities and no values by the plasma power rule.",
        "Missing entry, or a temperature that is not stated.",
        "Enter plasma viscosity, its temperature and what measured it.");

    /// <summary>No row of the samples table.</summary>
    public static FindingKind NoRecord { get; } = new(
        "no-sample-row", Severity.Fault,
        "The samples table has no row for this sample.",
        "A misspelled pseudonym.",
        "Correct the pseudonym in the table or the export.");

    /// <summary>The hematocrit lies outside the range of the plasma power rule.</summary>
    public static FindingKind OutsidePowerRule { get; } = new(
        "outside-power-rule", Severity.Fault,
        "The hematocrit lies outside the range for which the plasma power rule is used.",
        "Severe anemia or polycythemia.",
        "Report the native value.",
        "Matrai, Whittington and Ernst 1987; range: common practice");

    /// <summary>The hematocrit lies outside those the study's slope rests on.</summary>
    public static FindingKind OutsideSlope { get; } = new(
        "outside-slope", Severity.Fault,
        "The hematocrit lies outside those that the study's slope rests on.",
        "A sample measured while the instrument was not in order, or left out of the slope for another reason.",
        "Report the native value, or use the plasma power rule.");

    /// <summary>The study's slope cannot be used.</summary>
    public static FindingKind NoSlope { get; } = new(
        "no-slope", Severity.Note,
        "The study's slope against hematocrit cannot be used, so no value is moved to the standard hematocrit by it.",
        "Too few people, or hematocrit measured too coarsely.",
        "Use the plasma power rule.");

    /// <summary>Why a standing has no correction.</summary>
    internal static string WhyNotCalibrated(InstrumentStanding standing) => standing.Findings.Count > 0 ? standing.Findings[0].Message : standing.Reason;
}
