namespace HemoRheo;

/// <summary>Kinds of finding raised where instruments are checked.</summary>
public static partial class CalibrationFindings
{
    /// <summary>A check is beyond its limit.</summary>
    public static FindingKind CheckFailed { get; } = new(
        "check-failed",
        Severity.Fault,
        "The check shows an error beyond the limit that the study allows; everything measured since the last passed check is in doubt.",
        "A bent or dirty geometry, a wrong gap, a drifted torque or temperature sensor, an old or wrong calibration fluid.",
        "Clean, check the fluid and the temperature, check again; have the instrument adjusted if it fails again, and write the moment in the study file.",
        "JCGM 106:2012 for the decision; the limit is the study's");

    /// <summary>A check cannot decide.</summary>
    public static FindingKind CheckCannotTell { get; } = new(
        "check-cannot-tell",
        Severity.Warning,
        "The uncertainty of the check is too large to say whether its error lies within the limit.",
        "A certificate too coarse for the limit, a temperature far from the certificate's, or few and scattered readings.",
        "Check again, several fillings; use a better certified fluid near the measuring temperature.",
        "JCGM 106:2012");

    /// <summary>The fluid of a check is not declared.</summary>
    public static FindingKind FluidUnknown { get; } = new(
        "check-fluid-unknown",
        Severity.Fault,
        "The check names no fluid that the study file declares, so it has nothing to be held against.",
        "A misspelled name, or a new lot without an entry in the study file.",
        "Declare the fluid with its certificate, or correct the name.");

    /// <summary>The temperature of a check is missing or outside the range of its fluid.</summary>
    public static FindingKind TemperatureUnusable { get; } = new(
        "check-temperature-unusable",
        Severity.Fault,
        "The check states no temperature, or one at which the viscosity of its fluid is not known.",
        "The export leaves the temperature out, or the layout does not declare its column.",
        "Declare the column, or write the temperature in the export's header.");

    /// <summary>The readings of a check do not give a viscosity.</summary>
    public static FindingKind FitUnusable { get; } = new(
        "check-fit-unusable",
        Severity.Fault,
        "The readings of the check give no viscosity that may be used, so the check is not counted.",
        "All readings were set aside, or they do not follow one viscosity: a bubble, a wrong fluid, a slipping geometry.",
        "Look at the curve of the check, then check again.");

    /// <summary>The recording of a check has a fault.</summary>
    public static FindingKind RecordingFaulty { get; } = new(
        "check-recording-faulty",
        Severity.Fault,
        "The recording of the check has a fault of its own, so the check vouches for nothing and is not counted.",
        "A file cut in the middle, or an export and a table that disagree.",
        "Mend what the fault names, export again; check again if that cannot be done.");

    /// <summary>The instrument of checks is not declared.</summary>
    public static FindingKind InstrumentUnknown { get; } = new(
        "check-instrument-unknown",
        Severity.Fault,
        "Checks name an instrument that the study file does not declare, so they have no limit to be held against.",
        "A misspelled name, or an instrument without an entry in the study file.",
        "Declare the instrument, or correct the name.");

    /// <summary>Several recordings of one filling.</summary>
    public static FindingKind OneFilling { get; } = new(
        "check-one-filling",
        Severity.Note,
        "Several recordings of one filling were taken together as one check.",
        "The same filling was read again.",
        "Nothing; fill again for an independent check.");

    /// <summary>The torque zero cannot be carried.</summary>
    public static FindingKind TorqueZeroUnknown { get; } = new(
        "check-torque-zero-unknown",
        Severity.Warning,
        "The uncertainty of the torque zero cannot be carried into the check, since no geometry is known.",
        "An export of shear rate and stress that names no geometry.",
        "Name the geometry in the export or the table of checks.");

    /// <summary>The scatter of checks is the declared one.</summary>
    public static FindingKind ScatterDeclared { get; } = new(
        "check-scatter-declared",
        Severity.Note,
        "The checks are too few to show their own scatter, so the one the study file declares is used.",
        "One check a period.",
        "Check more often, with independent fillings.");

    /// <summary>The scatter of checks is not known.</summary>
    public static FindingKind ScatterUnknown { get; } = new(
        "check-scatter-unknown",
        Severity.Fault,
        "The checks are too few to show their own scatter and the study file declares none, so no correction can be had.",
        "One check a period.",
        "Check again with an independent filling, or declare check_scatter in the study file.");

    /// <summary>No check before the moment.</summary>
    public static FindingKind NotChecked { get; } = new(
        "instrument-not-checked",
        Severity.Fault,
        "No check of the instrument lies before the measurement, or none since the instrument was adjusted.",
        "Checks that are not exported, or measuring before the first check.",
        "Check the instrument before a series and after every adjustment.");

    /// <summary>A check failed and none has passed since.</summary>
    public static FindingKind InstrumentFailed { get; } = new(
        "instrument-failed",
        Severity.Fault,
        "The last check failed and none has passed since.",
        "Measuring went on before the instrument was mended.",
        "Do not decide on values; measure again after a passed check.");

    /// <summary>The next decided check failed.</summary>
    public static FindingKind FailureReachesBack { get; } = new(
        "instrument-in-doubt",
        Severity.Warning,
        "The measurement lies between a passed check and a failed one; nobody knows when the instrument went wrong.",
        "Checks far apart.",
        "Measure again where it matters; check more often.");

    /// <summary>The last check could not tell.</summary>
    public static FindingKind LastCheckUnsure { get; } = new(
        "instrument-check-unsure",
        Severity.Warning,
        "The last check before the measurement could not tell whether the instrument is within its limit.",
        "A certificate too coarse for the limit.",
        "Check again with several fillings or a better certified fluid.");

    /// <summary>A check is overdue.</summary>
    public static FindingKind CheckOverdue { get; } = new(
        "instrument-check-overdue",
        Severity.Warning,
        "The last passed check is longer ago than the study file lets it vouch.",
        "A check was forgotten.",
        "Check as often as the study file says.");
}
