using Deedle;

namespace HemoRheo.Notebooks;

/// <summary>A frame as HTML: its first and last rows, missing values said so, everything encoded.</summary>
internal static class FrameMarkup
{
    private const int First = 20;
    private const int Last = 5;

    public static string Of(IFrame frame) => frame.Apply(new Writer()).Text;

    /// <summary>Its size in words.</summary>
    public static string Size(IFrame frame) => frame.Apply(new Measure());

    private sealed class Measure : IFrameOperation<string>
    {
        public string Invoke<TRow, TColumn>(Frame<TRow, TColumn> frame)
            where TRow : notnull
            where TColumn : notnull => $"frame: {frame.RowCount} rows x {frame.ColumnCount} columns";
    }

    private sealed class Writer : IFrameOperation<Markup>
    {
        public Markup Invoke<TRow, TColumn>(Frame<TRow, TColumn> frame)
            where TRow : notnull
            where TColumn : notnull
        {
            var columns = Enumerable.Range(0, frame.ColumnCount).Select(place => frame.Columns.GetAt(place)).ToArray();
            var keys = frame.RowKeys.ToArray();
            var shown = Enumerable.Range(0, keys.Length).Where(row => keys.Length <= First + Last + 1 || row < First || row >= keys.Length - Last);
            return Markup.Of($"""
                <div style="overflow-x:auto"><table><thead><tr><th></th>{frame.ColumnKeys.Select(key => Markup.Of($"<th>{FrameCell.Text(key)}</th>"))}</tr></thead><tbody>
                {shown.Select(row => Markup.Of($"{Gap(row, keys.Length, columns.Length)}<tr><th>{FrameCell.Text(keys[row])}</th>{columns.Select(column => FrameCell.Of(column.TryGetAt(row) is { HasValue: true } value ? value.Value : null))}</tr>\n"))}</tbody></table></div>
                <p>{keys.Length} rows x {columns.Length} columns</p>
                """);
        }

        private static Markup Gap(int row, int rows, int columns) =>
            rows > First + Last + 1 && row == rows - Last ? Markup.Of($"<tr><td colspan=\"{columns + 1}\"><i>{rows - First - Last} rows not shown</i></td></tr>\n") : Markup.None;
    }
}
