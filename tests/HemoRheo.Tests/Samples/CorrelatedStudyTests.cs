namespace HemoRheo.Tests.Samples;

/// <summary>A study that declares how its readings are correlated.</summary>
public sealed class CorrelatedStudyTests
{
    private static readonly Recording[] Blood = [InventedBlood.Casson("S-1", 1, 0.41), InventedBlood.Casson("S-1", 2, 0.41, 1.01), InventedBlood.Casson("S-2", 1, 0.44), InventedBlood.Casson("S-2", 2, 0.44, 0.99)];

    [Fact]
    public void A_declared_correlation_reaches_every_fit_and_its_part_of_the_budget()
    {
        var (plain, correlated) = (Evaluated(null), Evaluated(0.6));
        Assert.Equal(0, plain.Pool.Correlation.Value);
        Assert.Equal(0.6, correlated.Pool.Correlation.Value);
        Assert.All(correlated.Samples.SelectMany(sample => sample.Loadings).SelectMany(loading => loading.Fits), fit => Assert.Equal(0.6, fit.Correlation));
        Assert.InRange(FitPart(correlated) / FitPart(plain), 1.2, 2.5);
        Assert.Contains("as the study file declares", correlated.Pool.Correlation.Words, StringComparison.Ordinal);
    }

    private static double FitPart(AnalyzedStudy analyzed) => analyzed.Samples[0].Find("Casson", Measurand.Viscosity(10.PerSecond()), HematocritBasis.Native)!.Value.Part(SourceKind.Fit)!.Value;

    private static AnalyzedStudy Evaluated(double? correlation)
    {
        var study = TestStudy.Plain with { Errors = TestStudy.Plain.Errors with { PointCorrelation = correlation } };
        return study.Evaluate(TestStudy.Readings(study, InventedBlood.Checks(), Blood, [InventedBlood.Record("S-1", 0.41), InventedBlood.Record("S-2", 0.44)]), null, TestContext.Current.CancellationToken);
    }
}
