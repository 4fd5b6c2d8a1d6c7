namespace HemoRheo;

/// <summary>The findings of one file as they are made. Past a hundred of one kind, one more says how many there were in all.</summary>
internal sealed class FileFindings(string file)
{
    private const int MostOfOneKind = 100;

    private readonly List<Finding> _findings = [];
    private readonly Dictionary<string, int> _counts = [];
    private readonly Dictionary<string, FindingKind> _kinds = [];

    public string File { get; } = file;

    /// <summary>Whether the file was refused: nothing is taken from it.</summary>
    public bool Refused { get; private set; }

    public void Add(Finding finding)
    {
        _kinds[finding.Code] = finding.Kind;
        _counts[finding.Code] = _counts.GetValueOrDefault(finding.Code) + 1;
        if (_counts[finding.Code] <= MostOfOneKind) _findings.Add(finding);
    }

    public void Add(FindingKind kind, int? line, int? column, string message) => Add(kind.At(new(File, Line: line, Column: column), message));

    /// <summary>A finding that refuses the whole file.</summary>
    public void Refuse(Finding finding)
    {
        Add(finding);
        Refused = true;
    }

    public void Refuse(FindingKind kind, int? line, int? column, string message) => Refuse(kind.At(new(File, Line: line, Column: column), message));

    public IEnumerable<Finding> All() => _findings.Concat(
        _counts.Where(pair => pair.Value > MostOfOneKind)
            .Select(pair => _kinds[pair.Key].At(new(File), $"{pair.Value} findings of this kind in the file; the first {MostOfOneKind} are listed.", pair.Value, MostOfOneKind)));
}
