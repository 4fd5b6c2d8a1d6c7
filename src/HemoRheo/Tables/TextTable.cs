using System.Globalization;
using System.Text;

namespace HemoRheo;

/// <summary>Writes a table as plain text: numbers to the right, texts to the left and wrapped at words where the line is too narrow.</summary>
internal static class TextTable
{
    private const string Gap = "  ";
    private const int Narrowest = 12;
    private const int LongestKeptWord = 16;

    public static string Write(Table table, int width)
    {
        if (table.Columns.Count == 0) return "";
        var headers = table.Columns.Select(column => column.Header).ToArray();
        var cells = table.Rows.Select(row => row.Select(cell => Printable(cell.Shown)).ToArray()).ToArray();
        var right = headers.Select((_, i) => IsNumeric(table, i)).ToArray();
        var widths = Widths(headers, cells, right, width);
        var text = new StringBuilder();
        Header(text, headers, widths, right);
        Row(text, widths.Select(wide => new string('-', wide)).ToArray(), widths, right);
        foreach (var row in cells) Row(text, row, widths, right);
        return text.ToString();
    }

    /// <summary>A text in lines of so many signs at most, broken between words.</summary>
    public static string Wrap(string text, int width) => string.Join('\n', Wrapped(text, width));

    private static bool IsNumeric(Table table, int column) =>
        table.Rows.Any(row => row[column].Number is not null) && table.Rows.All(row => row[column].Number is not null || row[column].IsEmpty);

    private static int[] Widths(string[] headers, string[][] cells, bool[] right, int width)
    {
        var longest = headers.Select((_, i) => cells.Max(row => (int?)Length(row[i])) ?? 0).ToArray();
        var widths = headers.Select((header, i) => Math.Max(Length(header), longest[i])).ToArray();
        var narrowest = headers.Select((header, i) => right[i] ? Math.Max(LongestWord(header), longest[i]) : Math.Min(widths[i], Math.Max(Narrowest, KeptWord(cells, i)))).ToArray();
        var excess = widths.Sum() + Gap.Length * (widths.Length - 1) - width;
        for (; excess > 0; excess--)
        {
            var widest = Enumerable.Range(0, widths.Length).MaxBy(i => widths[i] > narrowest[i] ? widths[i] : 0);
            if (widths[widest] <= narrowest[widest]) break;
            widths[widest]--;
        }

        return widths;
    }

    private static void Header(StringBuilder text, string[] headers, int[] widths, bool[] right)
    {
        var wrapped = headers.Select((header, i) => Wrapped(header, widths[i])).ToArray();
        var lines = wrapped.Max(header => header.Count);
        foreach (var header in wrapped) header.InsertRange(0, Enumerable.Repeat("", lines - header.Count));
        Lines(text, wrapped, widths, right);
    }

    private static void Row(StringBuilder text, string[] cells, int[] widths, bool[] right) =>
        Lines(text, [.. cells.Select((cell, i) => Wrapped(cell, widths[i]))], widths, right);

    private static void Lines(StringBuilder text, List<string>[] wrapped, int[] widths, bool[] right)
    {
        for (var line = 0; line < wrapped.Max(lines => lines.Count); line++)
        {
            var parts = wrapped.Select((lines, i) => Aligned(line < lines.Count ? lines[line] : "", widths[i], right[i]));
            text.Append(string.Join(Gap, parts).TrimEnd()).Append('\n');
        }
    }

    private static List<string> Wrapped(string cell, int width)
    {
        var lines = new List<string>();
        var line = "";
        foreach (var word in cell.Split(' '))
        {
            if (line.Length > 0 && Length(line) + 1 + Length(word) > width)
            {
                lines.Add(line);
                line = "";
            }

            line = line.Length == 0 ? word : $"{line} {word}";
            while (Length(line) > width)
            {
                var elements = new StringInfo(line);
                lines.Add(elements.SubstringByTextElements(0, width));
                line = elements.SubstringByTextElements(width);
            }
        }

        lines.Add(line);
        return lines;
    }

    private static string Aligned(string text, int width, bool right)
    {
        var space = new string(' ', Math.Max(0, width - Length(text)));
        return right ? space + text : text + space;
    }

    /// <summary>The longest word of a column that is not broken; longer ones, such as paths, are.</summary>
    private static int KeptWord(string[][] cells, int column) =>
        cells.SelectMany(row => row[column].Split(' ')).Select(Length).Where(length => length <= LongestKeptWord).DefaultIfEmpty(0).Max();

    private static int LongestWord(string text) => text.Split(' ').Max(Length);

    private static int Length(string text) => new StringInfo(text).LengthInTextElements;

    /// <summary>Text from files may hold control characters; a console would obey them.</summary>
    private static string Printable(string text) => string.Concat(text.Select(c => char.IsControl(c) ? ' ' : c));
}
