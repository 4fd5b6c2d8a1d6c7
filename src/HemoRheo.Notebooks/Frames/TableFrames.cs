using Deedle;

namespace HemoRheo;

/// <summary>Tables as frames, for those who go on with Deedle.</summary>
public static class TableFrames
{
    /// <summary>The table as a frame: one column a column, named by its heading with the unit; numbers in full, an empty number missing; rows counted from 1.</summary>
    /// <param name="table">The table.</param>
    public static Frame<int, string> ToFrame(this Table table)
    {
        var keys = Enumerable.Range(1, table.Rows.Count).ToArray();
        var columns = new FrameBuilder.Columns<int, string>();
        for (var i = 0; i < table.Columns.Count; i++)
        {
            var cells = table.Rows.Select(row => row[i]).ToArray();
            var header = table.Columns[i].Header;
            if ((table.Columns[i].Unit is not null || Array.Exists(cells, cell => cell.Number is not null)) && Array.TrueForAll(cells, cell => cell.Number is not null || cell.IsEmpty))
            {
                columns.Add(header, new Series<int, double>(keys, cells.Select(cell => cell.Number ?? double.NaN).ToArray()));
            }
            else
            {
                columns.Add(header, new Series<int, string>(keys, cells.Select(cell => cell.Shown).ToArray()));
            }
        }

        return columns.Frame;
    }
}
