namespace HemoRheo;

/// <content>Torque resolution.</content>
public static partial class CalibrationFindings
{
    /// <summary>A declared torque resolution cannot be turned into a stress.</summary>
    public static FindingKind ResolutionUnknown { get; } = new(
        "torque-resolution-unknown",
        Severity.Warning,
        "The instrument's torque resolution is declared, and it takes no part in the errors of these readings.",
        "The export gives shear stresses and names no geometry, so torque cannot be turned into stress.",
        "Name the geometry in the export or in the samples table, or declare a floor of the errors that holds the resolution.",
        "JCGM 100:2008 (GUM), 4.3.7");
}
