namespace HemoRheo;

/// <summary>From results to a cohort summary.</summary>
public static class StudySummarizing
{
    /// <summary>Takes a study's results to be summarized: <c>study.Summarize(results).By("group")</c>.</summary>
    /// <param name="study">The study.</param>
    /// <param name="results">Its results.</param>
    /// <exception cref="ArgumentException">The results are of another study.</exception>
    public static Cohort Summarize(this Study study, StudyResult results) => results.Study == study
        ? new(results)
        : throw new ArgumentException($"These results are of study \"{results.Study.Name}\" as its file was then, not of \"{study.Name}\" as opened now. Analyze this study first.", nameof(results));
}
