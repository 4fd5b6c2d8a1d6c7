using MathNet.Numerics.Distributions;

namespace HemoRheo.Tests.Numerics;

public sealed class SquaresDistributionTests
{
    [Theory]
    [InlineData(1, 3.841458820694124, 0.05)]
    [InlineData(10, 18.307038053275146, 0.05)]
    [InlineData(10, 29.588298445074422, 0.001)]
    public void Independent_numbers_have_the_quantiles_of_chi_square(int degreesOfFreedom, double quantile, double probability) =>
        Assert.Equal(probability, SquaresDistribution.Independent(degreesOfFreedom).ProbabilityAbove(quantile), 1e-12);

    /// <summary>Sums with eigenvalues 2, 2 and 1, 1 (twice chi-square with two degrees of freedom and once): exact tail 2 exp(-x/4) - exp(-x/2), here 0.40, 0.06 and 0.001. Three cumulants give it to a tenth at one in a thousand.</summary>
    [Theory]
    [InlineData(6, 0.03)]
    [InlineData(14, 0.03)]
    [InlineData(30, 0.1)]
    public void Unequal_eigenvalues_have_nearly_the_exact_tail(double sum, double relative)
    {
        var exact = 2 * Math.Exp(-sum / 4) - Math.Exp(-sum / 2);
        Assert.InRange(new SquaresDistribution(6, 10, 18).ProbabilityAbove(sum) / exact, 1 - relative, 1 + relative);
    }

    [Fact]
    public void The_sum_of_two_is_that_of_all_eigenvalues_and_nothing_is_certain_to_be_exceeded()
    {
        Assert.Equal(SquaresDistribution.Independent(7), SquaresDistribution.Independent(3) + SquaresDistribution.Independent(4));
        Assert.Equal(1, new SquaresDistribution(6, 10, 18).ProbabilityAbove(0));
        Assert.Equal(ChiSquared.CDF(4, 4), 1 - SquaresDistribution.Independent(4).ProbabilityAbove(4), 1e-12);
    }
}
