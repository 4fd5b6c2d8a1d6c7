namespace HemoRheo.Notebooks;

/// <summary>A table as HTML: units in the headings, numbers to the right, the middle of a long table left out with the number of rows said.</summary>
internal static class TableMarkup
{
    private const int First = 20;
    private const int Last = 5;

    private const int ShortText = 30;

    private static readonly Markup ToTheLeft = new(" style=\"text-align:left\"");
    private static readonly Markup ToTheRight = new(" style=\"text-align:right\"");
    private static readonly Markup OnOneLine = new(" style=\"text-align:left;white-space:nowrap\"");

    /// <summary>The table with its caption.</summary>
    public static Markup Of(Table table, string caption = "")
    {
        var align = table.Columns.Select((_, i) => IsNumeric(table, i) ? ToTheRight : ToTheLeft).ToArray();
        var rows = table.Rows.Count <= First + Last + 1
            ? table.Rows.Select(row => Row(row, align))
            : [.. table.Rows.Take(First).Select(row => Row(row, align)), LeftOut(table), .. table.Rows.TakeLast(Last).Select(row => Row(row, align))];
        return Markup.Of($"""
            <div style="overflow-x:auto"><table>{(caption.Length == 0 ? Markup.None : Markup.Of($"<caption{ToTheLeft}>{caption}</caption>"))}<thead><tr>{table.Columns.Select((column, i) => Markup.Of($"<th title=\"{column.Meaning}\"{align[i]}>{column.Header}</th>"))}</tr></thead><tbody>
            {rows}</tbody></table></div>

            """);
    }

    /// <summary>The table behind a line that opens it.</summary>
    public static Markup Folded(Table table, string line) =>
        table.Rows.Count == 0 ? Markup.None : Markup.Of($"<details><summary>{line}</summary>{Of(table)}</details>\n");

    private static Markup Style(Cell cell, Markup align) => align == ToTheLeft && cell.Shown.Length <= ShortText ? OnOneLine : align;

    private static Markup Row(Items<Cell> row, Markup[] align) => Markup.Of($"<tr>{row.Select((cell, i) => Markup.Of($"<td{Style(cell, align[i])}>{cell.Shown}</td>"))}</tr>\n");

    private static Markup LeftOut(Table table) =>
        Markup.Of($"<tr><td colspan=\"{table.Columns.Count}\"{ToTheLeft}><i>{table.Rows.Count - First - Last} of {table.Rows.Count} rows not shown</i></td></tr>\n");

    private static bool IsNumeric(Table table, int column) =>
        table.Rows.Any(row => row[column].Number is not null) && table.Rows.All(row => row[column].Number is not null || row[column].IsEmpty);
}
