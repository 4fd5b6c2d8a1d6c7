namespace HemoRheo;

/// <summary>What all fits of a study say together: how readings are correlated, which laws fit, and which of them the curves can part.</summary>
/// <param name="Loadings">The loadings, with fits that know the correlation.</param>
/// <param name="Correlation">Correlation of the readings within a ramp.</param>
/// <param name="Comparison">The laws compared.</param>
/// <param name="Laws">Evidence for each law, by its name.</param>
internal sealed record StudyEvidence(Items<LoadingResult> Loadings, PointCorrelation Correlation, PooledComparison Comparison, IReadOnlyDictionary<string, LawEvidence> Laws)
{
    /// <summary>The evidence of the loadings of a study.</summary>
    /// <param name="study">The study.</param>
    /// <param name="independent">Its loadings, with fits that take readings as independent.</param>
    public static StudyEvidence Of(Study study, LoadingResult[] independent)
    {
        var laws = study.Analysis.Laws.Select(FlowLaw.Named).OrderBy(law => law.Name == study.Analysis.DecideBy ? 0 : 1).ToArray();
        var correlation = CorrelationPool.Of(CorrelationPool.Asked([.. laws.Select(law => (law, Sound(independent, law).OfType<FittedLaw>().ToArray()))]), study.Errors.PointCorrelation);
        var loadings = StudyLoadings.Knowing(study, correlation, independent);
        var fits = laws.Select(law => (Law: law, Fits: Sound(loadings, law))).ToArray();
        var residuals = fits.ToDictionary(law => law.Law.Name, law => LawJudgment.Judge(law.Law, [.. law.Fits.OfType<FittedLaw>()]));
        var comparison = PooledComparing.Of(fits, residuals);
        return new(loadings.ToItems(), correlation, comparison, residuals.ToDictionary(law => law.Key, law => PooledComparing.Judged(law.Value, comparison)));
    }

    private static FittedLaw?[] Sound(LoadingResult[] loadings, FlowLaw law) => [.. loadings.Select(loading => loading.Fits.First(fit => fit.Law == law) is var fit && NativeValues.Sound(loading, fit) ? fit : null)];
}
