namespace HemoRheo;

/// <summary>The groups of a study side by side.</summary>
internal static class GroupComparison
{
    internal static CohortSummary Of(StudyResult results)
    {
        var study = results.Study;
        var findings = new List<Finding>();
        var measurands = new List<MeasurandSummary>();
        var ofSample = GroupOfSample(results, findings);
        if (results.Analyzed.Readings.People.Count == 0) findings.Add(CohortFindings.PeopleMissing.At(new(File: study.FileName), "The study has no people table that could be read."));
        if (study.Groups.Count < 2) findings.Add(CohortFindings.OneGroup.At(new(File: study.FileName), $"The study file declares {study.Groups.Count} groups.", study.Groups.Count, 2));
        if (study.Groups.Count >= 2)
        {
            if (!study.Groups.Any(group => group.Controls)) findings.Add(CohortFindings.NoControlGroup.At(new(File: study.FileName), $"No group is marked as the controls; \"{study.Groups[0].Label}\" stands in their place."));
            var first = study.Groups.FirstOrDefault(group => group.Controls) ?? study.Groups[0];
            foreach (var second in study.Groups.Where(group => group.Code != first.Code))
            {
                measurands.AddRange(Question.DecidedIn(results.Analyzed).Select(question => Compare(results.Analyzed, question, first, second, findings)));
            }
        }

        return new(study.Name, "group", measurands.ToItems(), OutcomeCounting.Of(results, ofSample), CohortCautions.For(measurands), findings.ToItems());
    }

    private static MeasurandSummary Compare(AnalyzedStudy analyzed, Question question, Group first, Group second, List<Finding> findings)
    {
        var a = GroupValues.Of(analyzed, question, person => person.GroupCode == first.Code);
        var b = GroupValues.Of(analyzed, question, person => person.GroupCode == second.Code);
        var (firstSummary, secondSummary) = (GroupMaking.Of(first, question, a), GroupMaking.Of(second, question, b));
        findings.AddRange(new[] { firstSummary, secondSummary }
            .Where(group => group.Mean is null && (group.Used > 0 || !question.IsContradicted(analyzed)))
            .Select(group => CohortFindings.GroupTooSmall.At(Where.Nowhere, $"{question.Measurand.Name}, {question.Basis.Words()}: {group.WhyNoMean}", group.Used, 2)));
        var total = GroupDifferences.Total(firstSummary, secondSummary);
        GroupDifference? adjusted = null;
        if (question.Basis == HematocritBasis.Native)
        {
            (adjusted, var more) = HematocritAdjustment.Of(analyzed.Study, question, (first, a), (second, b));
            findings.AddRange(more);
        }

        return new(question.Measurand, question.Law, question.Basis, firstSummary, secondSummary, total, adjusted);
    }

    private static Dictionary<string, Group> GroupOfSample(StudyResult results, List<Finding> findings)
    {
        var people = results.Analyzed.Readings.People.DistinctBy(person => person.Id).ToDictionary(person => person.Id, person => person.GroupCode);
        var groups = results.Study.Groups.DistinctBy(group => group.Code).ToDictionary(group => group.Code);
        var found = new Dictionary<string, Group>();
        foreach (var sample in results.Samples)
        {
            if (sample.Result.Record is { } record && people.TryGetValue(record.Person, out var code) && groups.TryGetValue(code, out var group))
            {
                found[sample.Sample] = group;
            }
            else
            {
                findings.Add(CohortFindings.SampleWithoutGroup.At(new(Sample: sample.Sample), "The sample is in no group and is counted nowhere."));
            }
        }

        return found;
    }
}
