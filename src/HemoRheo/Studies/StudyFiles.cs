namespace HemoRheo;

/// <summary>Where a study's data lie, as paths below the study's folder.</summary>
/// <param name="Exports">Files or folders with the exports of blood.</param>
/// <param name="Checks">Files or folders with the exports of instrument checks; empty where there are none.</param>
/// <param name="Samples">The samples table (CSV).</param>
/// <param name="People">The people table (CSV) with person and group code; null where the study compares no groups.</param>
/// <param name="CheckTable">A table (CSV) that says of each check export what the export does not (fluid, instrument, time); null where exports say it all.</param>
public sealed record StudyFiles(Items<string> Exports, Items<string> Checks, string Samples, string? People, string? CheckTable)
{
    /// <summary>Files or folders with the exports of blank runs; empty where there are none.</summary>
    public Items<string> Blanks { get; init; } = Items<string>.None;

    /// <summary>Columns of the tables that look like direct identifiers and may stand there all the same. They are never read.</summary>
    public Items<string> AllowedColumns { get; init; } = Items<string>.None;
}
