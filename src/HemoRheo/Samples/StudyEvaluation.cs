namespace HemoRheo;

/// <summary>Analyzes the samples of a study.</summary>
public static class StudyEvaluation
{
    /// <summary>
    /// Screens and fits every loading, pools what only the whole study tells, and gives each sample its values with their whole budgets. Nothing is judged yet.
    /// </summary>
    /// <param name="study">The study.</param>
    /// <param name="readings">What was read for it.</param>
    /// <param name="progress">Told how far it has come.</param>
    /// <param name="cancel">Stops it between steps.</param>
    public static AnalyzedStudy Evaluate(this Study study, StudyReadings readings, IProgress<AnalysisProgress>? progress = null, CancellationToken cancel = default)
    {
        progress?.Report(new("checking instruments", 0, readings.Checks.Count));
        var histories = study.CheckInstruments(readings);
        var byInstrument = histories.ToDictionary(history => history.Instrument.Name);
        var records = readings.Samples.ToDictionary(record => record.Sample);
        var evidence = StudyEvidence.Of(study, StudyLoadings.Of(study, readings, records, byInstrument, progress, cancel));
        var samples = evidence.Loadings.GroupBy(loading => loading.Recording.Sample).OrderBy(sample => sample.Key, StringComparer.Ordinal).Select(sample => (Name: sample.Key, Loadings: sample.ToItems())).ToArray();

        var laws = study.Analysis.Laws.Select(FlowLaw.Named).ToArray();
        var sets = laws.SelectMany(law => MeasurandSet.Of(study, law).Select(measurands => new MeasurandSet(law, measurands, Scatter(study, law, measurands, samples.Select(sample => sample.Loadings))))).ToArray();

        var alone = samples.ToDictionary(sample => sample.Name, sample => sets.SelectMany(set => NativeValues.Of(study, sample.Name, sample.Loadings, set, evidence.Laws[set.Law.Name])).ToArray());
        var spreads = LawSpreads.Of(study, evidence.Comparison, alone.Values).ToItems();
        var native = alone.ToDictionary(sample => sample.Key, sample => LawSpreads.Added(spreads, sample.Value));
        cancel.ThrowIfCancellationRequested();
        var inOrder = samples.Where(sample => sample.Loadings.All(loading => loading.Standing.Status == InstrumentStatus.InOrder)).Select(sample => sample.Name).ToArray();
        var slopes = StudySlopes.Of(study, readings, inOrder, native).ToItems();

        var results = new List<SampleResult>();
        foreach (var (name, own) in samples)
        {
            cancel.ThrowIfCancellationRequested();
            results.Add(Result(study, name, own, records.GetValueOrDefault(name), native[name], slopes, byInstrument));
            progress?.Report(new("budgets", results.Count, samples.Length));
        }

        var pool = new StudyPool(
            sets.Select(set => set.Scatter).ToItems(), laws.Select(law => evidence.Laws[law.Name]).ToItems(), slopes, evidence.Correlation, evidence.Comparison, spreads,
            PoolFindings(study, sets, evidence, slopes).ToItems());
        return new(study, readings, histories, pool, results.ToItems());
    }

    private static SampleResult Result(Study study, string name, Items<LoadingResult> loadings, SampleRecord? record, SampleValue[] native, Items<HematocritSlope> slopes, IReadOnlyDictionary<string, InstrumentHistory> histories)
    {
        var plasma = record is null ? null : PlasmaValue.Of(study, record, loadings[0].Recording.StartedAt, histories);
        var values = native.Concat(StandardValues.Of(study, record, native, plasma, slopes)).ToItems();
        var where = new Where(Sample: name);
        var own = new List<Finding>();
        if (record is null) own.Add(SampleFindings.NoRecord.At(where, "The samples table has no such row."));
        if (record is { Hematocrit: null }) own.Add(SampleFindings.NoHematocrit.At(record.Where with { Sample = name }, "There is no usable hematocrit."));
        if (record is not null && plasma is null) own.Add(SampleFindings.NoPlasma.At(record.Where with { Sample = name }, "There is no usable plasma viscosity with its temperature."));
        if (values.All(value => value.Law != study.Analysis.DecideBy)) own.Add(SampleFindings.NoUsableFit.At(where, $"No loading has a usable fit of {study.Analysis.DecideBy}."));
        // What is wrong with a law or rule shown beside stays with its values; only the law and the rule that decide speak for the sample.
        var decided = values.Where(value => value.Law == study.Analysis.DecideBy && value.Findings.All(finding => finding.Kind != SampleFindings.ShownBeside)).SelectMany(value => value.Findings);
        var findings = own.Concat(loadings.SelectMany(loading => loading.Findings)).Concat(plasma?.Standing?.Findings ?? []).Concat(decided).Distinct().ToItems();
        return new(name, record, loadings, values, loadings.Max(loading => loading.Standing.Status), findings, plasma?.Standing?.Status);
    }

    private static LoadingScatter Scatter(Study study, FlowLaw law, Items<Measurand> measurands, IEnumerable<Items<LoadingResult>> samples)
    {
        var all = samples
            .Select(loadings => loadings.Where(loading => NativeValues.Sound(loading, FitOf(loading, law)))
                .Select(loading => FitValueSet.Of(FitOf(loading, law), measurands)?.ShiftedBy(LoadingValue.Shift(study, loading).X)).ToArray())
            .Where(sets => sets.Length > 1).ToArray();
        var replicates = all.Select(sets => sets.OfType<FitValueSet>().Where(set => set.Identified).ToArray()).ToArray();
        var left = all.Sum(sets => sets.Length) - replicates.Sum(sets => sets.Length);
        var scatter = LoadingPool.Pool(law.Name, measurands, [.. replicates.Where(sets => sets.Length > 1)], study.Errors.DeclaredLoading);
        return left == 0 ? scatter : scatter with { Findings = scatter.Findings.With([PoolingFindings.LoadingsNotIdentified.At(Where.Nowhere, $"{law.Name}, {measurands[0].Name}: {left} replicate loadings do not tell it and take no part in the scatter between loadings.", left)]) };
    }

    private static IEnumerable<Finding> PoolFindings(Study study, IEnumerable<MeasurandSet> sets, StudyEvidence evidence, IEnumerable<HematocritSlope> slopes)
    {
        foreach (var finding in CorrelationPool.Findings(evidence.Correlation)) yield return finding;
        foreach (var slope in slopes.Where(slope => slope.Law == study.Analysis.DecideBy && slope.WhyNot is not null)) yield return SampleFindings.NoSlope.At(Where.Nowhere, $"{slope.Measurand}, {slope.Law}: {slope.WhyNot}.");
        foreach (var finding in sets.SelectMany(set => set.Scatter.Findings)) yield return finding;
        var law = evidence.Laws[study.Analysis.DecideBy];
        if (law.Unfit is { } unfit) yield return unfit.At(Where.Nowhere, law.Words, law.PatternProbability);
        else if (law.Probability < 1e-3) yield return PoolingFindings.ScatterLargerThanDeclared.At(Where.Nowhere, law.Words, law.ChiSquare / law.DegreesOfFreedom, 1);
        foreach (var finding in PooledComparing.Findings(evidence.Comparison, study.Analysis.DecideBy)) yield return finding;
    }

    private static FittedLaw FitOf(LoadingResult loading, FlowLaw law) => loading.Fits.First(fit => fit.Law == law);
}
