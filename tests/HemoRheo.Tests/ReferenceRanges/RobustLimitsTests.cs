namespace HemoRheo.Tests.ReferenceRanges;

/// <summary>Robust reference limits against R (tests/ReferenceData/reference-ranges, computed from the published formulas).</summary>
public sealed class RobustLimitsTests
{
    private static readonly Dictionary<string, Func<RobustLimits, double>> Steps = new()
    {
        ["median"] = limits => limits.Median,
        ["MAD_over_0.6745"] = limits => limits.Deviation,
        ["T_bi"] = limits => limits.Location,
        ["s_bi_205.6"] = limits => limits.OuterScale,
        ["s_bi_3.7"] = limits => limits.InnerScale,
        ["S_T_3.7"] = limits => limits.LocationScale,
        ["t"] = limits => limits.Quantile,
        ["low"] = limits => limits.Limits.Lower,
        ["high"] = limits => limits.Limits.Upper,
    };

    [Theory]
    [InlineData("set20")]
    [InlineData("set50")]
    [InlineData("set120")]
    [InlineData("set200")]
    [InlineData("constructed25")]
    public void Every_step_agrees_with_R_to_ten_digits(string set)
    {
        var limits = RobustLimits.Of(Values(set));
        var rows = ReferenceTable.Read("reference-ranges", "robust-limits.r.csv").Where(row => row["set"] == set).ToArray();
        Assert.Equal(Steps.Count, rows.Length);
        Assert.All(rows, row =>
        {
            var expected = row.Number("value");
            Assert.InRange(Steps[row["quantity"]](limits), expected - 1e-10 * Math.Abs(expected), expected + 1e-10 * Math.Abs(expected));
        });
    }

    [Fact]
    public void The_order_of_the_values_changes_nothing()
    {
        var values = Values("set50");
        Assert.Equal(RobustLimits.Of(values), RobustLimits.Of([.. values.Reverse()]));
    }

    [Fact]
    public void Another_unit_and_zero_only_move_the_limits()
    {
        var values = Values("set50");
        var plain = RobustLimits.Of(values).Limits;
        var moved = RobustLimits.Of([.. values.Select(value => 3 + 10 * value)]).Limits;
        Assert.Equal(3 + 10 * plain.Lower, moved.Lower, 1e-9);
        Assert.Equal(3 + 10 * plain.Upper, moved.Upper, 1e-9);
    }

    [Fact]
    public void One_value_far_out_hardly_moves_the_location()
    {
        var values = Values("constructed25");
        var wild = values.Select(value => value > 7 ? 1e6 : value).ToArray();
        Assert.Equal(RobustLimits.Of(values).Location, RobustLimits.Of(wild).Location, 0.01);
    }

    [Fact]
    public void Too_few_values_no_spread_and_no_number_are_refused_in_words()
    {
        Assert.Contains("there are 1", Assert.Throws<ArgumentException>(() => RobustLimits.Of([1.0])).Message, StringComparison.Ordinal);
        Assert.Contains("no spread", Assert.Throws<ArgumentException>(() => RobustLimits.Of([1.0, 1, 1, 1, 2])).Message, StringComparison.Ordinal);
        Assert.Contains("not a finite number", Assert.Throws<ArgumentException>(() => RobustLimits.Of([1.0, double.NaN, 2])).Message, StringComparison.Ordinal);
    }

    private static double[] Values(string set) => [.. ReferenceTable.Read("reference-ranges", set + ".csv").Select(row => row.Number("value"))];
}
