namespace HemoRheo;

/// <content>Blank runs.</content>
public static partial class CalibrationFindings
{
    /// <summary>A recording of an empty gap gives no blank run.</summary>
    public static FindingKind BlankUnusable { get; } = new(
        "blank-run-unusable",
        Severity.Fault,
        "The recording of the empty gap gives no torque zero, so it counts for nothing.",
        "An export without torques, a run broken off, or a fault of the file.",
        "Mend what the message names, or run the empty gap again.");

    /// <summary>A blank run has few readings.</summary>
    public static FindingKind BlankTooFew { get; } = new(
        "blank-run-short",
        Severity.Warning,
        "The blank run has few readings, so noise and zero are known coarsely; the zero's degrees of freedom say so in every budget.",
        "A run stopped early.",
        "Read the empty gap ten times or more, at several speeds.");

    /// <summary>Zero or noise depends on speed.</summary>
    public static FindingKind BlankBySpeed { get; } = new(
        "blank-run-by-speed",
        Severity.Note,
        "Torque zero or noise of the empty gap depends on speed and is taken by speed; the drag of air is already taken off.",
        "Friction of the bearing, liquid left in the gap, or drift while the speed was stepped through.",
        "Clean and dry the gap; step the speeds up and down again, so that drift shows apart from speed.",
        "Analysis of variance; Bartlett 1937");

    /// <summary>The torque drifts within the run.</summary>
    public static FindingKind BlankDrifts { get; } = new(
        "blank-run-drifts",
        Severity.Warning,
        "The torque of the empty gap drifts within the run; the drift is part of the zero's uncertainty.",
        "An instrument that is not warm yet, or a draft.",
        "Let it warm up and run the empty gap again.");

    /// <summary>The zero is not zero.</summary>
    public static FindingKind BlankZero { get; } = new(
        "torque-zero-not-zero",
        Severity.Warning,
        "The torque of the empty gap differs from zero by more than its uncertainty explains.",
        "The zero was not set, or the bearing changed.",
        "Set the torque zero before a series, or have it corrected by correct_torque_zero in the study file.",
        "JCGM 100:2008 (GUM), F.2.4.5, on corrections that are not made");

    /// <summary>The zero is beyond the torque floor.</summary>
    public static FindingKind BlankZeroBeyondFloor { get; } = new(
        "torque-zero-beyond-floor",
        Severity.Warning,
        "The torque of the empty gap is larger than the declared torque floor, so readings near the floor say more of the zero than of the sample.",
        "The zero was not set, or the declared floor is too low.",
        "Set the torque zero and run the empty gap again; until then a higher floor is used.");

    /// <summary>No blank run of the day.</summary>
    public static FindingKind BlankEarlier { get; } = new(
        "blank-run-of-another-day",
        Severity.Note,
        "There is no blank run of the day, so the last one is used, and the declared uncertainty of the day's torque zero stands beside its own.",
        "A day without a blank run.",
        "Run the empty gap at the start of every day.");

    /// <summary>No blank run at all.</summary>
    public static FindingKind BlankNone { get; } = new(
        "blank-run-missing",
        Severity.Warning,
        "The study makes blank runs, and there is none that counts for this recording.",
        "Measuring began before the first blank run, or the instrument was adjusted since.",
        "Run the empty gap at the start of every day and after every adjustment.");
}
