namespace HemoRheo;

/// <summary>The faults of one study file, and of the certificate files it names, as they are found.</summary>
internal sealed class StudyFileFaults(string file)
{
    private readonly List<StudyFileFault> _faults = [];

    private StudyFileFaults(string file, List<StudyFileFault> shared)
        : this(file) => _faults = shared;

    public bool Any => _faults.Count > 0;

    public int Count => _faults.Count;

    /// <summary>The same list for another file.</summary>
    public StudyFileFaults Of(string other) => new(other, _faults);

    public void Add(int line, int column, string found, string expected, string whatToDo) => _faults.Add(new(file, line, column, found, expected, whatToDo));

    public void Add(TomlNode node, string found, string expected, string whatToDo) => Add(node.Line, node.Column, found, expected, whatToDo);

    public void ThrowIfAny()
    {
        if (Any) throw new StudyFileException(_faults.OrderBy(fault => fault.File == file ? "" : fault.File, StringComparer.Ordinal).ThenBy(fault => fault.Line).ThenBy(fault => fault.Column).ToItems());
    }
}
