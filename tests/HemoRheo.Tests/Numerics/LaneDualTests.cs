namespace HemoRheo.Tests.Numerics;

/// <summary>Slopes of each operation against hand-worked derivatives at x = 2, y = 3, with d/dx first.</summary>
public class LaneDualTests
{
    private const double Log2 = 0.6931471805599453;

    private static readonly LaneDual X = LaneDual.Seed(new(2.0), 0, new(1.0));
    private static readonly LaneDual Y = LaneDual.Seed(new(3.0), 1, new(1.0));

    [Fact]
    public void Each_operation_has_its_derivative()
    {
        Near(X + Y, 5, 1, 1);
        Near(X - Y, -1, 1, -1);
        Near(-X, -2, -1, 0);
        Near(X * Y, 6, 3, 2);
        Near(X / Y, 2.0 / 3, 1.0 / 3, -2.0 / 9);
        Near(X + 4, 6, 1, 0);
        Near(4 + X, 6, 1, 0);
        Near(X - 4, -2, 1, 0);
        Near(4 - X, 2, -1, 0);
        Near(X * 4, 8, 4, 0);
        Near(4 * X, 8, 4, 0);
        Near(X / 4, 0.5, 0.25, 0);
        Near(4 / X, 2, -1, 0);
        Near(LaneDual.Square(X), 4, 4, 0);
        Near(LaneDual.Sqrt(X), 1.4142135623730951, 0.35355339059327373, 0);
        Near(LaneDual.Exp(X), 7.38905609893065, 7.38905609893065, 0);
        Near(LaneDual.Log(X), Log2, 0.5, 0);
        Near(LaneDual.Pow(X, Y), 8, 12, 8 * Log2);
        Near(LaneDual.Sin(X), 0.9092974268256817, -0.4161468365471424, 0);
        Near(LaneDual.Cos(X), -0.4161468365471424, -0.9092974268256817, 0);
        Near(LaneDual.Atan(X), 1.1071487177940904, 0.2, 0);
    }

    [Fact]
    public void The_root_of_zero_has_no_slope()
    {
        var root = LaneDual.Sqrt(LaneDual.Seed(new(0.0), 0, new(0.0)));
        Assert.Equal(0, root.Value[0]);
        Assert.Equal(0, root.S0[0]);
    }

    /// <summary>0^3 = 0, 0^0 = 1, 0^-1 is infinite; the slopes that matter to a rate of zero are zero, since it does not move.</summary>
    [Fact]
    public void A_power_of_zero_is_a_number_with_slopes_that_are_numbers()
    {
        var zero = LaneDual.Seed(new(0.0), 0, new(0.0));
        var power = LaneDual.Pow(zero, Y);
        Assert.Equal([0, 0, 0], [power.Value[0], power.S0[0], power.S1[0]]);
        Assert.Equal(1, LaneDual.Pow(zero, new(new Lane(0.0))).Value[0]);
        Assert.Equal(double.PositiveInfinity, Lane.Pow(new(0.0), new(-1.0))[2]);
        Assert.True(double.IsNaN(Lane.Pow(new(-2.0), new(0.5))[0]));
        Assert.True(double.IsNaN(Lane.Pow(new(2.0), new(double.NaN))[1]));
    }

    private static void Near(LaneDual found, double value, double byX, double byY)
    {
        Assert.Equal(value, found.Value[0], 1e-14);
        Assert.Equal(byX, found.S0[3], 1e-13);
        Assert.Equal(byY, found.Slope(1)[2], 1e-13);
        Assert.Equal(0, found.Slope(4)[0]);
    }
}
