using System.Text;

namespace HemoRheo;

/// <content>Layouts.</content>
internal sealed partial class StudyFileReader
{
    private Layout Layout(SectionReader section)
    {
        var blocks = section.Text("shape") == "blocks";
        var fields = Fields(section, "[layouts.columns]", perReading: true).Concat(Fields(section, "[layouts.keys]", perReading: false)).ToItems();
        var layout = new Layout(
            section.Text("name"),
            blocks ? LayoutShape.Blocks : LayoutShape.Rows,
            section.Texts("files"),
            section.Text("encoding"),
            Single(section, "separator"),
            Single(section, "decimal_sign"),
            section.OptionalText("time_format") ?? "",
            section.OptionalText("block_start"),
            section.Text("key_separator"),
            fields,
            section.Texts("up_words"),
            section.Texts("down_words"))
        {
            LastLineEnds = section.Truth("last_line_ends"),
        };
        CheckLayout(section, layout);
        return layout;
    }

    private static void CheckLayout(SectionReader section, Layout layout)
    {
        var blocks = layout.Shape == LayoutShape.Blocks;
        var fields = layout.Fields;
        bool Has(FieldMeaning meaning) => fields.Any(field => field.Meaning == meaning);
        if (layout.Separator == layout.DecimalSign && layout.Separator != '\0')
            section.Refuse("separator", "a separator that is also the decimal sign", "two different signs", "correct separator or decimal_sign");
        if (!KnownEncoding(layout.Encoding))
            section.Refuse("encoding", $"the unknown encoding \"{layout.Encoding}\"", "a web name such as \"utf-8\", \"utf-16\", \"windows-1252\"", "correct encoding");
        if (blocks && layout.BlockStart is null) section.Refuse("shape", "blocks without \"block_start\"", "the key whose line starts a block", "add block_start");
        if (!blocks && section.Has("block_start")) section.Refuse("block_start", "\"block_start\" with shape \"rows\"", "only with shape \"blocks\"", "remove it");
        if (!blocks && section.Table.Find("keys") is { } keys) section.Refuse("keys", "[layouts.keys] with shape \"rows\"", "only with shape \"blocks\"", $"move the keys at line {keys.Line} to [layouts.columns]");
        if (!Has(FieldMeaning.Sample)) section.Refuse("columns", "no field that names the sample", "sample = { header = ... }", "add it to [layouts.columns] or [layouts.keys]");
        if (!(Has(FieldMeaning.Speed) && Has(FieldMeaning.Torque)) && !(Has(FieldMeaning.ShearRate) && Has(FieldMeaning.ShearStress)))
            section.Refuse("columns", "neither speed and torque nor shear_rate and shear_stress", "both of one pair", "add the columns that the export has");
        if (Has(FieldMeaning.StartedAt) && !layout.TimeFormat.Contains("zzz", StringComparison.Ordinal))
            section.Refuse("time_format", layout.TimeFormat.Length == 0 ? "started_at without \"time_format\"" : $"a time format without offset, \"{layout.TimeFormat}\"", "a format with zzz", "times without an offset are refused: the hour when clocks go back happens twice; have the instrument export the offset, or give started_at in the samples table");
        if (Has(FieldMeaning.Ramp) && layout.UpWords.Count + layout.DownWords.Count == 0)
            section.Refuse("columns", "a ramp field without words for it", "up_words and down_words", "add the words that the export uses");
        foreach (var twice in fields.GroupBy(field => field.Meaning).Where(same => same.Count() > 1))
            section.Refuse("keys", $"{twice.Key.Word()} as a column and as a key", "one of the two", "remove one");
        if (Has(FieldMeaning.ReadingCount) && !blocks) section.Refuse("columns", "reading_count in rows", "only as a key of blocks", "remove it");
    }

    private List<LayoutField> Fields(SectionReader layout, string section, bool perReading)
    {
        var name = section.Trim('[', ']').Split('.')[^1];
        if (layout.Table.Find(name) is null) return [];
        var table = One(layout.Table, section).Table;
        var fields = table.Entries.Where(entry => FieldMeaningWords.Meaning(entry.Key) is not null).Select(entry => Field(entry, perReading)).OfType<LayoutField>().ToList();
        foreach (var twice in fields.GroupBy(field => field.Header).Where(same => same.Count() > 1))
            _faults.Add(table, $"the header \"{twice.Key}\" for {string.Join(" and ", twice.Select(field => field.Meaning.Word()))}", "one field a header", "correct one of them");
        return fields;
    }

    private LayoutField? Field(TomlEntry entry, bool perReading)
    {
        var meaning = FieldMeaningWords.Meaning(entry.Key)!.Value;
        var example = StudyFileKeys.All.First(key => key.Kind == StudyFileKeyKind.Field && key.Name == entry.Key).Example;
        if (entry.Node is not TomlTable table)
        {
            _faults.Add(entry.Node, entry.Node.InWords, example, "write header and unit in braces");
            return null;
        }

        foreach (var stray in table.Entries.Where(inner => inner.Key is not ("header" or "unit")))
            _faults.Add(stray.Line, stray.Column, $"the unknown key \"{stray.Key}\"", "header and unit", Spelling.Nearest(stray.Key, ["header", "unit"]) is { } near ? $"did you mean \"{near}\"?" : "remove it");
        if (table.Find("header")?.Node is not TomlScalar { Value: string { Length: > 0 } header })
        {
            _faults.Add(table, "no header text", example, "write the header exactly as the export does");
            return null;
        }

        return new(meaning, header, Unit(table, meaning, header, example), perReading);
    }

    private Unit? Unit(TomlTable table, FieldMeaning meaning, string header, string example)
    {
        var node = table.Find("unit")?.Node;
        if (meaning.Quantity() is not { } quantity)
        {
            if (node is not null) _faults.Add(node, $"a unit for {meaning.Word()}", "none: it is not a quantity", "remove unit");
            return null;
        }

        if (node is not TomlScalar { Value: string spelling })
        {
            _faults.Add(node ?? table, node is null ? $"no unit for {meaning.Word()}" : node.InWords, example, "write the unit that the export uses");
            return null;
        }

        var unit = UnitTable.Find(spelling, quantity);
        if (unit is null)
            _faults.Add(node, $"the unknown unit \"{spelling}\"", string.Join(", ", UnitTable.SpellingsOf(quantity)), UnitTable.Nearest(spelling, quantity) is { } near ? $"did you mean \"{near}\"?" : "write one of these");
        else if (HeaderUnit.Contradiction(header, unit) is { } other)
            _faults.Add(node, $"the unit \"{spelling}\" for a header that says \"{other}\"", "one unit", "correct header or unit");
        return unit;
    }

    private static char Single(SectionReader section, string name)
    {
        var text = section.Text(name);
        if (text.Length == 1 && text[0] is not ('"' or '\n' or '\r')) return text[0];
        if (text.Length > 0) section.Refuse(name, $"the text \"{text}\"", "one character", "write one character, such as \";\" or \"\\t\"");
        return '\0';
    }

    private static bool KnownEncoding(string name)
    {
        if (name.Length == 0) return true;
        return TextEncodings.Find(name) is { } encoding && encoding is not UTF32Encoding;
    }
}
