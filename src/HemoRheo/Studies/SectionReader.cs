using System.Globalization;

namespace HemoRheo;

/// <summary>One section of a study file, read strictly by the keys that <see cref="StudyFileKeys"/> gives it. Faults are collected; a faulty value comes back as NaN or empty and never leaves the reader.</summary>
internal sealed class SectionReader
{
    private static readonly TimeSpan LongestSpan = TimeSpan.FromDays(3660);

    private readonly StudyFileFaults _faults;
    private readonly Items<StudyFileKey> _all;
    private readonly Items<StudyFileKey> _keys;

    public SectionReader(TomlTable table, string section, StudyFileFaults faults, Items<StudyFileKey>? all = null)
    {
        (Table, Section, _faults, _all) = (table, section, faults, all ?? StudyFileKeys.All);
        _keys = _all.Where(key => key.Section == section).ToItems();
        var nested = StudyFileKeys.SectionsIn(section, _all);
        foreach (var entry in table.Entries)
            if (!_keys.Any(key => key.Name == entry.Key) && !nested.Contains(entry.Key)) AddUnknown(entry, nested);
    }

    public TomlTable Table { get; }

    public string Section { get; }

    public bool Has(string name) => Table.Find(name) is not null;

    public string Text(string name) => Node(name) is { } node ? TextOf(node, Key(name)) ?? "" : "";

    public string? OptionalText(string name) => Node(name) is { } node ? TextOf(node, Key(name)) : null;

    public Items<string> Texts(string name) => ListOf(name).Select(node => TextOf(node, Key(name))).OfType<string>().ToItems();

    public double Amount(string name) => OptionalAmount(name) ?? double.NaN;

    public double? OptionalAmount(string name) => Node(name) is { } node ? AmountOf(node, Key(name)) : null;

    public Items<double> Amounts(string name) => ListOf(name).Select(node => AmountOf(node, Key(name))).ToItems();

    public TimeSpan Span(string name)
    {
        var seconds = Amount(name);
        if (seconds > LongestSpan.TotalSeconds) Refuse(name, $"a {name} of more than {LongestSpan.Days} days", "a shorter time", "correct it");
        return seconds <= LongestSpan.TotalSeconds ? TimeSpan.FromSeconds(seconds) : TimeSpan.Zero;
    }

    public long WholeNumber(string name) => Node(name) is { } node ? Taken<long>(node, Key(name), "a whole number") : 0;

    public bool Truth(string name) => Node(name) is { } node && Taken<bool>(node, Key(name), "true or false");

    public double Number(string name)
    {
        if (Node(name) is not { } node) return double.NaN;
        var number = (node as TomlScalar)?.Value switch { long whole => whole, double real => real, _ => double.NaN };
        if (double.IsNaN(number)) AddKind(node, Key(name), "a plain number");
        else if (!double.IsFinite(number) || !Key(name).Bounds.Allow(number)) AddBounds(node, Key(name), node.InWords);
        return number;
    }

    public Items<DateTimeOffset> Moments(string name) =>
        ListOf(name).Select(node => Taken<DateTimeOffset>(node, Key(name), "a date and time with offset")).ToItems();

    public DateOnly Date(string name) => Node(name) is { } node ? Taken<DateOnly>(node, Key(name), "a date without a time") : default;

    /// <summary>Says of each of these optional keys that is missing that it is needed here.</summary>
    public void Demand(params ReadOnlySpan<string> names)
    {
        foreach (var name in names)
            if (!Has(name)) AddMissing(Key(name));
    }

    /// <summary>Says that a value of this section is impossible.</summary>
    public void Refuse(string name, string found, string expected, string whatToDo) =>
        _faults.Add(Table.Find(name)?.Node ?? Table, found, expected, whatToDo);

    private StudyFileKey Key(string name) => _keys.First(key => key.Name == name);

    private TomlNode? Node(string name)
    {
        var key = Key(name);
        if (Table.Find(name) is { } entry) return entry.Node;
        if (key.Default is not null) return TomlTree.Read($"default = {key.Default}", new StudyFileFaults("default"))!.Find("default")!.Node;
        if (key.Required) AddMissing(key);
        return null;
    }

    private void AddMissing(StudyFileKey key) =>
        _faults.Add(Table, $"no \"{key.Name}\"{(Section.Length == 0 ? "" : $" in {Section}")}", $"{key.Name} = {key.Example}", $"add it: {key.Meaning}");

    private List<TomlNode> ListOf(string name)
    {
        if (Node(name) is not { } node) return [];
        if (node is TomlList { OfTables: false } list) return list.Items;
        AddKind(node, Key(name), "a list");
        return [];
    }

    private string? TextOf(TomlNode node, StudyFileKey key)
    {
        if (node is not TomlScalar { Value: string text })
            AddKind(node, key, "a text");
        else if (text.Length == 0)
            _faults.Add(node, "an empty text", $"{key.Name} = {key.Example}", "write the text or remove the key");
        else if (key.Allowed.Count > 0 && !key.Allowed.Contains(text))
            _faults.Add(node, node.InWords, string.Join(", ", key.Allowed.Select(word => $"\"{word}\"")), Spelling.Nearest(text, key.Allowed) is { } near ? $"did you mean \"{near}\"?" : "write one of these");
        else
            return text;
        return null;
    }

    private double AmountOf(TomlNode node, StudyFileKey key)
    {
        if (node is not TomlScalar { Value: string text })
        {
            AddKind(node, key, "a number with its unit, as text");
            return double.NaN;
        }

        if (!QuantityText.TryRead(text, key.Quantity, out var si, out var fault))
            _faults.Add(node, fault, $"a number with one of the units {string.Join(", ", UnitTable.SpellingsOf(key.Quantity))}", $"write it like {key.Example}");
        else if (!key.Bounds.Allow(si))
            AddBounds(node, key, text);
        else
            return si;
        return double.NaN;
    }

    private T Taken<T>(TomlNode node, StudyFileKey key, string expected)
    {
        if (node is TomlScalar { Value: T value }) return value;
        AddKind(node, key, expected);
        return default!;
    }

    private void AddKind(TomlNode node, StudyFileKey key, string expected) => _faults.Add(node, node.InWords, expected, $"write it like {key.Name} = {key.Example}");

    private void AddBounds(TomlNode node, StudyFileKey key, string found)
    {
        var hint = key.Bounds == KeyBounds.BetweenZeroAndOne ? FractionHint(found) : $"correct {key.Name}";
        _faults.Add(node, found, $"{key.Name} {key.Bounds.InWords()}", hint);
    }

    private static string FractionHint(string found)
    {
        var number = found.Split(' ')[0];
        return double.TryParse(number, NumberStyles.Float, CultureInfo.InvariantCulture, out var value) && value is >= 1 and < 100 && !found.Contains('%')
            ? $"did you mean {number} %?"
            : "write it like 0.45 L/L or 45 %";
    }

    private void AddUnknown(TomlEntry entry, Items<string> nested)
    {
        var near = Spelling.Nearest(entry.Key, _keys.Select(key => key.Name).Concat(nested));
        var elsewhere = _all.FirstOrDefault(key => key.Name == entry.Key);
        _faults.Add(
            entry.Line,
            entry.Column,
            $"the unknown key \"{entry.Key}\"",
            $"a key of {(Section.Length == 0 ? "the top of the file" : Section)}",
            near is not null ? $"did you mean \"{near}\"?" : elsewhere is not null ? $"it belongs to {elsewhere.Section}" : "remove it");
    }
}
