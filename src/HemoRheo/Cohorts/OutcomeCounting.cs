namespace HemoRheo;

/// <summary>Counts of verdicts by group.</summary>
internal static class OutcomeCounting
{
    internal static Items<OutcomeCount> Of(StudyResult results, IReadOnlyDictionary<string, Group> groupOfSample) =>
        results.Study.Groups
            .SelectMany(group => Question.DecidedIn(results.Analyzed).Select(question => Count(results, groupOfSample, group, question)))
            .ToItems();

    private static OutcomeCount Count(StudyResult results, IReadOnlyDictionary<string, Group> groupOfSample, Group group, Question question)
    {
        var values = results.Samples
            .Where(sample => groupOfSample.TryGetValue(sample.Sample, out var own) && own.Code == group.Code)
            .Select(sample => sample.Values.FirstOrDefault(value => Question.Of(value.Value) == question))
            .ToArray();
        var judged = values.Where(value => value?.Verdict is not null).ToArray();
        int Of(Outcome outcome) => judged.Count(value => !value!.Marked && value.Verdict!.Outcome == outcome);
        return new(
            group.Label, question.Measurand, question.Basis,
            Of(Outcome.Below), Of(Outcome.Within), Of(Outcome.Above), Of(Outcome.Undecided),
            values.Length - judged.Length, judged.Count(value => value!.Marked));
    }
}
