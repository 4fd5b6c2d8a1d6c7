using System.Globalization;

namespace HemoRheo;

/// <summary>Every reported number of a run by name. Numbers are written so that reading them back gives the same bits.</summary>
internal static class RunResults
{
    internal static IEnumerable<NamedText> Of(StudyResult results, CohortSummary? summary)
    {
        var seen = new Dictionary<string, int>();
        foreach (var result in All(results, summary))
        {
            var again = seen[result.Name] = seen.GetValueOrDefault(result.Name) + 1;
            yield return again == 1 ? result : new($"{result.Name} ({again})", result.Text);
        }
    }

    private static IEnumerable<NamedText> All(StudyResult results, CohortSummary? summary) =>
        results.Samples.SelectMany(OfSample)
            .Concat(results.Analyzed.Histories.SelectMany(OfHistory))
            .Concat(OfPool(results.Analyzed.Pool))
            .Concat(results.Ranges.SelectMany(OfRange))
            .Concat(summary is null ? [] : CohortResults.Of(summary))
            .Concat(Counts("findings", results.Findings));

    internal static NamedText Number(string name, double number) => new(name, number.ToString("R", CultureInfo.InvariantCulture));

    internal static NamedText Number(string name, int number) => new(name, number.ToString(CultureInfo.InvariantCulture));

    internal static IEnumerable<NamedText> OfValue(string name, Value value) =>
        [Number($"{name}/value", value.X), Number($"{name}/u", value.StandardUncertainty), Number($"{name}/degrees of freedom", value.DegreesOfFreedom), .. Parts(name, value)];

    internal static IEnumerable<NamedText> Counts(string name, IEnumerable<Finding> findings) =>
        findings.GroupBy(finding => finding.Code).OrderBy(same => same.Key, StringComparer.Ordinal).Select(same => Number($"{name}/{same.Key}", same.Count()));

    private static IEnumerable<NamedText> Parts(string name, Value value) =>
        value.Parts.Select(part => part.Source.Kind).Distinct().Order().Select(kind => Number($"{name}/{kind.Words()}", value.Part(kind)!.Value));

    private static IEnumerable<NamedText> OfSample(JudgedSample sample)
    {
        yield return new($"{sample.Sample}/instrument", sample.Result.Status.Words());
        foreach (var fit in sample.Result.Loadings.SelectMany(loading => loading.Fits.Select(fit => (Name: $"{sample.Sample}/loading {loading.Recording.Loading}/{fit.Law.Name}", Fit: fit))))
        {
            yield return Number($"{fit.Name}/chi-square", fit.Fit.Fit.ChiSquare);
            foreach (var parameter in fit.Fit.Parameters)
            {
                yield return Number($"{fit.Name}/{parameter.Parameter.Name}", parameter.Estimate);
                if (parameter.StandardError is { } error) yield return Number($"{fit.Name}/{parameter.Parameter.Name}/standard error", error);
            }
        }

        foreach (var result in sample.Values.SelectMany(value => OfJudged(sample.Sample, value))) yield return result;
        foreach (var result in Counts($"{sample.Sample}/findings", sample.Result.Findings)) yield return result;
    }

    private static IEnumerable<NamedText> OfJudged(string sample, JudgedValue judged)
    {
        var name = $"{sample}/{judged.Value.Law}/{judged.Value.Measurand.Name}/{judged.Value.Basis.Words()}";
        foreach (var result in OfValue(name, judged.Value.Value)) yield return result;
        if (judged.Value.Interpolated is { } interpolated) yield return Number($"{name}/interpolated", interpolated);
        if (judged.Verdict is not { } verdict) yield break;
        yield return new($"{name}/verdict", judged.Marked ? $"{verdict.Outcome.Words()}, marked" : verdict.Outcome.Words());
        yield return Number($"{name}/below", verdict.Below);
        yield return Number($"{name}/within", verdict.Within);
        yield return Number($"{name}/above", verdict.Above);
        yield return new($"{name}/changes with limits", judged.ChangesWithLimits ? "yes" : "no");
    }

    private static IEnumerable<NamedText> OfHistory(InstrumentHistory history) =>
        history.Checks.SelectMany(check => OfValue($"instrument {history.Instrument.Name}/{check.Name}/error", check.Error)
                .Append(new($"instrument {history.Instrument.Name}/{check.Name}/outcome", check.Outcome.Words())))
            .Concat(history.Periods.SelectMany(period => OfValue($"instrument {period.Key}/correction", period.Correction)));

    private static IEnumerable<NamedText> OfPool(StudyPool pool)
    {
        foreach (var scatter in pool.Scatter)
        {
            var name = $"loading scatter/{scatter.Law}/{string.Join(", ", scatter.Measurands.Select(measurand => measurand.Name))}";
            yield return Number($"{name}/degrees of freedom", scatter.DegreesOfFreedom);
            foreach (var (column, k) in scatter.Columns.Select((column, k) => (column, k)))
            {
                yield return Number($"{name}/column {k}/degrees of freedom", column.DegreesOfFreedom);
                foreach (var (amount, i) in column.Amounts.Select((amount, i) => (amount, i))) yield return Number($"{name}/column {k}/{i}", amount);
            }
        }

        yield return Number("correlation of readings/used", pool.Correlation.Value);
        if (pool.Correlation.Estimate is { } estimate) yield return Number("correlation of readings/estimate", estimate);
        foreach (var law in pool.Laws)
        {
            yield return Number($"evidence/{law.Law}/chi-square", law.ChiSquare);
            yield return Number($"evidence/{law.Law}/probability", law.Probability);
            yield return Number($"evidence/{law.Law}/pattern probability", law.PatternProbability);
            yield return new($"evidence/{law.Law}/fits", law.Fits ? "yes" : "no");
        }

        foreach (var law in pool.Comparison.Laws)
        {
            yield return new($"comparison/{law.Law}/standing", law.Standing.Words());
            if (law.Difference is { } difference) yield return Number($"comparison/{law.Law}/difference", difference);
        }

        foreach (var spread in pool.Spreads) yield return Number($"spread of laws/{spread.Law}/{spread.Measurand.Name}", spread.Amount);
        foreach (var slope in pool.Slopes)
        {
            yield return Number($"slope/{slope.Law}/{slope.Measurand.Name}/value", slope.Slope);
            yield return Number($"slope/{slope.Law}/{slope.Measurand.Name}/u", slope.StandardUncertainty);
            yield return Number($"slope/{slope.Law}/{slope.Measurand.Name}/plain", slope.Plain);
        }
    }

    private static IEnumerable<NamedText> OfRange(ReferenceRange range)
    {
        var name = $"range/{range.Law ?? "declared"}/{range.Measurand.Name}/{range.Basis.Words()}";
        yield return Number($"{name}/lower", range.Limits.Lower);
        yield return Number($"{name}/upper", range.Limits.Upper);
        foreach (var (end, interval) in new[] { ("lower limit", range.LowerLimit), ("upper limit", range.UpperLimit) })
        {
            if (interval is not { } known) continue;
            yield return Number($"{name}/{end} from", known.Lower);
            yield return Number($"{name}/{end} to", known.Upper);
        }

        yield return Number($"{name}/used", range.Used);
        foreach (var reason in range.Missing) yield return Number($"{name}/missing/{reason.Code}", reason.Count);
    }
}
