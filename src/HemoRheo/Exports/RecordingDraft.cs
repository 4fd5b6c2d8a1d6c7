namespace HemoRheo;

/// <summary>A recording as its file gives it, before tables are joined. Null where the file says nothing.</summary>
internal sealed class RecordingDraft(RecordingKind kind, string sample, int loading, Where where)
{
    private readonly List<Finding> _findings = [];

    public RecordingKind Kind { get; } = kind;

    public string Sample { get; } = sample;

    public int Loading { get; } = loading;

    public Where Where { get; } = where;

    public string? Person { get; init; }

    public int? Visit { get; init; }

    public string? Instrument { get; init; }

    public string? Geometry { get; init; }

    public string? Fluid { get; init; }

    public DateTimeOffset? StartedAt { get; init; }

    /// <summary>Whether a fault of the file keeps it from being used at all.</summary>
    public bool SetAside { get; private set; }

    /// <summary>Rows read, those kept out included.</summary>
    public int Rows { get; set; }

    public List<Reading> Readings { get; } = [];

    public IReadOnlyList<Finding> Findings => _findings;

    public Finding Mark(FindingKind kind, int? line, int? column, string message, int? point = null)
    {
        var finding = kind.At(Where with { Line = line ?? Where.Line, Column = column, Point = point }, message);
        _findings.Add(finding);
        return finding;
    }

    public void Mark(Finding finding) => _findings.Add(finding);

    public void PutAside() => SetAside = true;
}
