namespace HemoRheo;

/// <summary>A list of values or of tables.</summary>
internal sealed record TomlList(List<TomlNode> Items, bool OfTables, int Line, int Column) : TomlNode(Line, Column)
{
    public override string InWords => OfTables ? "a list of tables" : "a list";
}
