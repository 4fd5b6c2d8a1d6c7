namespace HemoRheo;

/// <summary>Ranges and verdicts for a whole study.</summary>
public static class StudyJudging
{
    /// <summary>The whole analysis of what was read: screens, fits, pools and corrects every sample, makes reference ranges and judges every value.</summary>
    /// <param name="study">The study.</param>
    /// <param name="readings">What was read for it.</param>
    /// <param name="progress">Told how far the work has come; may be null.</param>
    /// <param name="cancel">Ends the work early.</param>
    /// <returns>The study with its ranges, verdicts and findings.</returns>
    /// <exception cref="OperationCanceledException">The work was ended early.</exception>
    public static StudyResult Analyze(this Study study, StudyReadings readings, IProgress<AnalysisProgress>? progress = null, CancellationToken cancel = default) =>
        study.Evaluate(readings, progress, cancel).Judge(progress, cancel);

    /// <summary>Makes reference ranges and judges every value of an analyzed study.</summary>
    /// <param name="analyzed">The study, analyzed.</param>
    /// <param name="progress">Told how far the work has come; may be null.</param>
    /// <param name="cancel">Ends the work early.</param>
    /// <exception cref="OperationCanceledException">The work was ended early.</exception>
    public static StudyResult Judge(this AnalyzedStudy analyzed, IProgress<AnalysisProgress>? progress = null, CancellationToken cancel = default)
    {
        var questions = Question.DecidedIn(analyzed);
        var answers = new List<RangeAnswer>();
        foreach (var question in questions)
        {
            cancel.ThrowIfCancellationRequested();
            progress?.Report(new("reference ranges", answers.Count, questions.Count));
            answers.Add(RangeMaking.Answer(analyzed, question));
        }

        progress?.Report(new("reference ranges", answers.Count, questions.Count));
        var byQuestion = answers.ToDictionary(answer => answer.Question);
        var samples = analyzed.Samples
            .Select(sample => new JudgedSample(sample, sample.Values.Select(value => Judged(analyzed.Study, sample, value, byQuestion)).ToItems()))
            .ToItems();
        return new(analyzed, answers.Select(answer => answer.Range).OfType<ReferenceRange>().ToItems(), samples, AllFindings(analyzed, answers));
    }

    private static JudgedValue Judged(Study study, SampleResult sample, SampleValue value, Dictionary<Question, RangeAnswer> answers)
    {
        var marked = sample.StatusOf(value) != InstrumentStatus.InOrder;
        if (!answers.TryGetValue(Question.Of(value), out var answer)) return new(value, null, null, WhyNotAsked(study, value), false, marked);
        return answer.Range is { } range
            ? value.JudgedBy(range, study.Analysis.Level, marked)
            : new(value, null, null, ValueJudging.WhyUndecidable(value) ?? answer.WhyNot, false, marked);
    }

    private static string WhyNotAsked(Study study, SampleValue value) =>
        value.Basis != HematocritBasis.Native && value.Basis != Question.DecidingStandard(study)
            ? $"The study decides on values at {Question.DecidingStandard(study).Words()}; this one stands beside it."
            : $"The study decides by {study.Analysis.DecideBy}; this value by {value.Law} stands beside it.";

    private static Items<Finding> AllFindings(AnalyzedStudy analyzed, List<RangeAnswer> answers) =>
        analyzed.Readings.Findings
            .Concat(analyzed.Histories.SelectMany(history => history.Findings.Concat(history.Checks.SelectMany(check => check.Findings))))
            .Concat(analyzed.Pool.Findings.Concat(analyzed.Pool.Scatter.SelectMany(scatter => scatter.Findings)))
            .Concat(analyzed.Samples.SelectMany(sample => sample.Findings))
            .Concat(answers.SelectMany(answer => answer.Findings))
            .Concat(RangeMaking.Contradicted(analyzed, answers))
            .Concat(RangeMaking.Unused(analyzed.Study, answers))
            .Distinct()
            .ToItems();
}
