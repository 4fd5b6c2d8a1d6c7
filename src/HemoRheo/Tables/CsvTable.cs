using System.Globalization;
using System.Text;

namespace HemoRheo;

/// <summary>Writes a table as comma-separated values.</summary>
/// <remarks>Source: RFC 4180 for quoting; lines end with a line feed alone.</remarks>
internal static class CsvTable
{
    public static string Write(Table table)
    {
        var text = new StringBuilder();
        Line(text, table.Columns.Select(column => Quoted(Guarded(column.Header))));
        foreach (var row in table.Rows) Line(text, row.Select(Field));
        return text.ToString();
    }

    private static void Line(StringBuilder text, IEnumerable<string> fields) => text.AppendJoin(',', fields).Append('\n');

    private static string Field(Cell cell) => cell.Number switch
    {
        null => Quoted(Guarded(cell.Shown)),
        double.PositiveInfinity => "Inf",
        double.NegativeInfinity => "-Inf",
        { } number => number.ToString("R", CultureInfo.InvariantCulture),
    };

    private static string Guarded(string text) => text is ['=' or '+' or '-' or '@' or '\t' or '\r', ..] ? $"'{text}" : text;

    private static string Quoted(string text) => text.AsSpan().IndexOfAny(",\"\n\r") < 0 ? text : $"\"{text.Replace("\"", "\"\"", StringComparison.Ordinal)}\"";
}
