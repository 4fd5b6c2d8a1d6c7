namespace HemoRheo;

/// <content>Findings of instrument logs.</content>
public static partial class CalibrationFindings
{
    /// <summary>The log is not as it was written.</summary>
    public static FindingKind LogBroken { get; } = new(
        "log-broken",
        Severity.Fault,
        "An entry of the instrument's log does not agree with its digest, so the log was changed after it was written.",
        "Somebody edited the file with another program, or the file was damaged.",
        "Keep the file, compare with a copy or export, find out who changed what; record what is right as a correction in the good copy.");

    /// <summary>The clock was set back.</summary>
    public static FindingKind LogClockSetBack { get; } = new(
        "log-clock-set-back",
        Severity.Warning,
        "An entry of the log was recorded at an earlier moment than the entry before it.",
        "A clock that was set back, or two machines whose clocks differ.",
        "Set the clock; the order of entries holds, only the moments of recording are doubtful.");

    /// <summary>An event lies after the moment it was recorded.</summary>
    public static FindingKind LogAheadOfClock { get; } = new(
        "log-ahead-of-clock",
        Severity.Warning,
        "An entry of the log speaks of something that happened after it was recorded.",
        "The clock of the instrument or of the computer is wrong, or the moment was mistyped.",
        "Set the clock; record a correction where the moment is wrong.");

    /// <summary>One recording was entered twice.</summary>
    public static FindingKind LogRecordedTwice { get; } = new(
        "log-recorded-twice",
        Severity.Note,
        "The same recording stands in the log more than once; it counts as one check.",
        "An export was recorded again.",
        "Withdraw the later entry by a correction.");

    /// <summary>Different checks at one moment.</summary>
    public static FindingKind LogSameMoment { get; } = new(
        "log-same-moment",
        Severity.Warning,
        "Two different checks of one instrument bear the same moment, which cannot be.",
        "A moment that was mistyped, or an export that states the day alone.",
        "Record a correction with the right moment.");
}
