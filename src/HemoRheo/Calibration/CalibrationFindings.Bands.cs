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

    /// <summary>Readings at torques where a check failed.</summary>
    public static FindingKind TorquesInDoubt { get; } = new(
        "instrument-in-doubt-at-some-torques",
        Severity.Warning,
        "Readings of the measurement lie at torques where the last check failed, or the next one did, while the check as a whole did not.",
        "A torque zero that moved, friction or a residue in the bearing.",
        "Rest nothing on low rates alone (yield stress, viscosity at the lowest rates); measure again once a check passes at these torques.");
}
