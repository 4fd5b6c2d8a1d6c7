namespace HemoRheo;

/// <summary>A study analyzed and judged: what <c>study.Analyze</c> gives.</summary>
/// <param name="Analyzed">The samples before judgment, with all they rest on.</param>
/// <param name="Ranges">Reference ranges.</param>
/// <param name="Samples">Samples with their verdicts, by pseudonym.</param>
/// <param name="Findings">All findings of the study, in the order of the pipeline.</param>
public sealed record StudyResult(AnalyzedStudy Analyzed, Items<ReferenceRange> Ranges, Items<JudgedSample> Samples, Items<Finding> Findings)
{
    /// <summary>The study.</summary>
    public Study Study => Analyzed.Study;

    /// <summary>A sample by its pseudonym.</summary>
    /// <exception cref="KeyNotFoundException">There is no such sample; the message names the nearest ones.</exception>
    public JudgedSample this[string sample] =>
        Samples.FirstOrDefault(judged => judged.Sample == sample)
        ?? throw new KeyNotFoundException($"No sample \"{sample}\" in {Study.Name}. It has {Samples.Count} samples{(Samples.Count == 0 ? "" : $", from {Samples[0].Sample} to {Samples[^1].Sample}")}.");

    /// <inheritdoc/>
    public override string ToString() => $"{Study.Name}: {Samples.Count} samples, {Ranges.Count} reference ranges, {Findings.Count} findings";
}
