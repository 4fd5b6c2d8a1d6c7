namespace HemoRheo;

/// <summary>Findings about reference ranges, and the reasons for which a sample or a person is left out of a range or a group.</summary>
public static class RangeFindings
{
    /// <summary>The sample has no value of this measurand.</summary>
    public static FindingKind ValueMissing { get; } = new(
        "value-missing", Severity.Note,
        "The sample has no value of this measurand.",
        "Its curve could not be fitted, the rate lies outside its readings, or its hematocrit or plasma viscosity is missing.",
        "See the findings of the sample.");

    /// <summary>The sample has a value that may not be decided on.</summary>
    public static FindingKind ValueNotDecidable { get; } = new(
        "value-not-decidable", Severity.Note,
        "The sample has a value that may not be decided on or summarized.",
        "The law does not fit, or the value was extrapolated.",
        "See the findings of the value.");

    /// <summary>The sample was measured while the instrument was not in order.</summary>
    public static FindingKind InstrumentNotInOrder { get; } = new(
        "instrument-not-in-order", Severity.Warning,
        "The sample was measured while the instrument was in doubt, failed or unchecked.",
        "A failed or overdue check.",
        "Check the instrument, then measure again where blood is left.");

    /// <summary>There are too few controls for reference limits.</summary>
    public static FindingKind TooFewControls { get; } = new(
        "too-few-controls", Severity.Warning,
        "There are fewer usable controls than the robust method needs.",
        "A small study, or many controls set aside.",
        "Measure more controls, or declare limits with their source in the study file.",
        "CLSI EP28-A3c: robust method from 20 reference values up");

    /// <summary>The controls' values have no spread.</summary>
    public static FindingKind ControlsWithoutSpread { get; } = new(
        "controls-without-spread", Severity.Warning,
        "Half of the controls or more have one and the same value, so no limits can be made.",
        "Values were rounded too coarsely, or one export was copied under many names.",
        "See the export files of the controls.");

    /// <summary>Quantities of a law that the study's curves contradict.</summary>
    public static FindingKind LawContradicted { get; } = new(
        "law-contradicted", Severity.Warning,
        "Quantities that only this law has are neither decided on nor compared: the study's curves together contradict it.",
        "Blood does not follow the law over these shear rates.",
        "Report no number of this law; the law that decides is another one.",
        "Pooled chi-square and mean residual pattern over the study");

    /// <summary>Limits that the study file declares and that no value is held against.</summary>
    public static FindingKind DeclaredLimitsUnused { get; } = new(
        "declared-limits-unused", Severity.Note,
        "Limits that the study file declares are held against no value.",
        "Their shear rate is not among the standard shear rates, or the controls settle that measurand.",
        "Give limits at a standard shear rate, or take them out of the study file.");
}
