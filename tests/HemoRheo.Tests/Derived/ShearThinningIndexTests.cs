using HemoRheo.Tests.Fitting;

namespace HemoRheo.Tests.Derived;

public class ShearThinningIndexTests
{
    private static readonly ShearRate Low = ShearRate.FromReciprocalSeconds(1);
    private static readonly ShearRate High = ShearRate.FromReciprocalSeconds(100);

    /// <summary>Casson, 5 mPa and 3.3 mPa.s: (sqrt(5) + sqrt(3.3))^2 = 16.424038 mPa at 1 1/s over (sqrt(5) + sqrt(330))^2 / 100 = 4.1624038 mPa.s.</summary>
    [Fact]
    public void It_is_the_ratio_of_the_two_viscosities()
    {
        var index = Simulated.Exact(FlowLaw.Casson, 0.005, 0.0033).Fit(FlowLaw.Casson, WeightedFits.Errors).Estimate(Measurand.ShearThinningIndex(Low, High));
        Assert.Equal(16.424038 / 4.1624038, index.Shown, 1e-6);
        Assert.False(index.Extrapolated);
    }

    [Fact]
    public void Its_gradient_is_the_finite_difference_for_every_law()
    {
        foreach (var law in FlowLaw.All.Where(law => law != FlowLaw.Newtonian))
        {
            FittedLaw fit = WeightedFits.Curves.Values.First().Fit(law, WeightedFits.Errors);
            var value = Measurand.ShearThinningIndex(Low, High).From(fit)!;
            var natural = fit.Parameters.Select(parameter => parameter.Estimate).ToArray();
            double At(double[] scaled) => Math.Log(100 * law.Stress(Low, law.ToNatural(scaled)).Pascals / law.Stress(High, law.ToNatural(scaled)).Pascals);
            for (var k = 0; k < fit.Scaled.Count; k++)
            {
                if (double.IsInfinity(fit.Scaled[k])) continue;
                var (up, down) = (fit.Scaled.ToArray(), fit.Scaled.ToArray());
                up[k] += 1e-5;
                down[k] -= 1e-5;
                Assert.Equal((At(up) - At(down)) / 2e-5, value.Gradient[k], 1e-6 * (1 + Math.Abs(value.Gradient[k])));
            }
        }
    }

    [Fact]
    public void Outside_the_kept_rates_it_is_extrapolated()
    {
        var fit = Simulated.Exact(FlowLaw.Casson, 0.005, 0.0033).Fit(FlowLaw.Casson, WeightedFits.Errors);
        Assert.True(fit.Estimate(Measurand.ShearThinningIndex(new(0.1), High)).Extrapolated);
        Assert.True(fit.Estimate(Measurand.ShearThinningIndex(Low, new(1000))).Extrapolated);
    }

    [Theory]
    [InlineData(100, 1)]
    [InlineData(10, 10)]
    [InlineData(0, 10)]
    [InlineData(1, double.NaN)]
    public void Rates_in_the_wrong_order_are_refused(double low, double high) =>
        Assert.Throws<ArgumentException>(() => Measurand.ShearThinningIndex(new(low), new(high)));
}
