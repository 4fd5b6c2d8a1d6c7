namespace HemoRheo;

/// <content>Recordings and how they join with the tables.</content>
public static partial class ExportFindings
{
    /// <summary>A recording or row names no sample; it was kept out.</summary>
    public static FindingKind IdentifierMissing { get; } = new("identifier-missing", Severity.Fault, "A recording or row names no sample; it was kept out.", "The field was left empty at the instrument.", "Enter the identifier and export again.");

    /// <summary>An identifier has characters other than letters, digits, - _ and ., or does not begin with a letter or digit. It is kept as data.</summary>
    public static FindingKind IdentifierUnusual { get; } = new("identifier-unusual", Severity.Warning, "An identifier has characters other than letters, digits, - _ and ., or does not begin with a letter or digit. It is kept as data.", "A remark in the identifier, markup, or a spreadsheet formula.", "Use short pseudonyms.");

    /// <summary>The number of the loading or visit is not a whole number from 1; the recording was set aside.</summary>
    public static FindingKind LoadingNotRead { get; } = new("loading-not-read", Severity.Fault, "The number of the loading or visit is not a whole number from 1; the recording was set aside.", "A remark in the field.", "Correct the number.");

    /// <summary>A block has a key twice; it was set aside.</summary>
    public static FindingKind KeyTwice { get; } = new("key-twice", Severity.Fault, "A block has a key twice; it was set aside.", "Two blocks run together.", "Export the file again.");

    /// <summary>A line of a block is neither key and value, nor a header row, nor a reading; the block was set aside.</summary>
    public static FindingKind LineNotUnderstood { get; } = new("line-not-understood", Severity.Fault, "A line of a block is neither key and value, nor a header row, nor a reading; the block was set aside.", "A damaged file or another version of the export.", "Export the file again.");

    /// <summary>A block has more readings than it announces.</summary>
    public static FindingKind ReadingCountDiffers { get; } = new("reading-count-differs", Severity.Fault, "A block has more readings than it announces.", "Two blocks run together.", "Export the file again.");

    /// <summary>A recording has no readings that can be used; it was set aside.</summary>
    public static FindingKind RecordingWithoutReadings { get; } = new("recording-without-readings", Severity.Fault, "A recording has no readings that can be used; it was set aside.", "A measurement that was broken off.", "Measure or export again.");

    /// <summary>Two recordings have the same sample and loading; both were set aside.</summary>
    public static FindingKind LoadingTwice { get; } = new("loading-twice", Severity.Fault, "Two recordings have the same sample and loading; both were set aside.", "An export made twice, or a second loading with the number of the first.", "Remove one, or number the loadings.");

    /// <summary>Neither the export nor the table says what a recording needs; it was set aside.</summary>
    public static FindingKind MetadataMissing { get; } = new("metadata-missing", Severity.Fault, "Neither the export nor the table says what a recording needs; it was set aside.", "An export without this field.", "Add the field to the export or the column to the table.");

    /// <summary>Export and table disagree; the export's value is shown and the recording is marked.</summary>
    public static FindingKind MetadataDiffers { get; } = new("metadata-differs", Severity.Fault, "Export and table disagree; the export's value is shown and the recording is marked.", "A mistake in one of the two.", "Correct the wrong one.");

    /// <summary>A name is not declared in the study file; what it names was set aside.</summary>
    public static FindingKind NameUndeclared { get; } = new("name-undeclared", Severity.Fault, "A name is not declared in the study file; what it names was set aside.", "A new instrument, geometry, fluid, counter or group, or a name written differently.", "Declare it in the study file or correct the name.");

    /// <summary>A recording's sample is not in the samples table.</summary>
    public static FindingKind RecordingWithoutSample { get; } = new("recording-without-sample", Severity.Fault, "A recording's sample is not in the samples table.", "A row not yet entered, or an identifier written differently.", "Add the row or correct the identifier.");

    /// <summary>A sample of the table has no recording.</summary>
    public static FindingKind SampleWithoutRecording { get; } = new("sample-without-recording", Severity.Warning, "A sample of the table has no recording.", "A file not yet copied, or an identifier written differently.", "Copy the export or correct the identifier.");

    /// <summary>A recording of a check is not in the check table.</summary>
    public static FindingKind RecordingWithoutCheckRow { get; } = new("recording-without-check-row", Severity.Fault, "A recording of a check is not in the check table.", "A row not yet entered, or a name written differently.", "Add the row or correct the name.");

    /// <summary>A check of the table has no recording.</summary>
    public static FindingKind CheckWithoutRecording { get; } = new("check-without-recording", Severity.Warning, "A check of the table has no recording.", "A file not yet copied, or a name written differently.", "Copy the export or correct the name.");

    private static FindingKind[] Recordings => [IdentifierMissing, IdentifierUnusual, LoadingNotRead, KeyTwice, LineNotUnderstood, ReadingCountDiffers, RecordingWithoutReadings, LoadingTwice, MetadataMissing, MetadataDiffers, NameUndeclared, RecordingWithoutSample, SampleWithoutRecording, RecordingWithoutCheckRow, CheckWithoutRecording];
}
