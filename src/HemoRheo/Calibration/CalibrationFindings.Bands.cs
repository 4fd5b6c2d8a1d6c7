namespace HemoRheo;

/// <content>Decades of torque.</content>
public static partial class CalibrationFindings
{
    /// <summary>A decade of torque fails while the check does not.</summary>
    public static FindingKind BandFailed { get; } = new(
        "check-fails-at-some-torques",
        Severity.Warning,
        "In a decade of torque the error is beyond the limit, though the check as a whole, which rests on its largest torques, is not.",
        "A torque zero that moved, friction or a residue in the bearing at low torque; a bent transducer at high.",
        "Set the torque zero anew and run the instrument empty; trust no readings of these torques until a check passes there.",
        "JCGM 106:2012 for the decision; decades by choice");
}
