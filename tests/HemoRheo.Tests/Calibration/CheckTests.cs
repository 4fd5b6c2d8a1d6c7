using static HemoRheo.Tests.Calibration.InvestigatedInstrument;

namespace HemoRheo.Tests.Calibration;

public class CheckTests
{
    // Own uncertainty of a check with the oil at 37 degC: certificate 0.002, coefficient 12 * 0.0003, thermometer 0.022 * 0.1, fit about 0.003: 0.0056 in all.
    private static readonly Study Declared = TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.0043 });

    [Fact]
    public void Its_budget_has_every_part_with_its_sign()
    {
        var check = Assert.Single(History(Declared, Check(0, 1)).Checks);
        Assert.Equal(Math.Log(1.01), check.Error.X, 1e-10);
        Assert.Equal(-0.002, Part(check, SourceKind.Certificate, "oil, lot 7").Amount, 1e-12);
        Assert.Equal(0.0036, Part(check, SourceKind.FluidBeta, "oil").Amount, 1e-12);
        Assert.Equal(0.0022, Part(check, SourceKind.Thermometer, "R1").Amount, 1e-12);
        var (fit, day) = (Part(check, SourceKind.Fit, "C0/1/0").Amount, Part(check, SourceKind.Day, "R1/2026-03-02"));
        Assert.InRange(fit, 0.0029, 0.0035);
        Assert.Equal(0.0043 * 0.0043, day.Amount * day.Amount + fit * fit, 1e-12);
        Assert.Equal(("checks of R1", double.PositiveInfinity), (day.Estimate, day.DegreesOfFreedom));
        Assert.Equal(5, check.Error.Parts.Count);
    }

    [Fact]
    public void Scatter_that_the_fits_explain_keeps_a_tenth_of_its_variance_and_a_hundredth_of_its_degrees_of_freedom()
    {
        // Fits alone would scatter by 0.3 %; these two checks scatter by less.
        var history = History(Check(0, 0.4), Check(1, 0.5));
        var (scatter, day) = (history.Periods[0].Scatter, Part(history.Checks[1], SourceKind.Day, "R1/2026-03-03"));
        Assert.Equal(Math.Sqrt(0.1) * scatter, day.Amount, 1e-12);
        Assert.Equal(0.01, day.DegreesOfFreedom, 1e-12);
    }

    [Fact]
    public void Raising_an_input_by_its_standard_uncertainty_moves_the_error_by_its_part()
    {
        var checks = Check(0, 1);
        var error = Error(TestStudy.Plain, checks);
        Assert.Equal(Error(WithOil(TestStudy.Oil with { Certified = new(0.00625 * Math.Exp(0.002)) }), checks) - error, Amount(SourceKind.Certificate), 1e-9);
        Assert.Equal(Error(WithOil(TestStudy.Oil with { PerKelvin = 0.022 + 0.0003 }), checks) - error, Amount(SourceKind.FluidBeta), 1e-9);
        var warmer = checks with { Readings = checks.Readings.Select(reading => reading with { Temperature = reading.Temperature + 0.1 }).ToItems() };
        Assert.Equal(Error(TestStudy.Plain, warmer) - error, Amount(SourceKind.Thermometer), 1e-9);
    }

    [Fact]
    public void The_torque_zero_of_the_day_acts_as_a_stress_added_to_every_reading()
    {
        // Two rates of equal weight: d ln(viscosity) / d stress = (100 + 50) / (100^2 + 50^2) / viscosity = 0.012 / viscosity.
        var study = TestStudy.With(TestStudy.Rheometer with { TorqueZero = 1e-8 }) with { Errors = new(0, 0.001, true, null) };
        var viscosity = TestStudy.Oil.ViscosityAt(Temperature.Body).PascalSeconds;
        var check = Assert.Single(History(study, TestStudy.Check("C0", TestStudy.Start, [TestStudy.Reading(1, 100, 100 * viscosity), TestStudy.Reading(2, 50, 50 * viscosity)])).Checks);
        var expected = 0.012 / viscosity * TestStudy.Cylinders.StressPerTorque() * 1e-8;
        Assert.Equal(expected, Part(check, SourceKind.TorqueZero, "R1/2026-03-02").Amount, 1e-6 * expected);
    }

    [Fact]
    public void Without_a_geometry_the_torque_zero_cannot_be_carried_and_says_so()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { TorqueZero = 1e-8, TorqueFloor = null });
        var check = Assert.Single(History(study, Check(0, 1) with { Geometry = null }).Checks);
        Assert.Contains("check-torque-zero-unknown", check.Findings.Codes());
        Assert.DoesNotContain(check.Error.Parts, part => part.Source.Kind == SourceKind.TorqueZero);
    }

    [Fact]
    public void Water_is_held_against_the_formula_at_its_own_temperature()
    {
        // IAPWS SR6-08 at 293.15 K: 1001.567264603 uPa.s, coefficient 0.0244965941136 1/K (tests/ReferenceData/water).
        var check = Assert.Single(History(TestStudy.Check("W", TestStudy.Start, 1.001567264603e-3, 20, fluid: "water")).Checks);
        Assert.Equal(0, check.Error.X, 1e-9);
        Assert.Equal(-0.005, Part(check, SourceKind.Certificate, "water, IAPWS SR6-08").Amount, 1e-12);
        Assert.Equal(0.00244965941136, Part(check, SourceKind.Thermometer, "R1").Amount, 1e-9);
        Assert.DoesNotContain(check.Error.Parts, part => part.Source.Kind == SourceKind.FluidBeta);
    }

    [Theory]
    [InlineData(0, CheckOutcome.Passes)]
    [InlineData(1.5, CheckOutcome.Passes)]
    [InlineData(-1.5, CheckOutcome.Passes)]
    [InlineData(2.9, CheckOutcome.CannotTell)]
    [InlineData(-3.1, CheckOutcome.CannotTell)]
    [InlineData(4.5, CheckOutcome.Fails)]
    [InlineData(-4.5, CheckOutcome.Fails)]
    public void Passes_fails_or_cannot_tell(double percent, CheckOutcome outcome)
    {
        // Limit 3 %, u about 0.0064 with the declared scatter (0.0043, fit included): decided beyond 1.645 u = 0.0105 from the limit.
        var check = Assert.Single(History(Declared, Check(0, percent)).Checks);
        Assert.Equal(outcome, check.Outcome);
        Assert.Equal(
            outcome switch { CheckOutcome.Fails => ["check-failed"], CheckOutcome.CannotTell => ["check-cannot-tell"], _ => Array.Empty<string>() },
            check.Findings.Codes());
    }

    [Fact]
    public void A_fine_limit_and_a_coarse_certificate_cannot_tell_even_without_an_error()
    {
        var study = WithOil(TestStudy.Oil with { RelativeExpandedUncertainty = 0.04 });
        Assert.Equal(CheckOutcome.CannotTell, Assert.Single(History(study, Check(0, 0)).Checks).Outcome);
    }

    [Fact]
    public void Readings_below_the_torque_floor_take_no_part()
    {
        // A floor of 2 uN.m: with 4.8 mPa.s in the cylinders that is 9.5 1/s; five of the twelve rates lie below, spoiled here.
        var study = TestStudy.With(TestStudy.Rheometer with { TorqueFloor = 2e-6 });
        var clean = Check(0, 1);
        var spoiled = clean with { Readings = clean.Readings.Select(reading => reading.Rate < 9.5 ? reading with { Stress = reading.Stress * 0.8 } : reading).ToItems() };
        var check = Assert.Single(History(study, spoiled).Checks);
        Assert.Equal(4, check.Fit.Curve.SetAside.Count);
        Assert.Equal(Math.Log(1.01), check.Error.X, 1e-10);
        Assert.Equal(4, check.Findings.Count(finding => finding.Code == "torque-below-floor"));
    }

    [Fact]
    public void A_recording_that_gives_no_check_is_a_finding_of_the_history()
    {
        var good = Check(0, 0);
        var history = History(
            good with { Sample = "A", Fluid = "honey" },
            good with { Sample = "B", Fluid = null },
            good with { Sample = "C", Readings = good.Readings.Select(reading => reading with { Temperature = null }).ToItems() },
            TestStudy.Check("D", TestStudy.Start, 0.001, 120, fluid: "water"),
            good with { Sample = "E", Readings = [] });
        Assert.Empty(history.Checks);
        Assert.Equal(["check-fluid-unknown", "check-fluid-unknown", "check-temperature-unusable", "check-temperature-unusable", "check-fit-unusable"], history.Findings.Codes());
        Assert.Equal("Check 'A' names the fluid 'honey'; declared: oil, water.", history.Findings[0].Message);
        Assert.Equal("A", history.Findings[0].Where.Sample);
    }

    [Fact]
    public void An_instrument_that_only_checks_name_has_a_history_of_findings()
    {
        var study = TestStudy.Plain;
        var histories = study.CheckInstruments(TestStudy.Readings(study, [Check(0, 0) with { Instrument = "R9" }]));
        Assert.Equal(["R1", "R9"], histories.Select(history => history.Instrument.Name));
        Assert.Equal("Check 'C0' names the instrument 'R9'; declared: R1.", Assert.Single(histories[1].Findings).Message);
        Assert.Equal(InstrumentStatus.Unknown, histories[1].On(1).Status);
    }

    private static Study WithOil(CalibrationFluid oil) => TestStudy.Plain with { Fluids = [oil, Water.AsFluid()] };

    private static double Error(Study study, Recording check) => Assert.Single(History(study, check).Checks).Error.X;

    private static double Amount(SourceKind kind) => Assert.Single(History(Check(0, 1)).Checks).Error.Part(kind)!.Value;

    private static Contribution Part(InstrumentCheck check, SourceKind kind, string of) => check.Error.Parts.Single(part => part.Source == new Source(kind, of));

    [Fact]
    public void A_check_whose_recording_has_a_fault_is_not_counted_and_says_why()
    {
        var cut = Check(7, 2.9) with { Findings = [ExportFindings.FileCut.At(new("checks/C7.csv", Line: 9), "The block ends in the middle.")] };
        var history = History(Check(0, 0.4), cut, Check(14, 0.6));
        Assert.Equal(["C0", "C14"], history.Checks.Select(check => check.Name));
        var finding = Assert.Single(history.Findings);
        Assert.Equal(("check-recording-faulty", "Check 'C7': The block ends in the middle."), (finding.Code, finding.Message));
    }

    [Fact]
    public void What_was_found_while_a_check_was_read_stays_with_it()
    {
        var odd = ExportFindings.NotANumber.At(new("checks/C0.csv", Line: 9, Point: 3), "A word in a column of numbers.");
        Assert.Contains(odd, Assert.Single(History(Declared, Check(0, 0.4) with { Findings = [odd] }).Checks).Findings);
    }
}
