using HemoRheo.Notebooks;

namespace HemoRheo;

/// <summary>Charts of a study's results. The pointer on a mark shows its numbers and where they come from.</summary>
public static class ResultCharts
{
    /// <summary>Apparent viscosity of a sample's loadings against shear rate, with the law and the reported values at the sample's own hematocrit.</summary>
    /// <param name="sample">The sample.</param>
    /// <param name="law">Name of the law to draw; null: the one its verdicts rest on.</param>
    /// <exception cref="InvalidOperationException">The sample has no loading that could be read.</exception>
    public static InteractiveChart Chart(this JudgedSample sample, string? law = null)
    {
        var loadings = sample.Result.Loadings;
        if (loadings.Count == 0) throw new InvalidOperationException($"Sample {sample.Sample} has no loading that could be read, so there is no curve to draw. Its findings say why.");
        var drawn = law ?? DecidingLaw(sample);
        var reported = Values(sample, drawn).Where(value => value.Basis == HematocritBasis.Native && value.Decidable).ToArray();
        return Drawn.Of($"viscosity of sample {sample.Sample} with {drawn}", FlowCurveChart.Model(loadings, drawn, reported, null), FlowCurveChart.Height);
    }

    /// <summary>What the uncertainty of a sample's values is made of: up to three values that the verdicts rest on.</summary>
    /// <param name="sample">The sample.</param>
    /// <exception cref="InvalidOperationException">The sample has no value.</exception>
    public static InteractiveChart BudgetChart(this JudgedSample sample)
    {
        var values = Values(sample, DecidingLaw(sample)).Where(value => value.Measurand.Logarithmic && double.IsFinite(value.Value.X) && value.Value.Parts.Count > 0).ToArray();
        var judged = sample.Values.Where(value => value.Verdict is not null).Select(value => value.Value).ToArray();
        var drawn = values.Intersect(judged).Concat(values.Except(judged)).Take(Notebooks.BudgetChart.Most).ToArray();
        if (drawn.Length == 0) throw new InvalidOperationException($"Sample {sample.Sample} has no value with a budget. Its findings say why.");
        return Drawn.Of($"budget of sample {sample.Sample}", Notebooks.BudgetChart.Model(drawn), Notebooks.BudgetChart.Height(drawn));
    }

    /// <summary>A sample's values against their reference ranges, each with its 95 % interval.</summary>
    /// <param name="sample">The sample.</param>
    /// <exception cref="InvalidOperationException">None of its values has a reference range.</exception>
    public static InteractiveChart RangeChart(this JudgedSample sample)
    {
        var rows = sample.Values.Where(value => value.Range is not null && value.Value.Measurand is ViscosityAtRate && double.IsFinite(value.Value.Value.X))
            .Select(value => new StripRow($"{value.Value.Measurand.Symbol}, {Words.Short(value.Value.Basis)}", value.Range, [value], [])).ToArray();
        if (rows.Length == 0) throw new InvalidOperationException($"No value of sample {sample.Sample} has a reference range.");
        return Drawn.Of($"sample {sample.Sample} against its reference ranges", RangeStripChart.Model(rows, "viscosity, mPa·s", true), RangeStripChart.Height(rows.Length));
    }

    /// <summary>All samples against the reference range of the viscosity at one of the study's standard shear rates, at the standard hematocrit, group by group.</summary>
    /// <param name="result">The result of a study.</param>
    /// <param name="at">One of its standard shear rates.</param>
    /// <exception cref="ArgumentException">The study has no such standard shear rate, or no sample has a value there.</exception>
    public static InteractiveChart RangeChart(this StudyResult result, ShearRate at)
    {
        var edition = new Edition(result, null, RunRecord.Of(result, null), null);
        var rate = edition.Rates.FirstOrDefault(rate => rate.Rate == at)
            ?? throw new ArgumentException($"{at} is no standard shear rate of {result.Study.Name}; they are {string.Join(", ", result.Study.Analysis.StandardRates)}.", nameof(at));
        var range = result.Ranges.FirstOrDefault(range => range.Measurand == rate && range.Basis == edition.Basis && (range.Law is null || range.Law == edition.Law));
        var rows = RangeSection.Rows(edition, rate, range);
        if (rows.Length == 0) throw new ArgumentException($"No sample has a {rate.Name} at the standard hematocrit.", nameof(at));
        return Drawn.Of($"{rate.Name} against its reference range", RangeStripChart.Model(rows, $"{rate.Name}, {rate.Shown.Symbol}, at hematocrit {result.Study.Standard.Hematocrit}", false), RangeStripChart.Height(rows.Length));
    }

    /// <summary>Checks of an instrument over time: relative error with its 95 % interval, the limits, and the status the checks give.</summary>
    /// <param name="history">The instrument's history.</param>
    /// <exception cref="InvalidOperationException">It has no check.</exception>
    public static InteractiveChart Chart(this InstrumentHistory history) => history.Checks.Count == 0
        ? throw new InvalidOperationException($"Instrument {history.Instrument.Name} has no check, so there is nothing to draw.")
        : Drawn.Of($"checks of instrument {history.Instrument.Name}", CheckChart.Model(history, StatusSpans.Of(history)), CheckChart.Height);

    /// <summary>A control chart: the errors of the last 60 checks with their 95 % intervals, center and limits, signals by shape, and when the instrument changed.</summary>
    /// <param name="chart">The control chart.</param>
    /// <exception cref="InvalidOperationException">It has no check.</exception>
    public static InteractiveChart Chart(this ControlChart chart) => chart.Segments.All(segment => segment.Points.Count == 0)
        ? throw new InvalidOperationException($"The control chart of {chart.Instrument} has no check, so there is nothing to draw.")
        : Drawn.Of($"control chart of instrument {chart.Instrument}", ControlChartPicture.Model(chart, null), ControlChartPicture.Height);

    /// <summary>Ratios of two groups with their 95 % intervals, as they are and adjusted for hematocrit.</summary>
    /// <param name="summary">The summary of a cohort.</param>
    public static InteractiveChart Chart(this CohortSummary summary) => Drawn.Of($"{summary.Study} by {summary.By}: ratios of means", RatioChart.Model(summary), RatioChart.Height(summary));

    private static string DecidingLaw(JudgedSample sample) =>
        sample.Values.FirstOrDefault(value => value.Verdict is not null)?.Value.Law
        ?? sample.Values.FirstOrDefault(value => value.Value.Decidable)?.Value.Law
        ?? sample.Result.Loadings.SelectMany(loading => loading.Fits).FirstOrDefault()?.Law.Name
        ?? "";

    private static SampleValue[] Values(JudgedSample sample, string law) => [.. sample.Values.Select(value => value.Value).Where(value => value.Law == law)];
}
