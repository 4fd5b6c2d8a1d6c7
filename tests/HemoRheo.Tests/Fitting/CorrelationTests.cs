using HemoRheo.Benchmarks;

namespace HemoRheo.Tests.Fitting;

/// <summary>What a fit says when it is told that readings are correlated.</summary>
public sealed class CorrelationTests
{
    private static readonly FlowCurve Curve = Simulated.Noisy(RandomStream.Of(5, "correlation", 0), FlowLaw.Casson, 0.01, 0.0003, 0.006, 0.0035);

    [Fact]
    public void No_correlation_leaves_a_fit_as_it_is()
    {
        var fit = Curve.Fit(FlowLaw.Casson, WeightedFits.Errors);
        var same = fit.WithCorrelation(0);
        Assert.All(fit.Covariance.Zip(same.Covariance), pair => Assert.Equal(pair.First, pair.Second, 1e-9 * fit.Covariance.Max()));
        Assert.Equal(fit.Fit.Probability!.Value, same.Fit.Probability!.Value, 1e-9);
    }

    [Fact]
    public void A_reading_set_aside_still_counts_as_a_step()
    {
        var gap = Curve with { Points = Curve.Points.Where(point => point.Number != 6).ToItems() };
        var closed = gap with { Points = gap.Points.Select((point, i) => point with { Number = i + 1 }).ToItems() };
        var (far, near) = (gap.Fit(FlowLaw.Newtonian, WeightedFits.Errors).WithCorrelation(0.6), closed.Fit(FlowLaw.Newtonian, WeightedFits.Errors).WithCorrelation(0.6));
        Assert.True(far.Covariance[0] < near.Covariance[0]);
        Assert.Equal(0.36, WeightedDesign.Of(far)!.Correlations(0.6)[4, 5], 1e-15);
    }

    [Fact]
    public void A_parameter_held_at_its_bound_stays_without_variance()
    {
        var fit = Simulated.Exact(FlowLaw.Casson, 0.006, 0.0035).Fit(FlowLaw.Quemada, WeightedFits.Errors);
        var correlated = fit.WithCorrelation(0.5);
        Assert.True(fit.Parameters[2].AtBound);
        Assert.True(correlated.Parameters[2].AtBound);
        Assert.All(correlated.Covariance.Skip(6), variance => Assert.Equal(0, variance));
        Assert.Equal(fit.Findings.Select(finding => finding.Code), correlated.Findings.Select(finding => finding.Code));
    }

    [Fact]
    public void A_fit_that_failed_stays_failed()
    {
        var fit = FlowCurve.Of([10], [0.05]).Fit(FlowLaw.Casson);
        Assert.False(fit.WithCorrelation(0.5).Usable);
    }

    [Theory]
    [InlineData(1, 0)]
    [InlineData(-0.1, 0)]
    [InlineData(double.NaN, 0)]
    [InlineData(0.5, -1)]
    public void A_correlation_that_cannot_be_is_refused(double correlation, double error) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Curve.Fit(FlowLaw.Casson).WithCorrelation(correlation, error));

    /// <summary>2,400 curves of 12 points at correlation 0.6: intervals of the fit alone, and how often a right law is called wrong. Limits: three standard errors of a share.</summary>
    [Fact]
    public void Intervals_and_lack_of_fit_hold_at_a_correlation_of_six_tenths()
    {
        var simulated = new SimulatedCurves(1, 0.01, 0.6);
        var truth = simulated.Casson(2400);
        var plain = Fits.OfAll([.. truth.Select(item => item.Curve)], FlowLaw.Casson, simulated.Errors());
        var knowing = plain.Select(fit => fit.WithCorrelation(0.6)).ToArray();
        foreach (var rate in (double[])[1, 10, 100])
        {
            double Share(FittedLaw[] fits) => fits.Zip(truth, (fit, item) => fit.ApparentViscosity(rate.PerSecond()).Value.Interval().Contains(item.LogViscosity(rate)) ? 1.0 : 0.0).Average();
            Assert.InRange(Share(plain), 0.69, 0.81);
            Assert.InRange(Share(knowing), 0.936, 0.964);
        }

        Assert.InRange(plain.Average(fit => fit.Fit.ChiSquare), 5.9, 6.4);
        Assert.InRange(knowing.Average(fit => fit.Fit.Probability < 0.05 ? 1.0 : 0.0), 0.05 - 0.0134, 0.05 + 0.0134);
        Assert.InRange(knowing.Count(fit => fit.Fit.Contradicts), 0, 7);
    }
}
