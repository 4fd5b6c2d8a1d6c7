namespace HemoRheo;

/// <summary>All that was read for a study: recordings of blood, of checks and of blank runs, the samples table, and what was understood of each file.</summary>
/// <param name="Study">The study.</param>
/// <param name="Files">Every file, in path order.</param>
/// <param name="Blood">Recordings of blood, by sample, then loading.</param>
/// <param name="Checks">Recordings of checks, by time.</param>
/// <param name="Samples">Rows of the samples table that can be used, by sample.</param>
/// <param name="People">Rows of the people table, by person.</param>
/// <param name="Findings">Findings about files and tables as a whole, those of each file included.</param>
public sealed record StudyReadings(
    Study Study,
    Items<ExportFile> Files,
    Items<Recording> Blood,
    Items<Recording> Checks,
    Items<SampleRecord> Samples,
    Items<Person> People,
    Items<Finding> Findings)
{
    /// <summary>Recordings of blank runs, by time.</summary>
    public Items<Recording> Blanks { get; init; } = Items<Recording>.None;

    /// <inheritdoc/>
    public override string ToString() => $"{Files.Count} files, {Blood.Count} loadings of {Samples.Count} samples, {Checks.Count} checks,{(Blanks.Count == 0 ? "" : $" {Blanks.Count} blank runs,")} {Findings.Count} findings";
}
