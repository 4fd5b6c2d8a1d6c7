namespace HemoRheo;

/// <content>The samples, people and check tables.</content>
public static partial class ExportFindings
{
    /// <summary>A column looks like a direct identifier of people; the table was refused.</summary>
    public static FindingKind DirectIdentifierColumn { get; } = Fault("direct-identifier-column", "A column looks like a direct identifier of people; the table was refused.", "a table taken from the clinic as it was", "remove the column, or name it in allowed_columns of the study file; it is never read");

    /// <summary>A column of a table is unknown and was not read.</summary>
    public static FindingKind TableColumnUnknown { get; } = Warning("table-column-unknown", "A column of a table is unknown and was not read.", "a remark, or a header written differently", "correct the header or remove the column");

    /// <summary>A column that the table needs is missing; nothing was read from it.</summary>
    public static FindingKind TableColumnMissing { get; } = Fault("table-column-missing", "A column that the table needs is missing; nothing was read from it.", "a header written differently", "correct the header");

    /// <summary>A column stands twice in a table; nothing was read from it.</summary>
    public static FindingKind TableColumnTwice { get; } = Fault("table-column-twice", "A column stands twice in a table; nothing was read from it.", "columns appended twice", "remove one");

    /// <summary>A column's header has no unit, or none of the table of spellings; the column was not read.</summary>
    public static FindingKind TableColumnUnit { get; } = Fault("table-column-unit", "A column's header has no unit, or none of the table of spellings; the column was not read.", "a header without unit", "write the unit in the header, e.g. hematocrit [L/L]");

    /// <summary>A value of a table could not be read and was withheld.</summary>
    public static FindingKind TableValueNotRead { get; } = Fault("table-value-not-read", "A value of a table could not be read and was withheld.", "a remark in a column of numbers, or a decimal comma", "correct the value; tables have a decimal point");

    /// <summary>Two rows of a table have one identifier; both were set aside.</summary>
    public static FindingKind RowTwice { get; } = Fault("row-twice", "Two rows of a table have one identifier; both were set aside.", "a row entered twice, or one identifier given twice", "remove or rename one");

    /// <summary>A hematocrit cannot be in the unit its column declares; it was withheld, not rescaled.</summary>
    public static FindingKind HematocritImpossible { get; } = Fault("hematocrit-impossible", "A hematocrit cannot be in the unit its column declares; it was withheld, not rescaled.", "per cent in a column of L/L, or L/L in a column of per cent", "correct the value or the unit in the header");

    /// <summary>A value of a table is impossible and was withheld.</summary>
    public static FindingKind ValueImpossible { get; } = Fault("value-impossible", "A value of a table is impossible and was withheld.", "a typing mistake or another unit", "correct the value or the unit in the header");

    /// <summary>A sample has no hematocrit; it is kept and cannot be standardised.</summary>
    public static FindingKind SampleWithoutHematocrit { get; } = Warning("sample-without-hematocrit", "A sample has no hematocrit; it is kept and cannot be standardised.", "a count that was not made or not entered", "enter the hematocrit");

    /// <summary>A hematocrit has no counter, so nothing says how uncertain it is.</summary>
    public static FindingKind SampleWithoutCounter { get; } = Warning("sample-without-counter", "A hematocrit has no counter, so nothing says how uncertain it is.", "a column not filled", "enter the counter");

    /// <summary>A sample's person is not in the people table.</summary>
    public static FindingKind PersonNotInTable { get; } = Warning("person-not-in-table", "A sample's person is not in the people table.", "a row not yet entered, or an identifier written differently", "add the row or correct the identifier");

    /// <summary>A person of the people table has no sample.</summary>
    public static FindingKind PersonWithoutSample { get; } = Note("person-without-sample", "A person of the people table has no sample.", "a person not yet measured", "nothing, where that is so");

    private static FindingKind[] Tables => [DirectIdentifierColumn, TableColumnUnknown, TableColumnMissing, TableColumnTwice, TableColumnUnit, TableValueNotRead, RowTwice, HematocritImpossible, ValueImpossible, SampleWithoutHematocrit, SampleWithoutCounter, PersonNotInTable, PersonWithoutSample];
}
