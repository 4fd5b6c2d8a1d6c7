namespace HemoRheo;

/// <summary>Every reported number of a cohort summary by name.</summary>
internal static class CohortResults
{
    internal static IEnumerable<NamedText> Of(CohortSummary summary) =>
        summary.Measurands.SelectMany(OfMeasurand)
            .Concat(summary.Outcomes.SelectMany(OfOutcomes))
            .Concat(RunResults.Counts("cohort/findings", summary.Findings));

    private static IEnumerable<NamedText> OfMeasurand(MeasurandSummary measurand)
    {
        var name = $"cohort/{measurand.Law}/{measurand.Measurand.Name}/{measurand.Basis.Words()}";
        var pair = $"{name}/{measurand.Second.Label} beside {measurand.First.Label}";
        return OfGroup($"{pair}/{measurand.First.Label}", measurand.First)
            .Concat(OfGroup($"{pair}/{measurand.Second.Label}", measurand.Second))
            .Concat(OfDifference(pair, measurand.Total))
            .Concat(measurand.Adjusted is null ? [] : OfDifference(pair, measurand.Adjusted));
    }

    private static IEnumerable<NamedText> OfGroup(string name, GroupSummary group)
    {
        yield return RunResults.Number($"{name}/samples", group.Samples);
        yield return RunResults.Number($"{name}/people", group.People);
        yield return RunResults.Number($"{name}/used", group.Used);
        yield return RunResults.Number($"{name}/samples used", group.SamplesUsed);
        yield return RunResults.Number($"{name}/marked", group.Marked);
        foreach (var reason in group.SetAside) yield return RunResults.Number($"{name}/set aside/{reason.Code}", reason.Count);
        if (group.Mean is not null)
        {
            foreach (var result in RunResults.OfValue($"{name}/mean", group.Mean)) yield return result;
        }

        if (group.StandardDeviation is { } deviation) yield return RunResults.Number($"{name}/standard deviation", deviation);
    }

    private static IEnumerable<NamedText> OfDifference(string name, GroupDifference difference)
    {
        if (difference.WhyNot is not null) yield return new($"{name}/{difference.Question}/why not", difference.WhyNot);
        if (difference.Difference is not null)
        {
            foreach (var result in RunResults.OfValue($"{name}/{difference.Question}", difference.Difference)) yield return result;
        }

        if (difference.Probability is { } p) yield return RunResults.Number($"{name}/{difference.Question}/p", p);
    }

    private static IEnumerable<NamedText> OfOutcomes(OutcomeCount count)
    {
        var name = $"outcomes/{count.Label}/{count.Measurand.Name}/{count.Basis.Words()}";
        yield return RunResults.Number($"{name}/below", count.Below);
        yield return RunResults.Number($"{name}/within", count.Within);
        yield return RunResults.Number($"{name}/above", count.Above);
        yield return RunResults.Number($"{name}/undecided", count.Undecided);
        yield return RunResults.Number($"{name}/not judged", count.NotJudged);
        yield return RunResults.Number($"{name}/marked", count.Marked);
    }
}
