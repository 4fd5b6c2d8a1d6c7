namespace HemoRheo;

/// <content>Files as a whole.</content>
public static partial class ExportFindings
{
    /// <summary>No layout of the study file applies to this file; nothing was read from it.</summary>
    public static FindingKind NoLayoutFits { get; } = Fault("no-layout-fits", "No layout of the study file applies to this file; nothing was read from it.", "a stray file, or an export of a new kind", "remove the file from the folder, or add its name to the files of a layout");

    /// <summary>More than one layout applies to this file by its name; nothing was read from it.</summary>
    public static FindingKind TwoLayoutsFit { get; } = Fault("two-layouts-fit", "More than one layout applies to this file by its name; nothing was read from it.", "file-name patterns that overlap", "make the patterns of the layouts distinct");

    /// <summary>A path or link leads out of the study's folder; nothing was read from it.</summary>
    public static FindingKind PathLeadsOut { get; } = Fault("path-leads-out", "A path or link leads out of the study's folder; nothing was read from it.", "a link to data that lie elsewhere", "copy the data into the study's folder");

    /// <summary>A file is named as an export of blood and as a check; nothing was read from it.</summary>
    public static FindingKind FileInBothLists { get; } = Fault("file-in-both-lists", "A file is named as an export of blood and as a check; nothing was read from it.", "a checks folder inside the exports folder", "keep exports and checks in folders of their own");

    /// <summary>A file could not be opened or read.</summary>
    public static FindingKind FileNotReadable { get; } = Fault("file-not-readable", "A file could not be opened or read.", "missing rights, or the file is open elsewhere", "close other programs or correct the rights, then run again");

    /// <summary>A file has no text.</summary>
    public static FindingKind FileEmpty { get; } = Fault("file-empty", "A file has no text.", "an export that was broken off, or a copy that failed", "export or copy the file again");

    /// <summary>A file holds control characters: it is not a text file in the declared encoding.</summary>
    public static FindingKind FileBinary { get; } = Fault("file-binary", "A file holds control characters: it is not a text file in the declared encoding.", "a workbook or project file instead of a text export, or UTF-16 text without a mark", "export as text, or declare the encoding");

    /// <summary>The byte order mark of a file is missing or contradicts the declared encoding.</summary>
    public static FindingKind EncodingMarkDiffers { get; } = Fault("encoding-mark-differs", "The byte order mark of a file is missing or contradicts the declared encoding.", "an export saved in another encoding", "correct encoding in the layout, or save the file again");

    /// <summary>A file holds bytes that are not text in the declared encoding.</summary>
    public static FindingKind BytesNotText { get; } = Fault("bytes-not-text", "A file holds bytes that are not text in the declared encoding.", "an export in an older code page", "correct encoding in the layout, e.g. windows-1252");

    /// <summary>A line is longer than any export's.</summary>
    public static FindingKind LineTooLong { get; } = Fault("line-too-long", "A line is longer than any export's.", "not a text export, or line ends were lost", "export the file again");

    /// <summary>A field in quotes is not closed on its line, or text follows its closing quote.</summary>
    public static FindingKind QuoteNotClosed { get; } = Fault("quote-not-closed", "A field in quotes is not closed on its line, or text follows its closing quote.", "a line break inside a field, or a lost quote", "export the file again without line breaks in fields");

    /// <summary>A file ends in the middle: its last line has no end, or a block is shorter than it announces. What stands before the cut was read; the recording is marked.</summary>
    public static FindingKind FileCut { get; } = Fault("file-cut", "A file ends in the middle: its last line has no end, or a block is shorter than it announces. What stands before the cut was read; the recording is marked.", "a full disk, or a copy that was broken off", "export or copy the file again");

    /// <summary>A column that the layout declares is not in the header row; nothing was read from the file.</summary>
    public static FindingKind ColumnMissing { get; } = Fault("column-missing", "A column that the layout declares is not in the header row; nothing was read from the file.", "another version of the export, or a header written differently", "correct the header text in the layout, or export with this column");

    /// <summary>A declared column stands twice in the header row; nothing was read from the file.</summary>
    public static FindingKind ColumnTwice { get; } = Fault("column-twice", "A declared column stands twice in the header row; nothing was read from the file.", "columns appended twice", "export the file again with each column once");

    /// <summary>A column's header carries another unit than the layout declares; nothing was read from the file.</summary>
    public static FindingKind HeaderUnitDiffers { get; } = Fault("header-unit-differs", "A column's header carries another unit than the layout declares; nothing was read from the file.", "the unit was changed in the instrument's software", "correct header and unit in the layout, or export in the declared unit");

    /// <summary>A header carries a unit that is not in the table of spellings; nothing was read by it.</summary>
    public static FindingKind UnknownUnit { get; } = Fault("unknown-unit", "A header carries a unit that is not in the table of spellings; nothing was read by it.", "an unusual spelling", "write the unit in a spelling of the table");

    /// <summary>A number has the other decimal sign; nothing was read from the file.</summary>
    public static FindingKind DecimalSignDiffers { get; } = Fault("decimal-sign-differs", "A number has the other decimal sign; nothing was read from the file.", "an export made under other regional settings", "correct decimal_sign in the layout, or export again");

    /// <summary>Columns that the layout does not declare were not read.</summary>
    public static FindingKind ColumnsNotRead { get; } = Note("columns-not-read", "Columns that the layout does not declare were not read.", "an export with more than the study needs", "declare them if they are needed");

    /// <summary>Keys that the layout does not declare were not read.</summary>
    public static FindingKind KeysNotRead { get; } = Note("keys-not-read", "Keys that the layout does not declare were not read.", "an export with more than the study needs", "declare them if they are needed");

    /// <summary>Lines before the first block were not read.</summary>
    public static FindingKind TextNotRead { get; } = Warning("text-not-read", "Lines before the first block were not read.", "a heading of the file", "check that nothing needed stands there");

    /// <summary>A file has a header and no readings.</summary>
    public static FindingKind FileWithoutReadings { get; } = Fault("file-without-readings", "A file has a header and no readings.", "an export made before the measurement", "export the file again");

    private static FindingKind[] Files => [NoLayoutFits, TwoLayoutsFit, PathLeadsOut, FileInBothLists, FileNotReadable, FileEmpty, FileBinary, EncodingMarkDiffers, BytesNotText, LineTooLong, QuoteNotClosed, FileCut, ColumnMissing, ColumnTwice, HeaderUnitDiffers, UnknownUnit, DecimalSignDiffers, ColumnsNotRead, KeysNotRead, TextNotRead, FileWithoutReadings];
}
