namespace HemoRheo;

/// <content>The samples, people and check tables.</content>
public static partial class ExportFindings
{
    /// <summary>A column looks like a direct identifier of people; the table was refused.</summary>
    public static FindingKind DirectIdentifierColumn { get; } = new("direct-identifier-column", Severity.Fault, "A column looks like a direct identifier of people; the table was refused.", "A table taken from the clinic as it was.", "Remove the column, or name it in allowed_columns of the study file; it is never read.");

    /// <summary>A column of a table is unknown and was not read.</summary>
    public static FindingKind TableColumnUnknown { get; } = new("table-column-unknown", Severity.Warning, "A column of a table is unknown and was not read.", "A remark, or a header written differently.", "Correct the header or remove the column.");

    /// <summary>A column that the table needs is missing; nothing was read from it.</summary>
    public static FindingKind TableColumnMissing { get; } = new("table-column-missing", Severity.Fault, "A column that the table needs is missing; nothing was read from it.", "A header written differently.", "Correct the header.");

    /// <summary>A column stands twice in a table; nothing was read from it.</summary>
    public static FindingKind TableColumnTwice { get; } = new("table-column-twice", Severity.Fault, "A column stands twice in a table; nothing was read from it.", "Columns appended twice.", "Remove one.");

    /// <summary>A column's header has no unit, or none of the table of spellings; the column was not read.</summary>
    public static FindingKind TableColumnUnit { get; } = new("table-column-unit", Severity.Fault, "A column's header has no unit, or none of the table of spellings; the column was not read.", "A header without unit.", "Write the unit in the header, e.g. hematocrit [L/L].");

    /// <summary>A value of a table could not be read and was withheld.</summary>
    public static FindingKind TableValueNotRead { get; } = new("table-value-not-read", Severity.Fault, "A value of a table could not be read and was withheld.", "A remark in a column of numbers, or a decimal comma.", "Correct the value; tables have a decimal point.");

    /// <summary>Two rows of a table have one identifier; both were set aside.</summary>
    public static FindingKind RowTwice { get; } = new("row-twice", Severity.Fault, "Two rows of a table have one identifier; both were set aside.", "A row entered twice, or one identifier given twice.", "Remove or rename one.");

    /// <summary>A hematocrit cannot be in the unit its column declares; it was withheld, not rescaled.</summary>
    public static FindingKind HematocritImpossible { get; } = new("hematocrit-impossible", Severity.Fault, "A hematocrit cannot be in the unit its column declares; it was withheld, not rescaled.", "Per cent in a column of L/L, or L/L in a column of per cent.", "Correct the value or the unit in the header.");

    /// <summary>A value of a table is impossible and was withheld.</summary>
    public static FindingKind ValueImpossible { get; } = new("value-impossible", Severity.Fault, "A value of a table is impossible and was withheld.", "A typing mistake or another unit.", "Correct the value or the unit in the header.");

    /// <summary>A sample has no hematocrit; it is kept and cannot be standardised.</summary>
    public static FindingKind SampleWithoutHematocrit { get; } = new("sample-without-hematocrit", Severity.Warning, "A sample has no hematocrit; it is kept and cannot be standardised.", "A count that was not made or not entered.", "Enter the hematocrit.");

    /// <summary>A hematocrit has no counter, so nothing says how uncertain it is.</summary>
    public static FindingKind SampleWithoutCounter { get; } = new("sample-without-counter", Severity.Warning, "A hematocrit has no counter, so nothing says how uncertain it is.", "A column not filled.", "Enter the counter.");

    /// <summary>A sample's person is not in the people table.</summary>
    public static FindingKind PersonNotInTable { get; } = new("person-not-in-table", Severity.Warning, "A sample's person is not in the people table.", "A row not yet entered, or an identifier written differently.", "Add the row or correct the identifier.");

    /// <summary>A person of the people table has no sample.</summary>
    public static FindingKind PersonNotMeasured { get; } = new("person-not-measured", Severity.Note, "A person of the people table has no sample.", "A person not yet measured.", "Nothing, where that is so.");

    private static FindingKind[] Tables => [DirectIdentifierColumn, TableColumnUnknown, TableColumnMissing, TableColumnTwice, TableColumnUnit, TableValueNotRead, RowTwice, HematocritImpossible, ValueImpossible, SampleWithoutHematocrit, SampleWithoutCounter, PersonNotInTable, PersonNotMeasured];
}
