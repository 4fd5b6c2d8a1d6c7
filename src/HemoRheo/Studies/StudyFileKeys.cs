namespace HemoRheo;

/// <summary>Every key that a study file may have. The strict reader knows these and no others.</summary>
public static partial class StudyFileKeys
{
    /// <summary>The keys, in the order the template writes them.</summary>
    public static Items<StudyFileKey> All { get; } = [.. Top, .. Files, .. Layouts, .. Fields, .. Apparatus, .. Assumptions, .. Decisions];

    /// <summary>The keys of one section.</summary>
    internal static Items<StudyFileKey> Of(string section) => All.Where(key => key.Section == section).ToItems();

    /// <summary>Names of the sections that stand directly in a section.</summary>
    internal static Items<string> SectionsIn(string section, Items<StudyFileKey> all)
    {
        var home = section.Length == 0 ? "" : Bare(section) + ".";
        return all.Select(key => Bare(key.Section)).Where(path => path.Length > home.Length && path.StartsWith(home, StringComparison.Ordinal))
            .Select(path => path[home.Length..].Split('.')[0]).Distinct().ToItems();
    }

    private static string Bare(string section) => section.Trim('[', ']');

    private static StudyFileKey Text(string section, string name, string meaning, string example) => new(section, name, StudyFileKeyKind.Text, meaning, Quoted(example));

    private static StudyFileKey Texts(string section, string name, string meaning, params string[] examples) => new(section, name, StudyFileKeyKind.Texts, meaning, Listed(examples));

    private static StudyFileKey Word(string section, string name, string meaning, params string[] allowed) => new(section, name, StudyFileKeyKind.Word, meaning, Quoted(allowed[0])) { Allowed = [.. allowed] };

    private static StudyFileKey Truth(string section, string name, string meaning, string example) => new(section, name, StudyFileKeyKind.Truth, meaning, example);

    private static StudyFileKey Number(string section, string name, KeyBounds bounds, string meaning, string example) => new(section, name, StudyFileKeyKind.Number, meaning, example) { Bounds = bounds };

    private static StudyFileKey Amount(string section, string name, Quantity quantity, KeyBounds bounds, string meaning, string example) =>
        new(section, name, StudyFileKeyKind.Quantity, meaning, Quoted(example)) { Quantity = quantity, Bounds = bounds };

    private static StudyFileKey Optional(StudyFileKey key) => key with { Required = false };

    private static StudyFileKey Default(string value, StudyFileKey key) => key with { Required = false, Default = value };

    private static string Quoted(string text) => $"\"{text}\"";

    private static string Listed(IEnumerable<string> texts) => $"[{string.Join(", ", texts.Select(Quoted))}]";
}
