namespace HemoRheo.App;

/// <summary>What a run is asked to do.</summary>
/// <param name="StudyFile">Full path of the study file.</param>
/// <param name="Output">Full path of the results folder; null: <c>results</c> beside the study file.</param>
/// <param name="Strict">Whether the exit code tells that something needs a person.</param>
internal sealed record RunRequest(string StudyFile, string? Output, bool Strict)
{
    /// <summary>The folder the study file stands in.</summary>
    public string StudyFolder => Path.GetDirectoryName(StudyFile)!;

    /// <summary>Full path of the results folder.</summary>
    public string ResultsFolder => Output ?? Path.Combine(StudyFolder, "results");
}
