using System.Globalization;

namespace HemoRheo.Tests.Calibration;

/// <summary>Held against tests/ReferenceData/water: check states of IAPWS SR6-08 table 8 (found), printed tables of 2008 and 1978 (found), mpmath.</summary>
public class WaterTests
{
    [Theory]
    [InlineData(260, 3058.36075)]
    [InlineData(298.15, 889.996774)]
    [InlineData(375, 276.207245)]
    public void Gives_the_published_check_states(double kelvins, double micropascalSeconds) =>
        Assert.Equal(micropascalSeconds, 1e6 * Water.ViscosityAt(Temperature.FromKelvins(kelvins)).PascalSeconds, 5e-9 * micropascalSeconds);

    [Fact]
    public void Agrees_with_every_computed_check_point()
    {
        var rows = ReferenceTable.Read("water", "water-check-points.csv");
        Assert.Equal(11, rows.Count);
        Assert.All(rows, row =>
        {
            var expected = row.Number("viscosity_uPa_s");
            Assert.Equal(expected, 1e6 * Water.ViscosityAt(Temperature.FromKelvins(row.Number("T_K"))).PascalSeconds, 1e-11 * expected);
        });
    }

    [Fact]
    public void Agrees_with_the_printed_tables_to_their_last_digit()
    {
        var rows = ReferenceTable.Read("water", "water-0.1MPa.csv");
        Assert.Equal(31, rows.Count);
        foreach (var row in rows)
        {
            var shown = Water.ViscosityAt(new(row.Number("t_degC"))).MillipascalSeconds;
            Assert.Equal(row.Number("viscosity_mPa_s_SR6-08_computed"), shown, 1e-9);
            if (row["viscosity_mPa_s_IAPWS2008_table_found"] is { Length: > 0 } printed)
            {
                Assert.Equal(double.Parse(printed, CultureInfo.InvariantCulture), shown, 1.0e-4);
            }
        }
    }

    [Fact]
    public void Its_density_agrees_with_the_published_check_states_and_every_computed_point()
    {
        Assert.All(ReferenceTable.Read("water", "water-check-points.csv"), row =>
        {
            var (expected, density) = (row.Number("density_kg_m3"), Water.DensityAt(Temperature.FromKelvins(row.Number("T_K"))));
            Assert.Equal(expected, density, 1e-11 * expected);
            if (row["density_kg_m3_table8_found"].Length > 0) Assert.Equal(row.Number("density_kg_m3_table8_found"), density, 5e-7);
        });
    }

    [Fact]
    public void Its_temperature_coefficient_is_the_slope_of_its_logarithm()
    {
        var rows = ReferenceTable.Read("water", "water-coefficient.csv");
        Assert.Equal(11, rows.Count);
        Assert.All(rows, row => Assert.Equal(row.Number("per_K"), Water.PerKelvinAt(Temperature.FromKelvins(row.Number("T_K"))), 1e-10));
    }

    [Theory]
    [InlineData(253.14)]
    [InlineData(383.16)]
    public void Is_refused_outside_its_range(double kelvins) =>
        Assert.Contains("not at", Assert.Throws<ArgumentOutOfRangeException>(() => Water.ViscosityAt(Temperature.FromKelvins(kelvins))).Message, StringComparison.Ordinal);

    [Fact]
    public void As_a_fluid_it_ignores_what_is_certified()
    {
        var water = Water.AsFluid() with { Certified = new(1) };
        Assert.Equal(0.00069130342038522, water.ViscosityAt(Temperature.Body).PascalSeconds, 1e-16);
    }

    [Fact]
    public void An_oil_follows_its_certificate()
    {
        // 6.25 mPa.s at 25 degC falling by 2.2 % a kelvin: 6.25 exp(-0.264) at 37 degC, by hand 4.79984.
        Assert.Equal(4.79984, TestStudy.Oil.ViscosityAt(Temperature.Body).MillipascalSeconds, 1e-5);
    }
}
