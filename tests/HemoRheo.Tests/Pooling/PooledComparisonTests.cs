using HemoRheo.Benchmarks;

namespace HemoRheo.Tests.Pooling;

/// <summary>Studies of known truth fitted by several laws: what the comparison over all their curves says.</summary>
public sealed class PooledComparisonTests
{
    [Theory]
    [InlineData(0.01, 0)]
    [InlineData(0.03, 0)]
    [InlineData(0.01, 0.6)]
    [InlineData(0.03, 0.6)]
    public void Twenty_curves_of_Quemada_blood_expose_Casson_every_time(double noise, double correlation) =>
        Assert.All(Enumerable.Range(0, 25), study =>
        {
            var comparison = Compared(new SimulatedCurves(study, noise, correlation), simulated => simulated.Quemada(20), FlowLaw.Casson, FlowLaw.Quemada);
            Assert.Equal("Quemada", comparison.Preferred);
            Assert.Equal(LawStanding.Contradicted, comparison.Laws[0].Standing);
        });

    /// <summary>96 % in 200 studies of the benchmark; the others are not parted, or have few fits at the boundary by chance.</summary>
    [Fact]
    public void On_Casson_blood_Quemada_is_at_its_boundary_and_no_rival()
    {
        var said = Enumerable.Range(0, 40).Select(study => Compared(new SimulatedCurves(study, 0.01, 0), simulated => simulated.Casson(20), FlowLaw.Quemada, FlowLaw.Casson)).ToArray();
        Assert.All(said, comparison => Assert.NotEqual("Quemada", comparison.Preferred));
        var boundary = said.Where(comparison => comparison.Preferred == "Casson" && comparison.Laws[0].Standing == LawStanding.AtBoundary).ToArray();
        Assert.InRange(boundary.Length, 34, 40);
        Assert.Contains("Casson describes the 20 curves. Quemada runs to its boundary", boundary[0].Words, StringComparison.Ordinal);
    }

    [Fact]
    public void One_noisy_curve_cannot_tell_Casson_from_Quemada_and_says_so()
    {
        var said = Enumerable.Range(0, 60).Select(study => Compared(new SimulatedCurves(study, 0.03, 0), simulated => simulated.Quemada(1), FlowLaw.Casson, FlowLaw.Quemada)).ToArray();
        var alike = said.Where(comparison => comparison.NotParted.Count == 2).ToArray();
        Assert.InRange(alike.Length, 20, 42);
        Assert.All(alike, comparison => Assert.Contains("cannot tell Casson and Quemada apart", comparison.Words, StringComparison.Ordinal));
        Assert.All(alike, comparison => Assert.Null(comparison.Preferred));
    }

    [Fact]
    public void A_law_beaten_on_every_curve_does_not_fit_even_where_its_own_residuals_are_too_few_to_show_it()
    {
        var simulated = new SimulatedCurves(1, 0.03, 0);
        var fits = Fitted(simulated, simulated.Quemada(4), FlowLaw.Casson, FlowLaw.Quemada);
        LawEvidence Evidence(int law) => LawJudgment.Judge(fits[law].Law, [.. fits[law].Fits.OfType<FittedLaw>()]) with { Fits = true };
        var comparison = PooledComparing.Of(fits, new Dictionary<string, LawEvidence> { ["Casson"] = Evidence(0), ["Quemada"] = Evidence(1) });
        Assert.Equal(LawStanding.Contradicted, comparison.Laws[0].Standing);
        var judged = PooledComparing.Judged(Evidence(0), comparison);
        Assert.False(judged.Fits);
        Assert.Contains("units of AIC better on the same 4 curves", judged.Words, StringComparison.Ordinal);
        Assert.True(PooledComparing.Judged(Evidence(1), comparison).Fits);
    }

    [Fact]
    public void The_difference_is_that_of_the_likelihoods_and_of_the_parameters_counted()
    {
        var simulated = new SimulatedCurves(2, 0.03, 0);
        var fits = Fitted(simulated, simulated.Quemada(20), FlowLaw.Casson, FlowLaw.Quemada);
        var comparison = PooledComparing.Of(fits, fits.ToDictionary(law => law.Law.Name, law => LawJudgment.Judge(law.Law, [.. law.Fits.OfType<FittedLaw>()])));
        var held = fits[1].Fits.Count(fit => fit!.Parameters[2].AtBound);
        var gain = fits[0].Fits.Zip(fits[1].Fits, (casson, quemada) => Likelihood.MinusTwiceLog(casson!) - Likelihood.MinusTwiceLog(quemada!)).Sum();
        Assert.Equal(gain - 2 * (20 - held), comparison.Laws[0].Difference!.Value, 1e-9);
        Assert.Equal(1, comparison.Laws.Sum(law => law.Weight!.Value), 1e-12);
        Assert.Equal(held, comparison.Laws[1].AtBound);
    }

    [Fact]
    public void One_law_or_no_curve_is_compared_with_nothing()
    {
        Assert.Contains("one law", Compared(new SimulatedCurves(1, 0.01, 0), simulated => simulated.Casson(3), FlowLaw.Casson).Words, StringComparison.Ordinal);
        var none = PooledComparing.Of([(FlowLaw.Casson, [null, null]), (FlowLaw.Quemada, [null, null])], new Dictionary<string, LawEvidence>());
        Assert.All(none.Laws, law => Assert.Equal(LawStanding.NotCompared, law.Standing));
    }

    [Fact]
    public void A_law_that_few_curves_can_be_fitted_by_takes_no_part()
    {
        var simulated = new SimulatedCurves(1, 0.01, 0);
        var fits = Fitted(simulated, simulated.Casson(10), FlowLaw.Casson, FlowLaw.Newtonian, FlowLaw.Quemada);
        fits[2] = (fits[2].Law, [.. fits[2].Fits.Select((fit, i) => i < 7 ? fit : null)]);
        var comparison = PooledComparing.Of(fits, fits.ToDictionary(law => law.Law.Name, law => LawJudgment.Judge(law.Law, [.. law.Fits.OfType<FittedLaw>()])));
        Assert.Equal(LawStanding.NotCompared, comparison.Laws[2].Standing);
        Assert.Equal(10, comparison.Laws[0].Curves);
        Assert.Equal("Casson", comparison.Preferred);
    }

    private static PooledComparison Compared(SimulatedCurves simulated, Func<SimulatedCurves, (FlowCurve Curve, Func<double, double> LogViscosity)[]> drawn, params FlowLaw[] laws)
    {
        var fits = Fitted(simulated, drawn(simulated), laws);
        var correlation = CorrelationPool.Of(CorrelationPool.Asked([.. fits.Select(law => (law.Law, law.Fits.OfType<FittedLaw>().ToArray()))]), null);
        fits = [.. fits.Select(law => (law.Law, law.Fits.Select(fit => correlation.Value > 0 ? fit?.WithCorrelation(correlation.Value, correlation.StandardError) : fit).ToArray()))];
        return PooledComparing.Of(fits, fits.ToDictionary(law => law.Law.Name, law => LawJudgment.Judge(law.Law, [.. law.Fits.OfType<FittedLaw>()])));
    }

    private static (FlowLaw Law, FittedLaw?[] Fits)[] Fitted(SimulatedCurves simulated, (FlowCurve Curve, Func<double, double> LogViscosity)[] drawn, params FlowLaw[] laws) =>
        [.. laws.Select(law => (law, Fits.OfAll([.. drawn.Select(item => item.Curve)], law, simulated.Errors()).Select(fit => fit.Usable ? fit : null).ToArray()))];
}
