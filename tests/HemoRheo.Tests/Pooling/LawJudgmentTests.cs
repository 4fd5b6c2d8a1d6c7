using MathNet.Numerics.Distributions;
using MathNet.Numerics.Random;

namespace HemoRheo.Tests.Pooling;

/// <summary>Truth is simulated and the law is judged on all curves of a study: how often a right law is refused, a wrong one kept.</summary>
public sealed class LawJudgmentTests
{
    private static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];
    private static readonly ErrorModel Declared = ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003));

    [Fact]
    public void A_right_law_is_hardly_ever_refused()
    {
        var refused = Enumerable.Range(0, 300).Count(study => !Judge(FlowLaw.Casson, Casson, study, 20, 0.01).Fits);

        // Refusal asks for a pattern at one in a thousand and of a third of a standard deviation: 3 of 300 is three standard errors above.
        Assert.InRange(refused, 0, 3);
    }

    [Fact]
    public void Quemada_blood_fitted_by_Casson_is_exposed_by_twenty_curves_every_time()
    {
        Assert.All(Enumerable.Range(0, 40), study => Assert.False(Judge(FlowLaw.Casson, Quemada, study, 20, 0.01).Fits));
        Assert.All(Enumerable.Range(0, 40), study => Assert.True(Judge(FlowLaw.Quemada, Quemada, study, 20, 0.01).Fits));
    }

    [Fact]
    public void Noise_half_again_as_large_as_declared_is_said_but_does_not_condemn_the_law()
    {
        var evidence = Judge(FlowLaw.Casson, Casson, 1, 40, 0.0145);
        Assert.True(evidence.Fits);
        Assert.Contains("scatter is larger than declared", evidence.Words, StringComparison.Ordinal);
        Assert.True(evidence.Probability < 1e-3);
    }

    [Fact]
    public void Too_few_curves_for_a_pattern_are_said_and_no_probability_is_invented()
    {
        var evidence = Judge(FlowLaw.Casson, Casson, 1, 7, 0.01);
        Assert.Contains("too few to look for a common pattern", evidence.Words, StringComparison.Ordinal);
        Assert.DoesNotContain("mean residual", evidence.Words, StringComparison.Ordinal);
    }

    [Fact]
    public void A_study_without_usable_curves_says_nothing_of_a_law()
    {
        var evidence = LawJudgment.Judge(FlowLaw.Casson, []);
        Assert.False(evidence.Fits);
        Assert.Equal(0, evidence.Curves);
    }

    [Fact]
    public void Curves_copied_ten_times_show_their_pattern_and_no_number_is_lost()
    {
        var right = JudgeCopies(rate => Math.Pow(Math.Sqrt(0.005) + Math.Sqrt(0.0033 * rate), 2));
        Assert.True(right.Fits);
        Assert.InRange(right.PatternProbability, 0.999, 1);
        var wrong = JudgeCopies(rate => rate * 0.0031 * Math.Pow((1 + Math.Sqrt(rate / 2.5)) / (0.22 + Math.Sqrt(rate / 2.5)), 2));
        Assert.False(wrong.Fits);
        Assert.InRange(wrong.PatternProbability, 0, 1e-6);
    }

    private static LawEvidence JudgeCopies(Func<double, double> stress) =>
        LawJudgment.Judge(FlowLaw.Casson, Fits.OfAll([.. Enumerable.Repeat(FlowCurve.Of(Rates, [.. Rates.Select(stress)]), 10)], FlowLaw.Casson, Declared));

    private static LawEvidence Judge(FlowLaw law, Func<Random, double[]> truth, int study, int curves, double noise)
    {
        var random = new Xoshiro256StarStar(77 + 1000 * study, false);
        var drawn = Enumerable.Range(0, curves).Select(i =>
        {
            var stresses = truth(random).Select(stress => stress * (1 + Normal.Sample(random, 0, noise)) + Normal.Sample(random, 0, 0.0003));
            return FlowCurve.Of(Rates, [.. stresses], $"curve {i}");
        }).ToArray();
        return LawJudgment.Judge(law, Fits.OfAll(drawn, law, Declared));
    }

    private static double[] Casson(Random random)
    {
        var (yieldStress, viscosity) = (0.005 * Math.Exp(Normal.Sample(random, 0, 0.4)), 0.0033 * Math.Exp(Normal.Sample(random, 0, 0.1)));
        return [.. Rates.Select(rate => Math.Pow(Math.Sqrt(yieldStress) + Math.Sqrt(viscosity * rate), 2))];
    }

    private static double[] Quemada(Random random)
    {
        var (high, critical, r) = (0.0031 * Math.Exp(Normal.Sample(random, 0, 0.06)), 2.5 * Math.Exp(Normal.Sample(random, 0, 0.3)), 0.22 * Math.Exp(Normal.Sample(random, 0, 0.15)));
        return [.. Rates.Select(rate => rate * high * Math.Pow((1 + Math.Sqrt(rate / critical)) / (r + Math.Sqrt(rate / critical)), 2))];
    }
}
