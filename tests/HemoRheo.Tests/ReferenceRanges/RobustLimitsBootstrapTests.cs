using MathNet.Numerics.Distributions;
using MathNet.Numerics.Random;

namespace HemoRheo.Tests.ReferenceRanges;

public sealed class RobustLimitsBootstrapTests
{
    private static readonly double[] Values = [.. BuiltCohort.Spread(48)];

    [Fact]
    public void One_seed_and_name_give_the_same_intervals_and_another_seed_or_name_gives_others()
    {
        var first = RobustLimitsBootstrap.Of(Values, 7, "viscosity at 10 1/s");
        Assert.Equal(first, RobustLimitsBootstrap.Of(Values, 7, "viscosity at 10 1/s"));
        Assert.NotEqual(first, RobustLimitsBootstrap.Of(Values, 8, "viscosity at 10 1/s"));
        Assert.NotEqual(first, RobustLimitsBootstrap.Of(Values, 7, "viscosity at 1 1/s"));
    }

    [Fact]
    public void The_intervals_hold_the_limits_and_shrink_with_the_root_of_the_number()
    {
        var few = RobustLimitsBootstrap.Of(Values, 7, "a");
        var many = RobustLimitsBootstrap.Of([.. BuiltCohort.Spread(4 * 48)], 7, "a");
        Assert.True(few.LowerLimit.Contains(RobustLimits.Of(Values).Limits.Lower));
        Assert.True(few.UpperLimit.Contains(RobustLimits.Of(Values).Limits.Upper));
        var ratio = (few.UpperLimit.Upper - few.UpperLimit.Lower) / (many.UpperLimit.Upper - many.UpperLimit.Lower);
        Assert.InRange(ratio, 1.6, 2.4);
    }

    /// <summary>
    /// Sets of normal values: the 90 % intervals hold the true 2.5th and 97.5th percentile (-+1.959964) within three standard errors of the number of sets.
    /// With half of their width they do not, so the check can fail.
    /// </summary>
    [Theory]
    [InlineData(20)]
    [InlineData(48)]
    public void The_90_percent_intervals_hold_the_true_limits(int people)
    {
        const int sets = 200;
        var random = new Xoshiro256StarStar(20261201, threadSafe: false);
        var truth = Normal.InvCDF(0, 1, 0.975);
        var (held, halved) = (0, 0);
        for (var k = 0; k < sets; k++)
        {
            var values = new double[people];
            Normal.Samples(random, values, 0, 1);
            var intervals = RobustLimitsBootstrap.Of(values, k, "simulated");
            foreach (var (interval, limit) in new[] { (intervals.LowerLimit, -truth), (intervals.UpperLimit, truth) })
            {
                var (middle, reach) = ((interval.Lower + interval.Upper) / 2, (interval.Upper - interval.Lower) / 2);
                if (interval.Contains(limit)) held++;
                if (Math.Abs(limit - middle) <= reach / 2) halved++;
            }
        }

        var error = Math.Sqrt(0.9 * 0.1 / sets);
        Assert.InRange(held / (2.0 * sets), 0.9 - 3 * error, 0.9 + 3 * error);
        Assert.True(halved / (2.0 * sets) < 0.9 - 3 * error);
        TestContext.Current.TestOutputHelper!.WriteLine($"{people} people: {held / (2.0 * sets):P1}");
    }
}
