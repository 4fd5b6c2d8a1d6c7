namespace HemoRheo;

/// <summary>Makes a <see cref="Study"/> of the text of a study file, or throws with every fault of it.</summary>
internal sealed partial class StudyFileReader(string folder, string fileName, string digest)
{
    private readonly StudyFileFaults _faults = new(fileName);

    public Study Read(string text)
    {
        var root = TomlTree.Read(text, _faults);
        _faults.ThrowIfAny();
        var top = new SectionReader(root!, "", _faults);
        var instruments = Each(root!, "[[instruments]]", Instrument);
        var geometries = Each(root!, "[[geometries]]", Geometry);
        var fluids = Each(root!, "[[fluids]]", Fluid);
        var counters = Each(root!, "[[counters]]", Counter);
        var files = Files(One(root!, "[files]"));
        var analysis = Analysis(One(root!, "[analysis]"));
        var groups = Each(root!, "[[groups]]", Group);
        var study = new Study(
            top.Text("name"),
            top.WholeNumber("seed"),
            folder,
            fileName,
            digest,
            files,
            Each(root!, "[[layouts]]", Layout),
            instruments,
            geometries,
            fluids,
            counters,
            Blood(One(root!, "[blood]")),
            Errors(One(root!, "[errors]")),
            Screening(One(root!, "[screening]")),
            analysis,
            Standard(One(root!, "[standard_hematocrit]")),
            Reference(One(root!, "[reference]"), analysis),
            groups);
        CheckTogether(root!, study);
        _faults.ThrowIfAny();
        return study;
    }

    private SectionReader One(TomlTable home, string section)
    {
        var name = section.Trim('[', ']').Split('.')[^1];
        var node = home.Find(name)?.Node;
        if (node is not null and not TomlTable) _faults.Add(node, node.InWords, $"one section {section}", $"write it as {section}");
        if (node is null && StudyFileKeys.Of(section).Any(key => key.Required)) _faults.Add(home, $"no section {section}", $"{section} with its keys", "add it; the template shows how");
        return node is TomlTable table ? new(table, section, _faults) : new(new(home.Line, home.Column), section, node is null && !StudyFileKeys.Of(section).Any(key => key.Required) ? _faults : new(fileName));
    }

    private Items<T> Each<T>(TomlTable home, string section, Func<SectionReader, T> read)
    {
        var name = section.Trim('[', ']').Split('.')[^1];
        var node = home.Find(name)?.Node;
        if (node is null) return [];
        if (node is TomlList { OfTables: true } list) return list.Items.Select(item => read(new((TomlTable)item, section, _faults))).ToItems();
        if (node is not TomlList { Items.Count: 0 }) _faults.Add(node, node.InWords, $"sections {section}", $"write each as {section}");
        return [];
    }
}
