using MathNet.Numerics.LinearAlgebra;

namespace HemoRheo.Tests.Pooling;

public sealed class LoadingPoolTests
{
    private static readonly Items<Measurand> Two = [Measurand.Viscosity(1.PerSecond()), Measurand.Viscosity(10.PerSecond())];

    [Fact]
    public void Without_replicates_the_declared_scatter_is_used_and_said()
    {
        var scatter = LoadingPool.Pool("Casson", Two, [], 0.02);
        Assert.Equal("loading-scatter-declared", Assert.Single(scatter.Findings).Code);
        var column = Assert.Single(scatter.Columns);
        Assert.Equal([0.02, 0.02], column.Amounts);
        Assert.Equal(double.PositiveInfinity, column.DegreesOfFreedom);
    }

    [Fact]
    public void Without_replicates_and_declaration_nothing_is_invented()
    {
        var scatter = LoadingPool.Pool("Casson", Two, [], null);
        Assert.Equal("loading-scatter-unknown", Assert.Single(scatter.Findings).Code);
        Assert.Empty(scatter.Columns);
    }

    [Fact]
    public void Replicates_that_agree_better_than_their_fits_are_held_at_a_tenth_of_their_variance()
    {
        var scatter = LoadingPool.Pool("Casson", [Two[0]], Pairs(1, (0.010, -0.010)), null);
        Assert.Equal(["loading-scatter-at-floor", "loading-replicates-few"], scatter.Findings.Select(finding => finding.Code));

        // Replicate variance 2 * 0.01^2 on one degree of freedom; the fits' variance of 1 exceeds it.
        var column = Assert.Single(scatter.Columns);
        Assert.Equal(Math.Sqrt(0.1 * 2e-4), Math.Abs(column.Amounts[0]), 1e-12);
        Assert.Equal(0.01, column.DegreesOfFreedom, 1e-12);
    }

    [Theory]
    [InlineData(0.02, "loading-scatter-declared", 1)]
    [InlineData(null, "loading-scatter-unknown", 0)]
    public void Replicates_that_are_copies_show_no_scatter_and_say_so(double? declared, string code, int columns)
    {
        var scatter = LoadingPool.Pool("Casson", [Two[0]], Pairs(0.003, (-5.2, -5.2), (-5.1, -5.1)), declared);
        Assert.Equal([code, "loadings-alike"], scatter.Findings.Select(finding => finding.Code));
        Assert.Equal(columns, scatter.Columns.Count);
    }

    [Fact]
    public void Known_scatter_is_recovered_over_many_replicates()
    {
        var random = new MathNet.Numerics.Random.Xoshiro256StarStar(5, false);
        double Draw(double sd) => MathNet.Numerics.Distributions.Normal.Sample(random, 0, sd);
        var pairs = Enumerable.Range(0, 4000).Select(_ => Pairs(0.01, (Draw(0.02) + Draw(0.01), Draw(0.02) + Draw(0.01)))[0]).ToArray();
        var column = Assert.Single(LoadingPool.Pool("Casson", [Two[0]], pairs, null).Columns);
        Assert.Equal(0.02, Math.Abs(column.Amounts[0]), 3 * 0.02 / Math.Sqrt(2 * 4000) * 1.3);
    }

    private static FitValueSet[][] Pairs(double fit, params (double First, double Second)[] pairs) =>
        [.. pairs.Select(pair => new[] { Set(pair.First, fit), Set(pair.Second, fit) })];

    private static FitValueSet Set(double x, double fit) => new(Vector<double>.Build.Dense(1, x), Matrix<double>.Build.Dense(1, 1, fit));
}
