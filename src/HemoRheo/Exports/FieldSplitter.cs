namespace HemoRheo;

/// <summary>Splits a line into its fields; a field in double quotes may hold the separator, and "" in it is one quote.</summary>
internal static class FieldSplitter
{
    /// <summary>Puts the fields, blanks around them removed, into a list. False where a quote is not closed on the line.</summary>
    public static bool Split(string line, char separator, List<string> fields)
    {
        fields.Clear();
        var start = 0;
        while (true)
        {
            if (start < line.Length && line[start] == '"')
            {
                var close = Closing(line, start + 1);
                if (close < 0) return false;
                var next = line.IndexOf(separator, close);
                var after = next < 0 ? line.Length : next;
                if (line.AsSpan(close + 1, after - close - 1).Trim(' ').Length > 0) return false;
                fields.Add(line[(start + 1)..close].Replace("\"\"", "\"", StringComparison.Ordinal));
                if (next < 0) return true;
                start = next + 1;
                continue;
            }

            var end = line.IndexOf(separator, start);
            fields.Add(line.AsSpan(start, (end < 0 ? line.Length : end) - start).Trim(' ').ToString());
            if (end < 0) return true;
            start = end + 1;
        }
    }

    private static int Closing(string line, int from)
    {
        while (true)
        {
            var quote = line.IndexOf('"', from);
            if (quote < 0 || quote + 1 == line.Length || line[quote + 1] != '"') return quote;
            from = quote + 2;
        }
    }
}
