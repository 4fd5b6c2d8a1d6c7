using System.Globalization;

namespace HemoRheo.Tests.Tables;

/// <summary>Expected texts follow from the rule of JCGM 100:2008, 7.2.6; the first case is its own example.</summary>
public sealed class RoundingTests
{
    [Theory]
    [InlineData(10.05762, 0.027, "10.058 (u 0.027)")] // JCGM 100:2008, 7.2.6: 10.057 62 ohm with u = 27 milliohm is given as 10.058 ohm.
    [InlineData(4.8712, 0.1093, "4.87 (u 0.11)")]
    [InlineData(4.8712, 0.0996, "4.87 (u 0.10)")]
    [InlineData(0.004999, 0.0012, "0.0050 (u 0.0012)")]
    [InlineData(123456, 2345, "123500 (u 2300)")]
    [InlineData(-0.0004, 0.12, "0.00 (u 0.12)")]
    [InlineData(7, 12, "7 (u 12)")]
    public void A_value_is_shown_to_the_place_of_the_second_digit_of_its_uncertainty(double value, double uncertainty, string expected) =>
        Assert.Equal(expected, Rounding.WithUncertainty(value, uncertainty));

    [Fact]
    public void A_value_without_uncertainty_is_shown_to_five_digits() => Assert.Equal("3.1416", Rounding.Number(Math.PI, 0));

    [Theory]
    [InlineData(4.6533, 5.0912, "4.65 to 5.09")]
    [InlineData(46.533, 50.912, "46.5 to 50.9")]
    [InlineData(-0.5, 12.26, "-0.5 to 12.3")]
    public void An_interval_has_both_ends_to_one_place(double lower, double upper, string expected) => Assert.Equal(expected, Rounding.Interval(lower, upper));

    [Theory]
    [InlineData(0.95, "0.95")]
    [InlineData(0, "0")]
    [InlineData(100, "100")]
    [InlineData(123456.7, "123460")]
    [InlineData(0.00001234567, "0.000012346")]
    [InlineData(double.PositiveInfinity, "∞")]
    public void Digits_are_significant_ones_without_trailing_zeros(double value, string expected) => Assert.Equal(expected, Rounding.Digits(value, 5));

    [Theory]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    public void An_impossible_uncertainty_is_refused(double uncertainty) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Rounding.Number(1, uncertainty));

    [Fact]
    public void The_decimal_sign_is_a_point_whatever_the_culture()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal("4.87 (u 0.11)", Rounding.WithUncertainty(4.8712, 0.1093));
            Assert.Equal("sample,value\nS-1,1.5\n", Table.Of("sample", "value").With("S-1", 1.5).ToCsv());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
