namespace HemoRheo;

/// <summary>What can be wrong with files, readings and tables as they are read.</summary>
public static partial class ExportFindings
{
    /// <summary>Every kind of finding of this room.</summary>
    public static Items<FindingKind> All => [.. Files, .. Readings, .. Recordings, .. Tables];

    private static FindingKind Fault(string code, string meaning, string usualCause, string whatToDo) => new(code, Severity.Fault, meaning, usualCause, whatToDo);

    private static FindingKind Warning(string code, string meaning, string usualCause, string whatToDo) => new(code, Severity.Warning, meaning, usualCause, whatToDo);

    private static FindingKind Note(string code, string meaning, string usualCause, string whatToDo) => new(code, Severity.Note, meaning, usualCause, whatToDo);
}
