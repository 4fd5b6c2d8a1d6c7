namespace HemoRheo.Notebooks;

/// <summary>The caution that stands on every page and beside every table.</summary>
internal static class ResearchUse
{
    /// <summary>The caution in one line.</summary>
    public const string Caution = "For research use only. These are research values with their uncertainty, not a diagnosis and not for the care of a person.";

    /// <summary>The caution in a row of a table.</summary>
    public const string Short = "research use only";

    /// <summary>A table whose every row carries the caution, in its last column.</summary>
    /// <param name="table">The table.</param>
    public static Table WithCaution(this Table table) =>
        new(table.Columns.With([Glossary.Column("caution")]), table.Rows.Select(row => row.With([Short])).ToItems());
}
