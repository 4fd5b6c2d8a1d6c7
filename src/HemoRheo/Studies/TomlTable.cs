namespace HemoRheo;

/// <summary>A table of the study file: its keys in file order.</summary>
internal sealed record TomlTable(int Line, int Column) : TomlNode(Line, Column)
{
    private readonly List<TomlEntry> _entries = [];

    public IReadOnlyList<TomlEntry> Entries => _entries;

    public override string InWords => "a table";

    public TomlEntry? Find(string key) => _entries.Find(entry => entry.Key == key);

    public void Add(TomlEntry entry) => _entries.Add(entry);
}
