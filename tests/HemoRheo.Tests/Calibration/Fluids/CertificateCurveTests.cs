namespace HemoRheo.Tests.Calibration.Fluids;

/// <summary>Interpolation of certificates against tests/ReferenceData/fluids (mpmath, scipy).</summary>
public sealed class CertificateCurveTests
{
    public static TheoryData<double, double, double, double, double, double> Walther => [.. ReferenceTable.Read("fluids", "astm-d341.csv")
        .Where(row => row["form"] == "full" && row["kelvin_offset"] == "273.15")
        .Select(row => (row.Number("t1_degC"), row.Number("nu1_mm2_s"), row.Number("t2_degC"), row.Number("nu2_mm2_s"), row.Number("t_degC"), row.Number("nu_mm2_s")))];

    [Theory]
    [MemberData(nameof(Walther))]
    public void ASTM_D341_agrees_with_the_check_point(double t1, double nu1, double t2, double nu2, double t, double expected)
    {
        // With 1000 kg/m3 the numbers of mm2/s and mPa.s are the same.
        var curve = new WaltherCurve([t1 + 273.15, t2 + 273.15], [Math.Log(nu1 / 1000), Math.Log(nu2 / 1000)], [1, 1], new(1000, 0));
        Assert.Equal(expected, 1000 * Math.Exp(curve.LnViscosity(t + 273.15)), 1e-10 * expected);
        Influences(curve.Influence(t + 273.15), t + 273.15, lns => new WaltherCurve([t1 + 273.15, t2 + 273.15], lns, [1, 1], new(1000, 0)), [Math.Log(nu1 / 1000), Math.Log(nu2 / 1000)]);
    }

    public static TheoryData<string, double, double> Vogel => [.. ReferenceTable.Read("fluids", "vft.csv").Where(row => row["points_used"].Length > 0).Select(row => (row["points_used"], row.Number("t_degC"), row.Number("value")))];

    [Theory]
    [MemberData(nameof(Vogel))]
    public void Vogel_Fulcher_Tammann_through_three_points_agrees_with_the_check_point(string points, double t, double expected)
    {
        var given = points.Split("; ").Select(point => point.Split(" C: ").Select(number => double.Parse(number, System.Globalization.CultureInfo.InvariantCulture)).ToArray()).ToArray();
        double[] kelvins = [.. given.Select(point => point[0] + 273.15)];
        double[] logarithms = [.. given.Select(point => Math.Log(point[1] / 1000))];
        var curve = VogelCurve.Free(kelvins, logarithms, [1, 1, 1])!;
        Assert.Equal(expected, 1000 * Math.Exp(curve.LnViscosity(t + 273.15)), 1e-10 * expected);
        Influences(curve.Influence(t + 273.15), t + 273.15, lns => VogelCurve.Free(kelvins, lns, [1, 1, 1])!, logarithms);
    }

    [Fact]
    public void Through_five_points_it_is_the_least_squares_curve_of_scipy_with_its_influences()
    {
        double[] kelvins = [293.15, 298.15, 310.15, 333.15, 353.15];
        double[] logarithms = [.. new[] { 86.2778573777, 65.4201497379, 36.4678697471, 15.1858928278, 8.53321469154 }.Select(nu => Math.Log(nu / 1000))];
        var curve = VogelCurve.Free(kelvins, logarithms, [1, 1, 1, 1, 1])!;
        Assert.All(ReferenceTable.Read("fluids", "vft-least-squares.csv"), row =>
        {
            var t = row.Number("t_degC") + 273.15;
            Assert.Equal(row.Number("viscosity_mPa_s"), 1000 * Math.Exp(curve.LnViscosity(t)), 1e-7 * row.Number("viscosity_mPa_s"));
            var expected = new[] { "20", "25", "37", "60", "80" }.Select(at => row.Number("influence_" + at)).ToArray();
            Assert.All(curve.Influence(t).Zip(expected), pair => Assert.Equal(pair.Second, pair.First, 0.005));
        });
    }

    [Fact]
    public void Rows_that_bend_the_wrong_way_follow_no_Vogel_curve() =>
        Assert.Null(VogelCurve.Free([293.15, 313.15, 333.15], [Math.Log(0.010), Math.Log(0.009), Math.Log(0.005)], [1, 1, 1]));

    [Fact]
    public void The_viscosity_of_a_fluid_has_the_certificate_in_full_and_the_interpolation_only_between_rows()
    {
        // Values of vft.csv and astm-d341.csv: through 20/40/80 degC the two laws differ by 65.35373154 against 65.42014974 mm2/s at 25 degC.
        var fluid = Oil(CertificateInterpolation.Vft);
        var at = fluid.LnViscosityAt(new(25));
        Assert.Equal(Math.Log(0.06535373154332), at.X, 1e-9);
        Assert.Equal(0.002, at.Part(SourceKind.Certificate)!.Value, 1e-9);
        Assert.Equal(Math.Log(65.4201497379 / 65.35373154332) / Math.Sqrt(3), at.Part(SourceKind.FluidBeta)!.Value, 1e-8);
        Assert.Equal(0, fluid.LnViscosityAt(new(40)).Part(SourceKind.FluidBeta)!.Value, 1e-9);
        var walther = Oil(CertificateInterpolation.AstmD341).LnViscosityAt(new(25));
        Assert.Equal(Math.Log(0.0654201497379), walther.X, 1e-9);
        Assert.Equal(at.Part(SourceKind.FluidBeta)!.Value, walther.Part(SourceKind.FluidBeta)!.Value, 1e-8);
    }

    [Fact]
    public void Its_temperature_coefficient_is_the_slope_of_the_curve_with_its_uncertainty()
    {
        // b / (T - T0)^2 with the constants of vft.csv.
        var coefficient = Oil(CertificateInterpolation.Vft).TemperatureCoefficientAt(new(25));
        var expected = 830.7615370452 / Math.Pow(298.15 - 173.3348402779, 2);
        Assert.Equal(expected, coefficient.X, 1e-8);
        Assert.Equal(expected, Oil(CertificateInterpolation.Vft).PerKelvinAt(new(25)), 1e-8);
        // Rows 20 K apart known to 0.2 %: about 0.002 * sqrt(2) / 20 = 0.00014, more near the end of the range.
        Assert.InRange(coefficient.Part(SourceKind.Certificate)!.Value, 0.00014, 0.0004);
        Assert.InRange(coefficient.Part(SourceKind.FluidBeta)!.Value, 0, 0.0004);
    }

    [Fact]
    public void Nothing_is_taken_from_outside_the_rows()
    {
        var fluid = Oil(CertificateInterpolation.Vft);
        Assert.Equal(new Interval(20, 80), fluid.ValidTemperatures());
        foreach (var outside in new[] { 19.99, 80.01 }) Assert.Contains("nothing is taken from outside", Assert.Throws<ArgumentOutOfRangeException>(() => fluid.ViscosityAt(new(outside))).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Density_is_the_line_through_the_rows()
    {
        var certificate = Oil(CertificateInterpolation.AstmD341).Certificate!;
        var rows = certificate.Rows.Select((row, i) => row with { Density = 860 - 10 * i }).ToItems();
        // Rows at 20, 40, 80 degC with 860, 850, 840: mean 46.667 and 850, slope -0.3214 by hand; at 40 degC 852.143.
        Assert.Equal(852.142857, (Oil(CertificateInterpolation.AstmD341) with { Certificate = certificate with { Rows = rows } }).DensityAt(new(40))!.Value, 1e-5);
    }

    internal static CalibrationFluid Oil(CertificateInterpolation interpolation)
    {
        CertificateRow Row(double t, double viscosity) => new(new(t), new(viscosity / 1000), 0.004, 1000);
        var certificate = new Certificate("oil", "lot 9", new(2026, 1, 1), new(2026, 12, 31), 2, interpolation, [Row(20, 86.27785737773), Row(40, 32), Row(80, 8.533214691536)], "oil.toml", "");
        return new("oil", "lot 9", new(20), new(0.08627785737773), 0.004, 2, 0.0386, 0, false) { Certificate = certificate };
    }

    private static void Influences(double[] influences, double kelvins, Func<double[], IViscosityCurve> refit, double[] logarithms)
    {
        for (var i = 0; i < logarithms.Length; i++)
        {
            double At(double step) => refit([.. logarithms.Select((ln, k) => k == i ? ln + step : ln)]).LnViscosity(kelvins);
            Assert.Equal((At(1e-5) - At(-1e-5)) / 2e-5, influences[i], 1e-5);
        }
    }
}
