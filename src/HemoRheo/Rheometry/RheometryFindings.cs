namespace HemoRheo;

/// <summary>Kinds of finding raised where readings become points of a flow curve.</summary>
public static class RheometryFindings
{
    /// <summary>The geometry is not declared.</summary>
    public static FindingKind UnknownGeometry { get; } = new(
        "geometry-unknown",
        Severity.Fault,
        "The recording names a geometry that the study file does not declare, so torque and speed have no meaning as stress and rate.",
        "A misspelled name, or a geometry that was changed without a new entry in the study file.",
        "Declare the geometry in the study file, or correct its name in the export or samples table.");

    /// <summary>The gap is too wide for representative values.</summary>
    public static FindingKind WideGap { get; } = new(
        "gap-wide",
        Severity.Warning,
        "The gap is wider than representative stress and rate are made for, so they depend on how the liquid thins.",
        "A geometry whose outer radius is more than 1.2 times the inner one, or a radius typed as a diameter.",
        "Check the radii in the study file; for blood use a narrower gap.",
        "ISO 3219:1993, annex B");

    /// <summary>A reading lacks the numbers of a point.</summary>
    public static FindingKind IncompleteReading { get; } = new(
        "reading-incomplete",
        Severity.Fault,
        "The reading gives neither speed and torque of a known geometry nor shear rate and shear stress.",
        "An empty field, a column the layout does not declare, or no geometry named for a recording of speed and torque.",
        "Look at the named line; declare the column or the geometry if it is only missing from the study file.");

    /// <summary>A rate or stress is not above zero.</summary>
    public static FindingKind NotPositive { get; } = new(
        "rate-or-stress-not-positive",
        Severity.Fault,
        "Shear rate or shear stress is zero, negative or not a finite number, which no flow law describes.",
        "A reading taken while the instrument stood still or turned back, or a torque zero larger than the torque.",
        "Measure the torque zero; leave the reading aside.");

    /// <summary>The recording has no readings of the analyzed ramp.</summary>
    public static FindingKind NoReadings { get; } = new(
        "ramp-without-readings",
        Severity.Fault,
        "The recording has no readings of the ramp that the study analyzes.",
        "A protocol with one ramp only, or ramp words that the layout does not declare.",
        "Check the layout's words for up and down, or the ramp the study file asks for.");

    /// <summary>The torque is below the instrument's floor.</summary>
    public static FindingKind TorqueBelowFloor { get; } = new(
        "torque-below-floor",
        Severity.Fault,
        "The torque is below the floor under which the instrument's readings are not to be used.",
        "Low shear rates with thin blood or plasma in a small geometry.",
        "Leave the reading aside, or use a geometry with more surface.",
        "Ewoldt, Johnston and Caretta 2015; the floor itself is the study's");

    /// <summary>No torque floor is declared.</summary>
    public static FindingKind NoTorqueFloor { get; } = new(
        "torque-floor-not-declared",
        Severity.Note,
        "No torque floor is declared for the instrument and no blank run tells it, so readings at too low a torque are not found.",
        "The study file leaves the floor out.",
        "Run the empty gap at the start of the day, or find the floor with a fluid of known viscosity and write it in the study file.");

    /// <summary>The torque of readings is not known.</summary>
    public static FindingKind TorqueNotKnown { get; } = new(
        "torque-not-known",
        Severity.Warning,
        "The torque of readings is not known, so they cannot be held against the torque floor.",
        "An export of shear rate and stress that names no geometry.",
        "Name the geometry in the export or samples table.");
}
