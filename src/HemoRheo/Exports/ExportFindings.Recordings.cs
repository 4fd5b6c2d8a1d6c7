namespace HemoRheo;

/// <content>Recordings and how they join with the tables.</content>
public static partial class ExportFindings
{
    /// <summary>A recording or row names no sample; it was kept out.</summary>
    public static FindingKind IdentifierMissing { get; } = Fault("identifier-missing", "A recording or row names no sample; it was kept out.", "the field was left empty at the instrument", "enter the identifier and export again");

    /// <summary>An identifier has characters other than letters, digits, - _ and ., or does not begin with a letter or digit. It is kept as data.</summary>
    public static FindingKind IdentifierUnusual { get; } = Warning("identifier-unusual", "An identifier has characters other than letters, digits, - _ and ., or does not begin with a letter or digit. It is kept as data.", "a remark in the identifier, markup, or a spreadsheet formula", "use short pseudonyms");

    /// <summary>The number of the loading or visit is not a whole number from 1; the recording was set aside.</summary>
    public static FindingKind LoadingNotRead { get; } = Fault("loading-not-read", "The number of the loading or visit is not a whole number from 1; the recording was set aside.", "a remark in the field", "correct the number");

    /// <summary>A block has a key twice; it was set aside.</summary>
    public static FindingKind KeyTwice { get; } = Fault("key-twice", "A block has a key twice; it was set aside.", "two blocks run together", "export the file again");

    /// <summary>A line of a block is neither key and value, nor a header row, nor a reading; the block was set aside.</summary>
    public static FindingKind LineNotUnderstood { get; } = Fault("line-not-understood", "A line of a block is neither key and value, nor a header row, nor a reading; the block was set aside.", "a damaged file or another version of the export", "export the file again");

    /// <summary>A block has more readings than it announces.</summary>
    public static FindingKind ReadingCountDiffers { get; } = Fault("reading-count-differs", "A block has more readings than it announces.", "two blocks run together", "export the file again");

    /// <summary>A recording has no readings that can be used; it was set aside.</summary>
    public static FindingKind RecordingWithoutReadings { get; } = Fault("recording-without-readings", "A recording has no readings that can be used; it was set aside.", "a measurement that was broken off", "measure or export again");

    /// <summary>Two recordings have the same sample and loading; both were set aside.</summary>
    public static FindingKind LoadingTwice { get; } = Fault("loading-twice", "Two recordings have the same sample and loading; both were set aside.", "an export made twice, or a second loading with the number of the first", "remove one, or number the loadings");

    /// <summary>Neither the export nor the table says what a recording needs; it was set aside.</summary>
    public static FindingKind MetadataMissing { get; } = Fault("metadata-missing", "Neither the export nor the table says what a recording needs; it was set aside.", "an export without this field", "add the field to the export or the column to the table");

    /// <summary>Export and table disagree; the export's value is shown and the recording is marked.</summary>
    public static FindingKind MetadataDiffers { get; } = Fault("metadata-differs", "Export and table disagree; the export's value is shown and the recording is marked.", "a mistake in one of the two", "correct the wrong one");

    /// <summary>A name is not declared in the study file; what it names was set aside.</summary>
    public static FindingKind NameUndeclared { get; } = Fault("name-undeclared", "A name is not declared in the study file; what it names was set aside.", "a new instrument, geometry, fluid, counter or group, or a name written differently", "declare it in the study file or correct the name");

    /// <summary>A recording's sample is not in the samples table.</summary>
    public static FindingKind RecordingWithoutSample { get; } = Fault("recording-without-sample", "A recording's sample is not in the samples table.", "a row not yet entered, or an identifier written differently", "add the row or correct the identifier");

    /// <summary>A sample of the table has no recording.</summary>
    public static FindingKind SampleWithoutRecording { get; } = Warning("sample-without-recording", "A sample of the table has no recording.", "a file not yet copied, or an identifier written differently", "copy the export or correct the identifier");

    /// <summary>A recording of a check is not in the check table.</summary>
    public static FindingKind RecordingWithoutCheckRow { get; } = Fault("recording-without-check-row", "A recording of a check is not in the check table.", "a row not yet entered, or a name written differently", "add the row or correct the name");

    /// <summary>A check of the table has no recording.</summary>
    public static FindingKind CheckWithoutRecording { get; } = Warning("check-without-recording", "A check of the table has no recording.", "a file not yet copied, or a name written differently", "copy the export or correct the name");

    private static FindingKind[] Recordings => [IdentifierMissing, IdentifierUnusual, LoadingNotRead, KeyTwice, LineNotUnderstood, ReadingCountDiffers, RecordingWithoutReadings, LoadingTwice, MetadataMissing, MetadataDiffers, NameUndeclared, RecordingWithoutSample, SampleWithoutRecording, RecordingWithoutCheckRow, CheckWithoutRecording];
}
