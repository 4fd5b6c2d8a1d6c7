namespace HemoRheo.Tests.Numerics;

/// <summary>No lane feels another, and special values come out as they must.</summary>
public class LaneTests
{
    private static readonly double[] Poisons = [double.NaN, double.PositiveInfinity, double.NegativeInfinity, 1e300, -1e300, 709, -709, 0];

    [Fact]
    public void The_exponential_of_a_lane_has_the_same_bits_beside_any_neighbor()
    {
        for (var i = 0; i < 1001; i++)
        {
            var x = -700 + 1.4 * i + 0.001 * i;
            var alone = Lane.Exp(new(x))[0];
            foreach (var poison in Poisons)
            {
                Assert.Equal(alone, Lane.Exp(new(poison, x, poison, poison))[1]);
                Assert.Equal(alone, Lane.Exp(new(x, poison, x, poison))[2]);
            }
        }
    }

    [Theory]
    [InlineData(0, 1)]
    [InlineData(1, 2.718281828459045)]
    [InlineData(-2.5, 0.0820849986238988)]
    [InlineData(100, 2.688117141816135e43)]
    [InlineData(double.NegativeInfinity, 0)]
    [InlineData(-800, 0)]
    [InlineData(800, double.PositiveInfinity)]
    [InlineData(double.PositiveInfinity, double.PositiveInfinity)]
    [InlineData(double.NaN, double.NaN)]
    public void The_exponential_has_known_values(double x, double expected) => Near(expected, Lane.Exp(new(x))[3]);

    [Theory]
    [InlineData(2, 0.6931471805599453)]
    [InlineData(1e-3, -6.907755278982137)]
    [InlineData(0, double.NegativeInfinity)]
    [InlineData(-1, double.NaN)]
    public void The_logarithm_has_known_values(double x, double expected) => Near(expected, Lane.Log(new(x))[0]);

    [Fact]
    public void The_logarithm_of_a_lane_has_the_same_bits_beside_any_neighbor()
    {
        for (var i = 1; i < 1001; i++)
        {
            var x = 1e-3 * i * i;
            foreach (var poison in Poisons) Assert.Equal(Lane.Log(new(x))[0], Lane.Log(new(poison, poison, x, poison))[2]);
        }
    }

    [Fact]
    public void The_power_of_a_lane_has_the_same_bits_beside_any_neighbor()
    {
        for (var i = 1; i < 1001; i++)
        {
            var (x, y) = (1e-3 * i * i, -3 + 0.006 * i);
            foreach (var poison in Poisons) Assert.Equal(Lane.Pow(new(x), new(y))[0], Lane.Pow(new(poison, poison, x, poison), new(-2, poison, y, 300))[2]);
        }
    }

    [Fact]
    public void Masks_choose_lane_by_lane_and_are_false_for_not_a_number()
    {
        var x = new Lane(1, double.NaN, 3, -4);
        var mask = x > new Lane(0.0);
        Assert.Equal([true, false, true, false], Enumerable.Range(0, 4).Select(mask.TrueAt));
        Assert.Equal([1, 7, 3, 7], Enumerable.Range(0, 4).Select(lane => Lane.Select(mask, x, new(7.0))[lane]));
        Assert.False(Lane.IsFinite(new(double.PositiveInfinity)).AnyTrue);
    }

    private static void Near(double expected, double found)
    {
        if (double.IsFinite(expected)) Assert.InRange(found, expected - 1e-14 * Math.Abs(expected), expected + 1e-14 * Math.Abs(expected));
        else Assert.Equal(expected, found);
    }
}
