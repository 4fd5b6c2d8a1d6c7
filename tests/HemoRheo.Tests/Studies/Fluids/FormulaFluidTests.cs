using System.Globalization;

namespace HemoRheo.Tests.Studies.Fluids;

/// <summary>Glycerol and water, and sucrose, against tests/ReferenceData/fluids.</summary>
public sealed class FormulaFluidTests
{
    [Fact]
    public void Glycerol_and_water_agree_with_every_check_point_of_Cheng()
    {
        var rows = ReferenceTable.Read("fluids", "glycerol-cheng.csv");
        Assert.Equal(66, rows.Count);
        Assert.All(rows, row => Near(row.Number("mu_mixture_mPa_s"), GlycerolWater.ViscosityAt(row.Number("mass_fraction"), new(row.Number("t_degC"))).MillipascalSeconds, 2e-11));
    }

    [Fact]
    public void Glycerol_and_water_lie_within_3_percent_of_the_measured_table_and_not_within_2()
    {
        var rows = ReferenceTable.Read("fluids", "glycerol-water-tables.csv");
        Assert.Equal(30, rows.Count);
        var departures = rows.Select(row => GlycerolWater.ViscosityAt(row.Number("glycerol_mass_percent") / 100, new(row.Number("t_degC"))).MillipascalSeconds / row.Number("viscosity_mPa_s_SegurOberstar1951_found") - 1).ToArray();
        Assert.All(departures, departure => Assert.InRange(departure, -GlycerolWater.Bound, GlycerolWater.Bound));
        Assert.Contains(departures, departure => Math.Abs(departure) > 0.02);
    }

    [Fact]
    public void Densities_agree_with_the_measured_table_to_5_in_ten_thousand() => Assert.All(
        ReferenceTable.Read("fluids", "glycerol-water-tables.csv"),
        row =>
        {
            var density = GlycerolWater.DensityAt(row.Number("glycerol_mass_percent") / 100, new(row.Number("t_degC"))) / 1000;
            Near(row.Number("density_g_mL_VolkKaehler2018_computed"), density, 6e-6);
            if (row["density_g_mL_BosartSnoddy1927_found"] is { Length: > 0 } printed) Near(double.Parse(printed, CultureInfo.InvariantCulture), density, 5e-4);
        });

    [Fact]
    public void Slopes_of_a_mixture_are_those_between_neighboring_check_points()
    {
        // ln of 30, 37 and 40 degC at 50 %, and of 40, 50 and 60 % at 37 degC, differentiated through three points by hand.
        double Ln(string t, string c) => Math.Log(ReferenceTable.Read("fluids", "glycerol-cheng.csv").Single(row => row["t_degC"] == t && row["mass_fraction"] == c).Number("mu_mixture_mPa_s"));
        var (a, b) = ((Ln("37", "0.5") - Ln("30", "0.5")) / 7, (Ln("40", "0.5") - Ln("37", "0.5")) / 3);
        Near(-(a * 3 + b * 7) / 10, GlycerolWater.PerKelvinAt(0.5, new(37)), 1e-3);
        Near((Ln("37", "0.6") - Ln("37", "0.4")) / 0.2, GlycerolWater.PerMassFractionAt(0.5, new(37)), 0.03);
    }

    [Theory]
    [InlineData(20)]
    [InlineData(25)]
    [InlineData(30)]
    [InlineData(37)]
    [InlineData(40)]
    public void Sucrose_agrees_with_the_equation_and_within_5_percent_with_another(double t)
    {
        var row = ReferenceTable.Read("fluids", "sucrose.csv").Single(row => row.Number("t_degC") == t);
        var viscosity = Sucrose.ViscosityAt(new(t)).MillipascalSeconds;
        Near(row.Number("eta_39.99pct_mPa_s_BinghamJackson1918_eq"), viscosity, 2e-7);
        Near(row.Number("eta_40pct_Genotelle"), viscosity, Sucrose.Bound);
    }

    [Fact]
    public void The_slope_of_sucrose_is_that_of_its_equation()
    {
        // dt/df = 0.597 + 1438.6 / (f + 20)^2 and viscosity 1/f: slope 1 / (f dt/df), with f = 1000/6.197883 cP at 20 degC from sucrose.csv: 1 / (16.1345 * 1.69877).
        var f = 100 / 6.197883;
        Near(1 / (f * (0.597 + 1438.6 / ((f + 20) * (f + 20)))), Sucrose.PerKelvinAt(new(20)), 1e-6);
    }

    [Fact]
    public void Outside_their_ranges_they_are_refused_in_words()
    {
        Assert.Contains("20 to 40 degC", Assert.Throws<ArgumentOutOfRangeException>(() => Sucrose.ViscosityAt(new(15))).Message, StringComparison.Ordinal);
        Assert.Contains("0 to 100 degC", Assert.Throws<ArgumentOutOfRangeException>(() => GlycerolWater.ViscosityAt(0.5, new(101))).Message, StringComparison.Ordinal);
        Assert.Contains("from 0 to 1", Assert.Throws<ArgumentOutOfRangeException>(() => GlycerolWater.ViscosityAt(50, new(20))).Message, StringComparison.Ordinal);
    }

    private static void Near(double expected, double actual, double relative) => Assert.InRange(actual, expected - relative * Math.Abs(expected), expected + relative * Math.Abs(expected));
}
