using static HemoRheo.Tests.Calibration.InvestigatedInstrument;

namespace HemoRheo.Tests.Calibration.Fluids;

/// <summary>Checks with each kind of fluid: budget, range, certificate, bath, laminar flow, export of another geometry, two at one time.</summary>
public sealed class FluidCheckTests
{
    private static readonly CalibrationFluid Certified = CertificateCurveTests.Oil(CertificateInterpolation.Vft);

    // 36.45305698548 mm2/s at 37 degC with 1000 kg/m3 (tests/ReferenceData/fluids/vft.csv).
    private const double At37 = 0.03645305698548;

    [Fact]
    public void A_certificate_file_gives_certificate_and_interpolation_to_the_budget()
    {
        var check = Checked(Certified, TestStudy.Check("C", TestStudy.Start, At37 * 1.01));
        Assert.Equal(Math.Log(1.01), check.Error.X, 1e-9);
        Assert.Equal(-0.002, Part(check, SourceKind.Certificate, "oil, lot 9"), 1e-9);
        // D341 gives 36.46786975 at 37 degC.
        Assert.Equal(-Math.Log(36.4678697471 / 36.45305698548) / Math.Sqrt(3), Part(check, SourceKind.FluidBeta, "oil"), 1e-8);
        Assert.Equal(0.1 * 830.7615370452 / Math.Pow(310.15 - 173.3348402779, 2), Part(check, SourceKind.Thermometer, "R1"), 1e-8);
    }

    [Fact]
    public void A_mixture_carries_its_bound_and_its_mass_fraction()
    {
        // Cheng at 37 degC and 50 %, tests/ReferenceData/fluids/glycerol-cheng.csv.
        var viscosity = ReferenceTable.Read("fluids", "glycerol-cheng.csv").Single(row => row["t_degC"] == "37" && row["mass_fraction"] == "0.5").Number("mu_mixture_mPa_s") / 1000;
        var at = new Temperature(20);
        var fluid = new CalibrationFluid("oil", "batch", at, GlycerolWater.ViscosityAt(0.5, at), GlycerolWater.Bound, GlycerolWater.BoundFactor, 0.03, 0, false) { Glycerol = new(0.5, 0.001) };
        var check = Checked(fluid, TestStudy.Check("C", TestStudy.Start, viscosity));
        Assert.Equal(0, check.Error.X, 1e-9);
        Assert.Equal(-0.03 / Math.Sqrt(3), Part(check, SourceKind.Certificate, "oil, batch"), 1e-12);
        Assert.Equal(-0.001 * GlycerolWater.PerMassFractionAt(0.5, Temperature.Body), Part(check, SourceKind.Certificate, "mass fraction of oil, batch"), 1e-12);
        Assert.DoesNotContain(check.Error.Parts, part => part.Source.Kind == SourceKind.FluidBeta);
    }

    [Fact]
    public void A_temperature_outside_the_certificate_gives_no_value()
    {
        var history = History(With(Certified), TestStudy.Check("C", TestStudy.Start, At37, temperature: 81));
        Assert.Empty(history.Checks);
        Assert.Equal(("check-temperature-unusable", "Check 'C' was taken at 81 degC; the viscosity of 'oil' is known from 20 to 80 degC only."), (Assert.Single(history.Findings).Code, history.Findings[0].Message));
    }

    [Theory]
    [InlineData(2026, 3, 1, true)]
    [InlineData(2026, 3, 2, false)]
    public void An_expired_certificate_is_a_finding_from_the_day_after(int year, int month, int day, bool expired)
    {
        var fluid = Certified with { Certificate = Certified.Certificate! with { ValidUntil = new(year, month, day) } };
        var check = Checked(fluid, TestStudy.Check("C", TestStudy.Start, At37));
        Assert.Equal(expired, check.Findings.Codes().Contains("certificate-not-valid"));
        Assert.Equal(CheckOutcome.Passes, check.Outcome);
    }

    [Fact]
    public void Rows_off_their_curve_and_rows_that_follow_none_are_findings()
    {
        var rows = Certified.Certificate!.Rows;
        // A fourth row 2 % off, of which the curve takes up a part.
        var off = Certified with { Certificate = Certified.Certificate with { Rows = [rows[0], rows[1], new(new(60), new(0.0152129 * 1.02), 0.004, 1000), rows[2]] } };
        Assert.Contains("certificate-row-off-curve", Checked(off, TestStudy.Check("C", TestStudy.Start, At37)).Findings.Codes());
        var bent = Certified with { Certificate = Certified.Certificate with { Rows = [rows[0], rows[1] with { Viscosity = new(0.080) }, rows[2]] } };
        Assert.Equal("certificate-rows-follow-no-curve", Assert.Single(History(With(bent), TestStudy.Check("C", TestStudy.Start, At37)).Findings).Code);
    }

    [Theory]
    [InlineData(37.4, false)]
    [InlineData(37.6, true)]
    [InlineData(36.4, true)]
    public void A_fluid_warmer_or_colder_than_its_bath_is_a_finding(double temperature, bool odd)
    {
        var fluid = TestStudy.Oil with { Bath = Temperature.Body };
        Assert.Equal(odd, Checked(fluid, TestStudy.Check("C", TestStudy.Start, 0.0048, temperature)).Findings.Codes().Contains("check-bath-differs"));
    }

    [Fact]
    public void Water_beyond_laminar_flow_is_set_aside_and_does_not_fail_the_instrument()
    {
        // Vortices set in at Re 148.51 (taylor-couette.csv, 1/1.0847): with water of 20 degC at 11.28 rad/s, 138.8 1/s. Readings above are 30 % too large.
        var check = Checked(Water.AsFluid("oil"), Turbulent(1.001567264603e-3, 20), TestStudy.Cylinders with { Turning = TurningCylinder.Inner });
        Assert.Equal(CheckOutcome.Passes, check.Outcome);
        Assert.Equal(0, check.Error.X, 1e-9);
        Assert.Equal([300, 200], check.Fit.Curve.SetAside.Select(aside => aside.Point.Rate.ReciprocalSeconds));
        Assert.Equal(2, check.Findings.Count(finding => finding.Code == "check-flow-not-laminar"));
        Assert.DoesNotContain("check-turning-unknown", check.Findings.Codes());
        // Re = 998.2065 * w * 0.0125 * 0.00105875 / 0.001001567, w = 300 * 0.17657409 / 2.17657409 = 24.3374: 321.01 by hand.
        Assert.Equal(321.01, check.Findings.First(finding => finding.Code == "check-flow-not-laminar").Observed!.Value, 0.01);
    }

    [Fact]
    public void Which_cylinder_turns_decides_and_is_asked_for()
    {
        var undeclared = Checked(Water.AsFluid("oil"), Turbulent(1.001567264603e-3, 20));
        Assert.Equal((2, 1), (undeclared.Fit.Curve.SetAside.Count, undeclared.Findings.Count(finding => finding.Code == "check-turning-unknown")));
        var outer = Checked(Water.AsFluid("oil"), Turbulent(1.001567264603e-3, 20), TestStudy.Cylinders with { Turning = TurningCylinder.Outer });
        Assert.Empty(outer.Fit.Curve.SetAside);
        Assert.Equal(CheckOutcome.Fails, outer.Outcome);
    }

    [Fact]
    public void A_thin_fluid_without_a_density_is_asked_for_it_and_a_thick_one_is_not()
    {
        var thin = TestStudy.Oil with { Certified = new(0.001), At = new(37) };
        Assert.Contains("check-density-unknown", Checked(thin, TestStudy.Check("C", TestStudy.Start, 0.001)).Findings.Codes());
        Assert.Contains("check-flow-not-laminar", Checked(thin with { Density = 1000 }, TestStudy.Check("C", TestStudy.Start, 0.001)).Findings.Codes());
        Assert.DoesNotContain("check-density-unknown", Checked(TestStudy.Oil, TestStudy.Check("C", TestStudy.Start, 0.0048)).Findings.Codes());
    }

    [Fact]
    public void An_export_made_with_another_geometry_than_it_names_is_not_counted()
    {
        // The narrow-gap rate of the same cylinders is 5 % below the representative one and is let pass; a gap of twice the width halves the rate.
        Reading Turned(int i, double rate, double exported) => TestStudy.Turned(i + 1, rate, rate * 0.0048) with { Rate = exported, Stress = rate * 0.0048 };
        Recording Of(double factor) => TestStudy.Check("C", TestStudy.Start, TestStudy.Rates.Select((rate, i) => Turned(i, rate, rate * factor)));
        Assert.Single(History(Of(0.95)).Checks);
        var history = History(Of(0.5));
        Assert.Empty(history.Checks);
        Assert.Equal(("check-geometry-contradicted", "Check 'C' names 'cylinders', and its exported shear rate is 0.5 times what that geometry gives."), (Assert.Single(history.Findings).Code, history.Findings[0].Message));
    }

    [Fact]
    public void A_geometry_that_is_not_declared_is_named_as_the_reason()
    {
        var finding = Assert.Single(History(Check(0, 0) with { Geometry = "cone" }).Findings);
        Assert.Equal("check-fit-unusable", finding.Code);
        Assert.Contains("undeclared geometry 'cone'", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Two_checks_at_one_time_are_both_counted_and_named()
    {
        var history = History(Check(0, 0.1, name: "A"), Check(0, 0.3, name: "B"));
        Assert.Equal(2, history.Checks.Count);
        Assert.Equal("Checks 'A' and 'B' of 'R1' start at 2026-03-02 09:00:00 +01:00.", Assert.Single(history.Findings, finding => finding.Code == "checks-at-one-time").Message);
    }

    private static Recording Turbulent(double viscosity, double temperature) =>
        TestStudy.Check("W", TestStudy.Start, TestStudy.Rates.Select((rate, i) => TestStudy.Reading(i + 1, rate, rate * viscosity * (rate > 150 ? 1.3 : 1), temperature)));

    private static InstrumentCheck Checked(CalibrationFluid fluid, Recording check, Geometry? geometry = null) =>
        Assert.Single(History(With(fluid) with { Geometries = [geometry ?? TestStudy.Cylinders] }, check).Checks);

    private static Study With(CalibrationFluid fluid) => TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.0043 }) with { Fluids = [fluid] };

    private static double Part(InstrumentCheck check, SourceKind kind, string of) => check.Error.Parts.Single(part => part.Source == new Source(kind, of)).Amount;
}
