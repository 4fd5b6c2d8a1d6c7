namespace HemoRheo.Notebooks;

/// <summary>A table of a study as a file.</summary>
/// <param name="File">Name of the file.</param>
/// <param name="About">What a row of it is, in one sentence.</param>
/// <param name="Table">The table.</param>
internal sealed record StudyTable(string File, string About, Table Table)
{
    /// <summary>A number, or nothing where it is none.</summary>
    public static Cell Number(double? number) => number is { } known && !double.IsNaN(known) ? known : Cell.Empty;
}
