namespace HemoRheo;

/// <summary>One filling of the gap as exported: its readings and what file and samples table say of it.</summary>
/// <param name="Kind">Blood, check or blank run.</param>
/// <param name="Sample">Pseudonym of the sample, or name of the check or blank run.</param>
/// <param name="Loading">Number of the loading, from 1.</param>
/// <param name="Instrument">Name of the instrument.</param>
/// <param name="Geometry">Name of the geometry; null where rate and stress are exported and none is named.</param>
/// <param name="Fluid">Name of the calibration fluid; null for blood and blank runs.</param>
/// <param name="StartedAt">Date and time with offset; its date there is the day of the recording.</param>
/// <param name="Readings">Readings in file order.</param>
/// <param name="Where">Where it begins.</param>
public sealed record Recording(
    RecordingKind Kind,
    string Sample,
    int Loading,
    string Instrument,
    string? Geometry,
    string? Fluid,
    DateTimeOffset StartedAt,
    Items<Reading> Readings,
    Where Where)
{
    /// <summary>What is wrong with it or with single readings of it. A fault that names a point concerns that reading alone.</summary>
    public Items<Finding> Findings { get; init; } = Items<Finding>.None;

    /// <summary>Whether a fault concerns the recording as a whole: its readings stay, and nothing of it is decided on until a person has acted.</summary>
    public bool HasFault => Findings.Any(finding => finding.Severity == Severity.Fault && finding.Where.Point is null);

    /// <summary>The local date of the recording.</summary>
    public DateOnly Day => DateOnly.FromDateTime(StartedAt.DateTime);
}
