namespace HemoRheo.Tests.Fitting;

/// <summary>Bootstrap intervals: seeded, near the profile where both must agree, open where the refits run to a bound.</summary>
public class BootstrapIntervalTests
{
    private static readonly FlowCurve Curve = WeightedFits.Curves["A-002/1"];

    public static TheoryData<IntervalMethod, bool> Bootstraps => [.. from method in new[] { IntervalMethod.ParametricBootstrap, IntervalMethod.ResidualBootstrap } from known in new[] { true, false } select (method, known)];

    /// <summary>Quemada fits this curve, so the residuals have the size of the errors. A percentile of 2,000 has a sampling error of 3 % of the width.</summary>
    [Theory]
    [MemberData(nameof(Bootstraps))]
    public void Limits_lie_near_those_of_the_profile(IntervalMethod method, bool known)
    {
        var fit = Curve.Fit((FlowLaw)FlowLaw.Quemada, WeightedFits.Errors with { ScaleKnown = known });
        foreach (var measurand in new[] { Measurand.Viscosity(1.PerSecond()), Measurand.Viscosity(100.PerSecond()) })
        {
            var (bootstrap, profile) = (fit.Interval(measurand, 0.95, method), fit.Interval(measurand));
            var width = profile.Upper!.Value - profile.Lower!.Value;
            Assert.Equal(profile.Lower.Value, bootstrap.Lower!.Value, 0.15 * width);
            Assert.Equal(profile.Upper.Value, bootstrap.Upper!.Value, 0.15 * width);
            Assert.Empty(bootstrap.Findings);
        }
    }

    /// <summary>With nine degrees of freedom Student's t is 15 % wider than the normal quantile, and so must the percentiles be; 8,000 refits have a sampling error of 1.5 % of the width.</summary>
    [Theory]
    [InlineData(IntervalMethod.ParametricBootstrap)]
    [InlineData(IntervalMethod.ResidualBootstrap)]
    public void An_estimated_scale_moves_the_percentiles_out_as_far_as_Student_asks(IntervalMethod method)
    {
        var fit = Curve.Fit((FlowLaw)FlowLaw.Quemada, WeightedFits.Errors with { ScaleKnown = false });
        var (bootstrap, profile) = (fit.Interval(Measurand.Viscosity(100.PerSecond()), 0.95, method, new(Replicates: 8000)), fit.Interval(Measurand.Viscosity(100.PerSecond())));
        Assert.Equal(1, (bootstrap.Upper!.Value - bootstrap.Lower!.Value) / (profile.Upper!.Value - profile.Lower!.Value), 0.06);
    }

    [Fact]
    public void Numbers_depend_on_seed_sample_law_and_method_alone()
    {
        var fit = Curve.Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors);
        FitInterval Ask(long seed, IntervalMethod method) => fit.Interval("yield stress", 0.9, method, new(seed, 200));
        Assert.Equal(Ask(1, IntervalMethod.ParametricBootstrap), Ask(1, IntervalMethod.ParametricBootstrap));
        Assert.NotEqual(Ask(1, IntervalMethod.ParametricBootstrap).Lower, Ask(2, IntervalMethod.ParametricBootstrap).Lower);
        Assert.NotEqual(Ask(1, IntervalMethod.ParametricBootstrap).Lower, Ask(1, IntervalMethod.ResidualBootstrap).Lower);
    }

    [Fact]
    public void Refits_that_end_at_the_bound_count_there_and_open_the_lower_side()
    {
        var plasma = Simulated.Noisy(RandomStream.Of(20261201, "plasma", 2), FlowLaw.Newtonian, 0.01, 0.0003, 0.0013).Fit((FlowLaw)FlowLaw.Casson, WeightedFits.Errors);
        foreach (var method in new[] { IntervalMethod.ParametricBootstrap, IntervalMethod.ResidualBootstrap })
        {
            var interval = plasma.Interval("yield stress", 0.95, method, new(Replicates: 400));
            Assert.Equal(IntervalKind.AtMost, interval.Kind);
            Assert.True(interval.Upper > 0);
        }
    }

    /// <summary>At 0.7 1/s plasma has 0.9 mPa: with a floor of 0.5 mPa one reading in thirty falls below zero.</summary>
    [Fact]
    public void More_than_one_failed_refit_in_a_hundred_is_found()
    {
        var fit = Simulated.Exact(FlowLaw.Newtonian, 0.0013).Fit((FlowLaw)FlowLaw.Newtonian, ErrorModel.Known(0.01, ShearStress.FromPascals(0.0005)));
        var finding = Assert.Single(fit.Interval("viscosity", 0.95, IntervalMethod.ParametricBootstrap, new(Replicates: 1000)).Findings);
        Assert.Equal("bootstrap-refits-failed", finding.Code);
        Assert.InRange(finding.Observed!.Value, 0.02, 0.06);
    }
}
