namespace HemoRheo;

/// <content>Files as a whole.</content>
public static partial class ExportFindings
{
    /// <summary>No layout of the study file applies to this file; nothing was read from it.</summary>
    public static FindingKind NoLayoutFits { get; } = new("no-layout-fits", Severity.Fault, "No layout of the study file applies to this file; nothing was read from it.", "A stray file, or an export of a new kind.", "Remove the file from the folder, or add its name to the files of a layout.");

    /// <summary>More than one layout applies to this file by its name; nothing was read from it.</summary>
    public static FindingKind TwoLayoutsFit { get; } = new("two-layouts-fit", Severity.Fault, "More than one layout applies to this file by its name; nothing was read from it.", "File-name patterns that overlap.", "Make the patterns of the layouts distinct.");

    /// <summary>A path or link leads out of the study's folder; nothing was read from it.</summary>
    public static FindingKind PathLeadsOut { get; } = new("path-leads-out", Severity.Fault, "A path or link leads out of the study's folder; nothing was read from it.", "A link to data that lie elsewhere.", "Copy the data into the study's folder.");

    /// <summary>A file is named in more than one of exports, checks and blanks; nothing was read from it.</summary>
    public static FindingKind FileInBothLists { get; } = new("file-in-both-lists", Severity.Fault, "A file is named in more than one of exports, checks and blanks; nothing was read from it.", "A folder of checks or blank runs inside the exports folder.", "Keep blood, checks and blank runs in folders of their own.");

    /// <summary>The study file names a folder for exports of blood, and no file lies there.</summary>
    public static FindingKind NoExports { get; } = new("no-exports", Severity.Fault, "The study file names a folder for exports of blood, and no file lies there.", "Exports not yet copied, or another folder named.", "Copy the exports into the folder, or correct exports in the study file.");

    /// <summary>A file could not be opened or read.</summary>
    public static FindingKind FileNotReadable { get; } = new("file-not-readable", Severity.Fault, "A file could not be opened or read.", "Missing rights, a file that is open elsewhere, or a pipe or device among the files.", "Close other programs, correct the rights or take away what is no file, then run again.");

    /// <summary>A file has no text.</summary>
    public static FindingKind FileEmpty { get; } = new("file-empty", Severity.Fault, "A file has no text.", "An export that was broken off, or a copy that failed.", "Export or copy the file again.");

    /// <summary>A file holds control characters: it is not a text file in the declared encoding.</summary>
    public static FindingKind FileBinary { get; } = new("file-binary", Severity.Fault, "A file holds control characters: it is not a text file in the declared encoding.", "A workbook or project file instead of a text export, or UTF-16 text without a mark.", "Export as text, or declare the encoding.");

    /// <summary>The byte order mark of a file is missing or contradicts the declared encoding.</summary>
    public static FindingKind EncodingMarkDiffers { get; } = new("encoding-mark-differs", Severity.Fault, "The byte order mark of a file is missing or contradicts the declared encoding.", "An export saved in another encoding.", "Correct encoding in the layout, or save the file again.");

    /// <summary>A file holds bytes that are not text in the declared encoding.</summary>
    public static FindingKind BytesNotText { get; } = new("bytes-not-text", Severity.Fault, "A file holds bytes that are not text in the declared encoding.", "An export in an older code page.", "Correct encoding in the layout, e.g. windows-1252.");

    /// <summary>A line is longer than any export's.</summary>
    public static FindingKind LineTooLong { get; } = new("line-too-long", Severity.Fault, "A line is longer than any export's.", "Not a text export, or line ends were lost.", "Export the file again.");

    /// <summary>A field in quotes is not closed on its line, or text follows its closing quote.</summary>
    public static FindingKind QuoteNotClosed { get; } = new("quote-not-closed", Severity.Fault, "A field in quotes is not closed on its line, or text follows its closing quote.", "A line break inside a field, or a lost quote.", "Export the file again without line breaks in fields.");

    /// <summary>A file ends in the middle: its last line has no end, or a block is shorter than it announces. What stands before the cut was read; the recording is marked.</summary>
    public static FindingKind FileCut { get; } = new("file-cut", Severity.Fault, "A file ends in the middle: its last line has no end, or a block is shorter than it announces. What stands before the cut was read; the recording is marked.", "A full disk, or a copy that was broken off.", "Export or copy the file again.");

    /// <summary>A column that the layout declares is not in the header row; nothing was read from the file.</summary>
    public static FindingKind ColumnMissing { get; } = new("column-missing", Severity.Fault, "A column that the layout declares is not in the header row; nothing was read from the file.", "Another version of the export, or a header written differently.", "Correct the header text in the layout, or export with this column.");

    /// <summary>A declared column stands twice in the header row; nothing was read from the file.</summary>
    public static FindingKind ColumnTwice { get; } = new("column-twice", Severity.Fault, "A declared column stands twice in the header row; nothing was read from the file.", "Columns appended twice.", "Export the file again with each column once.");

    /// <summary>A column's header carries another unit than the layout declares; nothing was read from the file.</summary>
    public static FindingKind HeaderUnitDiffers { get; } = new("header-unit-differs", Severity.Fault, "A column's header carries another unit than the layout declares; nothing was read from the file.", "The unit was changed in the instrument's software.", "Correct header and unit in the layout, or export in the declared unit.");

    /// <summary>A header carries a unit that is not in the table of spellings; nothing was read by it.</summary>
    public static FindingKind UnknownUnit { get; } = new("unknown-unit", Severity.Fault, "A header carries a unit that is not in the table of spellings; nothing was read by it.", "An unusual spelling.", "Write the unit in a spelling of the table.");

    /// <summary>A number has the other decimal sign; nothing was read from the file.</summary>
    public static FindingKind DecimalSignDiffers { get; } = new("decimal-sign-differs", Severity.Fault, "A number has the other decimal sign; nothing was read from the file.", "An export made under other regional settings.", "Correct decimal_sign in the layout, or export again.");

    /// <summary>Columns that the layout does not declare were not read.</summary>
    public static FindingKind ColumnsNotRead { get; } = new("columns-not-read", Severity.Note, "Columns that the layout does not declare were not read.", "An export with more than the study needs.", "Declare them if they are needed.");

    /// <summary>Keys that the layout does not declare were not read.</summary>
    public static FindingKind KeysNotRead { get; } = new("keys-not-read", Severity.Note, "Keys that the layout does not declare were not read.", "An export with more than the study needs.", "Declare them if they are needed.");

    /// <summary>Lines before the first block were not read.</summary>
    public static FindingKind TextNotRead { get; } = new("text-not-read", Severity.Warning, "Lines before the first block were not read.", "A heading of the file.", "Check that nothing needed stands there.");

    /// <summary>A file has a header and no readings.</summary>
    public static FindingKind FileWithoutReadings { get; } = new("file-without-readings", Severity.Fault, "A file has a header and no readings.", "An export made before the measurement.", "Export the file again.");

    private static FindingKind[] Files => [NoLayoutFits, TwoLayoutsFit, PathLeadsOut, FileInBothLists, NoExports, FileNotReadable, FileEmpty, FileBinary, EncodingMarkDiffers, BytesNotText, LineTooLong, QuoteNotClosed, FileCut, ColumnMissing, ColumnTwice, HeaderUnitDiffers, UnknownUnit, DecimalSignDiffers, ColumnsNotRead, KeysNotRead, TextNotRead, FileWithoutReadings];
}
