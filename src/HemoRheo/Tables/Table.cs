namespace HemoRheo;

/// <summary>A finished table: columns with their meaning, and rows of cells. Compares by content.</summary>
/// <param name="Columns">Its columns.</param>
/// <param name="Rows">Its rows, each with one cell a column.</param>
public sealed record Table(Items<Column> Columns, Items<Items<Cell>> Rows)
{
    /// <summary>A table without rows, its columns looked up in the glossary.</summary>
    /// <param name="columns">Names of the columns.</param>
    /// <exception cref="ArgumentException">The glossary does not hold one of them; the message names the nearest one.</exception>
    public static Table Of(params ReadOnlySpan<string> columns)
    {
        var found = new Column[columns.Length];
        for (var i = 0; i < columns.Length; i++) found[i] = Glossary.Column(columns[i]);
        return new(found.ToItems(), []);
    }

    /// <summary>This table with one more row.</summary>
    /// <param name="cells">One cell a column.</param>
    /// <exception cref="ArgumentException">There are more or fewer cells than columns.</exception>
    public Table With(params ReadOnlySpan<Cell> cells) => this with { Rows = Rows.With([Row(cells)]) };

    /// <summary>This table with more rows, one for each of these.</summary>
    /// <typeparam name="T">What a row is about.</typeparam>
    /// <param name="things">What the rows are about.</param>
    /// <param name="row">The cells of one row, one a column.</param>
    /// <exception cref="ArgumentException">A row has more or fewer cells than there are columns.</exception>
    public Table WithRows<T>(IEnumerable<T> things, Func<T, Cell[]> row) => this with { Rows = Rows.With(things.Select(thing => Row(row(thing)))) };

    /// <summary>The meaning, unit and UCUM code of each column of this table, as a table.</summary>
    public Table Dictionary() => Glossary.Describe(Columns);

    /// <summary>The table as plain text with aligned columns, for a console or a page of text.</summary>
    /// <param name="width">Widest line; long texts are wrapped to keep to it, numbers never are.</param>
    public string ToText(int width = 100) => TextTable.Write(this, width);

    /// <summary>The table as comma-separated values: RFC 4180 with line feeds, numbers in full, headings with units.</summary>
    /// <remarks>A text that a spreadsheet would take for a formula gets a leading apostrophe; numbers are never touched.</remarks>
    public string ToCsv() => CsvTable.Write(this);

    /// <inheritdoc/>
    public override string ToString() => ToText();

    private Items<Cell> Row(ReadOnlySpan<Cell> cells) => cells.Length == Columns.Count
        ? Items.Create(cells)
        : throw new ArgumentException($"A row needs one cell a column: there are {Columns.Count} columns ({string.Join(", ", Columns)}) and {cells.Length} cells.", nameof(cells));
}
