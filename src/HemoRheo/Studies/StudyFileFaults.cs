namespace HemoRheo;

/// <summary>The faults of one study file as they are found.</summary>
internal sealed class StudyFileFaults(string file)
{
    private readonly List<StudyFileFault> _faults = [];

    public bool Any => _faults.Count > 0;

    public void Add(int line, int column, string found, string expected, string whatToDo) => _faults.Add(new(file, line, column, found, expected, whatToDo));

    public void Add(TomlNode node, string found, string expected, string whatToDo) => Add(node.Line, node.Column, found, expected, whatToDo);

    public void ThrowIfAny()
    {
        if (Any) throw new StudyFileException(_faults.OrderBy(fault => fault.Line).ThenBy(fault => fault.Column).ToItems());
    }
}
