using MathNet.Numerics.Distributions;

namespace HemoRheo.Tests.Fitting;

/// <summary>Intervals from the curve alone hold the truth as often as they say, when the curve's own errors are all there is.</summary>
public class CoverageTests
{
    private const int Curves = 2000;
    private const double Normal95 = 1.959963984540054;

    private static readonly double[] Truth = [0.005, 0.0033];

    /// <summary>95 % plus or minus three standard errors of 2,000 curves is 93.5 to 96.5 %.</summary>
    [Fact]
    public void Intervals_of_Casson_parameters_with_known_errors_cover_95_percent()
    {
        var fits = Fits.OfAll(Simulate("known"), FlowLaw.Casson, ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003)));
        Covers(fits, Normal95);
    }

    /// <summary>The errors are 1 % and 0.3 mPa, stated as 2 % and 0.6 mPa up to scale: ten degrees of freedom, Student's t.</summary>
    [Fact]
    public void Intervals_of_Casson_parameters_with_an_unknown_scale_cover_95_percent()
    {
        var fits = Fits.OfAll(Simulate("scale"), FlowLaw.Casson, ErrorModel.UpToScale(0.02, ShearStress.FromPascals(0.0006)));
        Covers(fits, StudentT.InvCDF(0, 1, 10, 0.975));
    }

    /// <summary>Lack of fit at 5 % is found in 5 % of curves whose law is right: 3.5 to 6.5 %.</summary>
    [Fact]
    public void Chi_square_probabilities_are_uniform_when_the_law_is_right()
    {
        var fits = Fits.OfAll(Simulate("chi-square"), FlowLaw.Casson, ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003)));
        Assert.InRange(fits.Average(fit => fit.Fit.Probability < 0.05 ? 1.0 : 0), 0.035, 0.065);
        Assert.InRange(fits.Average(fit => fit.Fit.Probability < 0.5 ? 1.0 : 0), 0.466, 0.534);
    }

    private static FlowCurve[] Simulate(string what) =>
        [.. Enumerable.Range(1, Curves).Select(i => Simulated.Noisy(RandomStream.Of(20261201, what, i), FlowLaw.Casson, 0.01, 0.0003, Truth))];

    private static void Covers(FittedLaw[] fits, double quantile)
    {
        Assert.All(fits, fit => Assert.True(fit.Usable, fit.ToString()));
        for (var k = 0; k < Truth.Length; k++)
        {
            var held = fits.Average(fit => Math.Abs(fit.Scaled[k] - Math.Log(Truth[k])) <= quantile * Math.Sqrt(fit.Covariance[3 * k]) ? 1.0 : 0);
            Assert.InRange(held, 0.935, 0.965);
        }
    }
}
