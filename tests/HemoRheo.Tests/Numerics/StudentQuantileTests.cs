namespace HemoRheo.Tests.Numerics;

public sealed class StudentQuantileTests
{
    /// <summary>Source: computed with SciPy 1.10, scipy.stats.t.ppf.</summary>
    [Theory]
    [InlineData(0.05, 0.975, 1.1958337585475582e+25)]
    [InlineData(0.3, 0.975, 6582.035706130191)]
    [InlineData(1, 0.975, 12.706204736432095)]
    [InlineData(2.5, 0.975, 3.5746548420118773)]
    [InlineData(4.54406, 0.975, 2.6501317995380678)]
    [InlineData(30, 0.995, 2.7499956535670305)]
    [InlineData(1e3, 0.975, 1.9623390808264074)]
    [InlineData(1e4, 0.51, 0.025069535383140874)]
    [InlineData(5e5, 0.975, 1.9599687290938046)]
    [InlineData(5e6, 0.975, 1.9599644589944127)]
    public void Quantiles_are_those_of_SciPy(double degreesOfFreedom, double p, double expected)
    {
        // The incomplete beta function of MathNet.Numerics carries nine digits at a fraction of a degree of freedom.
        Assert.Equal(expected, StudentQuantile.At(degreesOfFreedom, p), 1e-8 * expected);
        Assert.Equal(-expected, StudentQuantile.At(degreesOfFreedom, 1 - p), 1e-7 * expected);
    }
}
