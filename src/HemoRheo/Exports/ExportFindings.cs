namespace HemoRheo;

/// <summary>What can be wrong with files, readings and tables as they are read.</summary>
public static partial class ExportFindings
{
    /// <summary>Every kind of finding of this room.</summary>
    public static Items<FindingKind> All => [.. Files, .. Readings, .. Recordings, .. Tables];
}
