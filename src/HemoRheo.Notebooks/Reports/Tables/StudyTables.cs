namespace HemoRheo.Notebooks;

/// <summary>All tables of a study, their data dictionary and the page of text beside them.</summary>
internal static class StudyTables
{
    /// <summary>Name of the data dictionary's file.</summary>
    public const string Dictionary = "data-dictionary.csv";

    /// <summary>The tables, without their dictionary; every row of each carries the caution.</summary>
    public static Items<StudyTable> All(Edition edition) => Plain(edition).Select(one => one with { Table = one.Table.WithCaution() }).ToItems();

    private static Items<StudyTable> Plain(Edition edition) =>
    [
        ValueTables.Values(edition),
        ValueTables.Budget(edition),
        CurveTables.Points(edition),
        CurveTables.Fits(edition),
        CurveTables.Laws(edition),
        GroupTables.Groups(edition),
        GroupTables.Comparisons(edition),
        GroupTables.Verdicts(edition),
        GroupTables.Ranges(edition),
        LabTables.Checks(edition),
        .. LabTables.Torques(edition),
        LabTables.Findings(edition),
        LabTables.Files(edition),
    ];

    /// <summary>Every file of the folder of tables: name and text.</summary>
    public static IEnumerable<NamedText> Files(Edition edition)
    {
        var tables = All(edition);
        foreach (var table in tables) yield return new(table.File, table.Table.ToCsv());
        yield return new(Dictionary, Describe(tables).WithCaution().ToCsv());
        yield return new("README.txt", Readme(edition, tables));
    }

    /// <summary>One row a column of each table; the first says what the numbers are for.</summary>
    public static Table Describe(IReadOnlyList<StudyTable> tables) => Table.Of("table", "name", "meaning", "unit", "UCUM code")
        .With("all", "caution", ResearchUse.Caution, Cell.Empty, Cell.Empty)
        .WithRows(tables.SelectMany(table => table.Table.Columns.Select(column => (table.File, column))), row => [row.File, row.column.Header, row.column.Meaning, row.column.Unit?.Symbol, row.column.Unit?.Ucum]);

    private static string Readme(Edition edition, Items<StudyTable> tables) => string.Join("\n", (IEnumerable<string>)
    [
        $"Tables of the study {edition.Study.Name.ReplaceLineEndings(" ")}",
        "",
        ResearchUse.Caution,
        "",
        .. tables.Select(table => $"{table.File}\n    {table.About}"),
        $"{Dictionary}\n    One row a column of each table: meaning, unit, UCUM code.",
        "",
        "Comma-separated, UTF-8, decimal point, lines end with a line feed, numbers in full, empty where there is nothing, Inf where infinite.",
        "A text that a spreadsheet would take for a formula has an apostrophe before it.",
        "",
    ]);
}
