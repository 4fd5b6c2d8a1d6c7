namespace HemoRheo.Tests.Rheometry;

/// <summary>Held against tests/ReferenceData/rheometry/taylor-couette.csv (collocation, numpy and scipy).</summary>
public class TaylorCouetteTests
{
    public static TheoryData<double, double> CheckPoints => [.. ReferenceTable.Read("rheometry", "taylor-couette.csv").Select(row => (row.Number("radius_ratio"), row.Number("critical_reynolds")))];

    [Theory]
    [MemberData(nameof(CheckPoints))]
    public void The_critical_Reynolds_number_is_that_of_the_stability_problem_also_between_the_tabulated_ratios(double ratio, double expected) =>
        Assert.Equal(expected, Cylinders(ratio).CriticalReynoldsNumber()!.Value, 0.0015 * expected);

    [Theory]
    [InlineData(0.5, 68.19)]
    [InlineData(0.75, 85.78)]
    [InlineData(0.95, 184.99)]
    public void At_tabulated_ratios_it_is_the_printed_value(double ratio, double printed) =>
        Assert.Equal(printed, Cylinders(ratio).CriticalReynoldsNumber()!.Value, 0.005);

    [Fact]
    public void In_a_vanishing_gap_it_tends_to_the_Taylor_number_of_1695()
    {
        // Taylor 1923: Re^2 gap / radius = 1695.
        var reynolds = Cylinders(0.9999).CriticalReynoldsNumber()!.Value;
        Assert.Equal(1695, reynolds * reynolds * (1 / 0.9999 - 1), 0.5);
    }

    [Fact]
    public void It_is_not_known_in_gaps_wider_than_the_inner_radius() => Assert.Null(Cylinders(0.49).CriticalReynoldsNumber());

    [Fact]
    public void The_Reynolds_number_is_density_times_speed_radius_and_gap_over_viscosity()
    {
        // Water at 20 degC, 998.2 kg/m3 and 1.0016 mPa.s, 10 rad/s, 12.5 mm and 1 mm: 124.58 by hand.
        Assert.Equal(124.5757, new Geometry("g", 0.0125, 0.0135, 0.03, 1).ReynoldsNumber(10, Viscosity.FromMillipascalSeconds(1.0016), 998.2), 1e-3);
    }

    private static Geometry Cylinders(double ratio) => new("cylinders", 0.0125, 0.0125 / ratio, 0.0375, 1.10);
}
