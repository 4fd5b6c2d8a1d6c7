namespace HemoRheo;

/// <summary>One row of a table of the study.</summary>
/// <param name="Line">Its line, from 1.</param>
/// <param name="Fields">Its fields by column name: text, number of the column, unit of the column.</param>
internal sealed record TableRow(int Line, Dictionary<string, (string Text, int Column, Unit? Unit)> Fields)
{
    /// <summary>The text of a column; null where the table has no such column or the field is empty.</summary>
    public string? this[string column] => Fields.TryGetValue(column, out var field) && field.Text.Length > 0 ? field.Text : null;

    public Where At(string file, string column) => new(file, Line: Line, Column: Fields.TryGetValue(column, out var field) ? field.Column : null);
}
