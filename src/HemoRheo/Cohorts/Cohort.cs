namespace HemoRheo;

/// <summary>A study's results, ready to be summarized. Made by <c>study.Summarize(results)</c>.</summary>
/// <param name="Results">The results.</param>
public sealed record Cohort(StudyResult Results)
{
    private const string ByGroup = "group";

    /// <summary>The summary by what people differ in.</summary>
    /// <param name="what">So far only <c>group</c>: the groups of the study file, each beside the control group.</param>
    /// <exception cref="ArgumentException">The word is not one that a cohort can be summarized by.</exception>
    public CohortSummary By(string what) => what == ByGroup
        ? GroupComparison.Of(Results)
        : throw new ArgumentException($"A cohort cannot be summarized by \"{what}\". It can be summarized by \"{ByGroup}\", the groups of the study file.", nameof(what));

    /// <inheritdoc/>
    public override string ToString() => $"cohort of {Results.Study.Name}: {Results.Samples.Count} samples";
}
