using Tomlyn.Parsing;
using Tomlyn.Syntax;

namespace HemoRheo;

/// <summary>The text of a study file as tables, lists and values, each with its line and column.</summary>
internal static class TomlTree
{
    /// <summary>The root table; null, with faults, where the text is not TOML.</summary>
    public static TomlTable? Read(string text, StudyFileFaults faults)
    {
        var document = SyntaxParser.Parse(text, "study file", validate: true);
        // What a parser says after its first fault is mostly a consequence of it.
        if (document.Diagnostics.Where(message => message.Kind == DiagnosticMessageKind.Error).MinBy(message => message.Span.Start.Offset) is { } first)
        {
            faults.Add(first.Span.Start.Line + 1, first.Span.Start.Column + 1, $"text that is not TOML ({first.Message.Trim().TrimEnd('.')})", "lines of TOML, such as seed = 1 or name = \"a text\"", "correct this line, and look for an open quote or bracket before it");
            return null;
        }

        var root = new TomlTable(1, 1);
        foreach (var pair in document.KeyValues) Put(root, pair);
        foreach (var section in document.Tables)
        {
            var keys = Keys(section.Name!);
            var table = Section(root, keys, section is TableArraySyntax);
            foreach (var pair in section.Items) Put(table, pair);
        }

        return root;
    }

    private static TomlTable Section(TomlTable root, List<Place> keys, bool listed)
    {
        var table = root;
        for (var at = 0; at < keys.Count - 1; at++) table = Inside(table, keys[at]);
        var last = keys[^1];
        var made = new TomlTable(last.Line, last.Column);
        var known = table.Find(last.Key)?.Node;
        if (!listed) return known as TomlTable ?? Added(table, last, made);
        if (known is TomlList list) list.Items.Add(made);
        else table.Add(new(last.Key, last.Line, last.Column, new TomlList([made], OfTables: true, last.Line, last.Column)));
        return made;
    }

    private static TomlTable Inside(TomlTable table, Place key) => table.Find(key.Key)?.Node switch
    {
        TomlTable known => known,
        TomlList list => (TomlTable)list.Items[^1],
        _ => Added(table, key, new TomlTable(key.Line, key.Column)),
    };

    private static TomlTable Added(TomlTable table, Place key, TomlTable made)
    {
        table.Add(new(key.Key, key.Line, key.Column, made));
        return made;
    }

    private static void Put(TomlTable table, KeyValueSyntax pair)
    {
        var keys = Keys(pair.Key!);
        for (var at = 0; at < keys.Count - 1; at++) table = Inside(table, keys[at]);
        table.Add(new(keys[^1].Key, keys[^1].Line, keys[^1].Column, Node(pair.Value!)));
    }

    private static TomlNode Node(ValueSyntax value)
    {
        var (line, column) = (value.Span.Start.Line + 1, value.Span.Start.Column + 1);
        switch (value)
        {
            case InlineTableSyntax inline:
                var table = new TomlTable(line, column);
                foreach (var item in inline.Items) Put(table, item.KeyValue!);
                return table;
            case ArraySyntax array:
                var items = array.Items.Select(item => Node(item.Value!)).ToList();
                return new TomlList(items, items.Count > 0 && items.TrueForAll(item => item is TomlTable), line, column);
            default:
                return new TomlScalar(Scalar(value), line, column);
        }
    }

    private static object? Scalar(ValueSyntax value) => value switch
    {
        StringValueSyntax text => text.Value,
        IntegerValueSyntax number => number.Value,
        FloatValueSyntax number => number.Value,
        BooleanValueSyntax truth => truth.Value,
        DateTimeValueSyntax { Kind: SyntaxKind.LocalDate } day => DateOnly.FromDateTime(day.Value.DateTime.DateTime),
        DateTimeValueSyntax { Kind: SyntaxKind.OffsetDateTimeByNumber or SyntaxKind.OffsetDateTimeByZ } moment => moment.Value.DateTime,
        _ => null,
    };

    private static List<Place> Keys(KeySyntax key) => [Named(key.Key!), .. key.DotKeys.Select(dotted => Named(dotted.Key!))];

    private static Place Named(BareKeyOrStringValueSyntax key) => new(
        key is StringValueSyntax quoted ? quoted.Value! : ((BareKeySyntax)key).Key!.Text!,
        key.Span.Start.Line + 1,
        key.Span.Start.Column + 1);

    private readonly record struct Place(string Key, int Line, int Column);
}
