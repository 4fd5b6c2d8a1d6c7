namespace HemoRheo;

/// <summary>The place a finding speaks of: in a file, or at a sample, loading and point. Parts that do not apply are null.</summary>
/// <param name="File">Path below the study's folder, with forward slashes.</param>
/// <param name="Sheet">Sheet of a workbook.</param>
/// <param name="Line">Line of the file, from 1.</param>
/// <param name="Column">Column of the line, from 1: the field's number in a table, the character's in other text.</param>
/// <param name="Sample">Pseudonym of the sample.</param>
/// <param name="Loading">Number of the loading (filling of the gap).</param>
/// <param name="Point">Number of the reading in its recording, from 1.</param>
public sealed record Where(string? File = null, string? Sheet = null, int? Line = null, int? Column = null, string? Sample = null, int? Loading = null, int? Point = null)
{
    /// <summary>No place in particular.</summary>
    public static Where Nowhere { get; } = new();

    /// <inheritdoc/>
    public override string ToString() => string.Join(", ", Words());

    private IEnumerable<string> Words()
    {
        if (File is not null) yield return Line is null ? File : Column is null ? $"{File}:{Line}" : $"{File}:{Line}:{Column}";
        if (Sheet is not null) yield return $"sheet {Sheet}";
        if (Sample is not null) yield return Loading is null ? $"sample {Sample}" : $"sample {Sample}, loading {Loading}";
        if (Point is not null) yield return $"point {Point}";
    }
}
