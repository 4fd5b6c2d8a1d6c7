using HemoRheo.Benchmarks;

namespace HemoRheo.Tests.Samples;

/// <summary>A study of two noisy curves of Quemada blood that cannot tell Casson from Quemada, and the same with little noise, which can.</summary>
public sealed class LawSpreadTests
{
    private static readonly Measurand At10 = Measurand.Viscosity(10.PerSecond());

    [Fact]
    public void Laws_that_are_not_parted_put_half_their_range_over_the_root_of_three_into_every_value_of_either()
    {
        var analyzed = Evaluated(NotParted);
        Assert.Equal(["Casson", "Quemada"], analyzed.Pool.Comparison.NotParted);
        Assert.Contains(analyzed.Pool.Findings, finding => finding.Code == "laws-not-parted");

        double Mean(string law) => analyzed.Samples.Average(sample => Find(sample, law, HematocritBasis.Native).X);
        var half = (Mean("Quemada") - Mean("Casson")) / 2 / Math.Sqrt(3);
        Assert.NotEqual(0, half);
        foreach (var sample in analyzed.Samples)
        {
            Assert.Equal(half, Find(sample, "Casson", HematocritBasis.Native).Part(SourceKind.Law)!.Value, 1e-12);
            Assert.Equal(-half, Find(sample, "Quemada", HematocritBasis.Native).Part(SourceKind.Law)!.Value, 1e-12);
            Assert.Equal(half * 0.45 / sample.Record!.Hematocrit!.Value.LiterPerLiter, Find(sample, "Casson", HematocritBasis.StandardByPlasma).Part(SourceKind.Law)!.Value, 1e-12);
            Assert.Null(sample.Find("Casson", Measurand.CassonViscosity, HematocritBasis.Native)!.Value.Part(SourceKind.Law));
        }
    }

    [Fact]
    public void It_is_one_source_so_it_cancels_in_a_difference_and_stays_in_a_mean()
    {
        var samples = Evaluated(NotParted).Samples;
        var (first, last) = (Find(samples[0], "Casson", HematocritBasis.Native), Find(samples[^1], "Casson", HematocritBasis.Native));
        Assert.Equal(0, (first - last).Part(SourceKind.Law)!.Value, 1e-15);
        Assert.Equal(first.Part(SourceKind.Law)!.Value, Value.Mean([first, last]).Part(SourceKind.Law)!.Value, 1e-15);
        Assert.True(new Source(SourceKind.Law, "Casson").Shared);
    }

    [Fact]
    public void Laws_that_are_parted_add_nothing_and_the_one_contradicted_is_not_decided_on()
    {
        var analyzed = Evaluated(0.005);
        Assert.Equal("Quemada", analyzed.Pool.Comparison.Preferred);
        Assert.Empty(analyzed.Pool.Spreads);
        Assert.All(analyzed.Samples.SelectMany(sample => sample.Values), value => Assert.Null(value.Value.Part(SourceKind.Law)));
        Assert.All(analyzed.Samples, sample => Assert.False(sample.Find("Casson", At10, HematocritBasis.Native)!.Decidable));
    }

    private const double NotParted = 0.08;

    private static Value Find(SampleResult sample, string law, HematocritBasis basis) => sample.Find(law, At10, basis)!.Value;

    private static AnalyzedStudy Evaluated(double noise)
    {
        var study = TestStudy.Plain with
        {
            Errors = TestStudy.Plain.Errors with { Relative = noise, DeclaredLoading = 0.02 },
            Analysis = TestStudy.Plain.Analysis with { Laws = ["Casson", "Quemada"] },
        };
        var blood = new SimulatedCurves(1, noise, 0).Quemada(2).Select((drawn, i) => TestStudy.Blood(
            $"S-{i + 1}", drawn.Curve.Points.Select(point => TestStudy.Reading(point.Number, point.Rate.ReciprocalSeconds, point.Stress.Pascals)), 1, InventedBlood.BloodTime));
        return study.Evaluate(TestStudy.Readings(study, InventedBlood.Checks(), blood, [InventedBlood.Record("S-1", 0.41), InventedBlood.Record("S-2", 0.44)]), null, TestContext.Current.CancellationToken);
    }
}
