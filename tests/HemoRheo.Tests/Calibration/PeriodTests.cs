using static HemoRheo.Tests.Calibration.InvestigatedInstrument;

namespace HemoRheo.Tests.Calibration;

public class PeriodTests
{
    [Fact]
    public void A_failed_check_ends_the_period_and_is_never_averaged()
    {
        var history = History(Check(0, 0.4), Check(7, 0.6), Check(14, 9), Check(21, -0.3), Check(28, -0.1));
        Assert.Equal([["C0", "C7"], ["C21", "C28"]], history.Periods.Select(period => period.Checks.Select(check => check.Name).ToArray()));
        Assert.Equal([TestStudy.Start.AddDays(14), null], history.Periods.Select(period => period.Until));
        Assert.Equal((Math.Log(1.004) + Math.Log(1.006)) / 2, history.Periods[0].Correction.X, 1e-10);
        Assert.Equal((Math.Log(0.997) + Math.Log(0.999)) / 2, history.Periods[1].Correction.X, 1e-10);
        Assert.Equal(["R1/1", "R1/2"], history.Periods.Select(period => period.Key));
    }

    [Fact]
    public void The_scatter_is_pooled_over_periods_about_their_own_means()
    {
        // Halves of the differences: ln(1.006/1.004)/2 twice and ln(0.999/0.997)/2 twice, two degrees of freedom.
        var history = History(Check(0, 0.4), Check(7, 0.6), Check(14, 9), Check(21, -0.3), Check(28, -0.1));
        var (a, b) = (Math.Log(1.006 / 1.004), Math.Log(0.999 / 0.997));
        Assert.All(history.Periods, period => Assert.Equal((Math.Sqrt((a * a + b * b) / 4), 2), (Math.Round(period.Scatter, 12), period.ScatterDegreesOfFreedom), (x, y) => Math.Abs(x.Item1 - y.Item1) < 1e-9 && x.Item2 == y.Item2));
        var calibration = history.Periods[1].Correction.Parts.Single(part => part.Source.Kind == SourceKind.Calibration);
        Assert.Equal(history.Periods[1].Scatter / Math.Sqrt(2), calibration.Amount, 1e-12);
        Assert.Equal(("R1/2", "checks of R1", 2.0), (calibration.Source.Of, calibration.Estimate, calibration.DegreesOfFreedom));
    }

    [Fact]
    public void An_adjustment_starts_a_new_period()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { Adjusted = [TestStudy.Start.AddDays(10)] });
        var history = History(study, Check(0, 0.4), Check(7, 0.6), Check(14, 1.5), Check(21, 1.7));
        Assert.Equal([2, 2], history.Periods.Select(period => period.Checks.Count));
        Assert.Equal(TestStudy.Start.AddDays(10), history.Periods[0].Until);
    }

    [Fact]
    public void A_check_that_cannot_tell_belongs_to_its_period()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { CheckLimit = 0.02 });
        var history = History(study, Check(0, 1.0), Check(7, 1.9), Check(14, 1.0));
        Assert.Equal(CheckOutcome.CannotTell, history.Checks[1].Outcome);
        Assert.Equal(3, Assert.Single(history.Periods).Checks.Count);
    }

    [Fact]
    public void Two_fillings_are_two_checks_and_a_filling_read_again_is_one()
    {
        var again = Check(0, 0.8) with { StartedAt = TestStudy.Start.AddMinutes(20) };
        var history = History(Check(0, 0.4), again, Check(0, 0.2, loading: 2));
        Assert.Equal(["C0", "C0/2"], history.Checks.Select(check => check.Name));
        Assert.Equal(24, history.Checks[0].Fit.Curve.Points.Count);
        Assert.Equal(1, history.Periods[0].ScatterDegreesOfFreedom);
        Assert.InRange(history.Checks[0].Error.X, Math.Log(1.0059), Math.Log(1.0061));
        var finding = Assert.Single(history.Findings);
        Assert.Equal(("check-one-filling", "2 recordings of filling 1 of check 'C0' count as one."), (finding.Code, finding.Message));
    }

    [Fact]
    public void One_name_used_on_two_days_is_two_fillings()
    {
        var history = History(Check(0, 0.4, name: "weekly"), Check(7, 0.6, name: "weekly"));
        Assert.Equal(2, history.Checks.Count);
        Assert.Empty(history.Findings);
    }

    [Fact]
    public void Several_fluids_share_a_period_source_by_source()
    {
        // Water at 20 degC and the oil at 37 degC, half each.
        var history = History(Check(0, 0.4), TestStudy.Check("W", TestStudy.Start.AddDays(1), 1.001567264603e-3 * 1.002, 20, fluid: "water"));
        var correction = Assert.Single(history.Periods).Correction;
        Assert.Equal((Math.Log(1.004) + Math.Log(1.002)) / 2, correction.X, 1e-9);
        Assert.Equal(-0.001, Amount(correction, SourceKind.Certificate, "oil, lot 7"), 1e-12);
        Assert.Equal(-0.0025, Amount(correction, SourceKind.Certificate, "water, IAPWS SR6-08"), 1e-12);
        Assert.Equal(0.0018, Amount(correction, SourceKind.FluidBeta, "oil"), 1e-12);
        Assert.Equal((0.0022 + 0.00244965941136) / 2, Amount(correction, SourceKind.Thermometer, "R1"), 1e-9);
    }

    [Fact]
    public void The_torque_zero_of_each_day_is_averaged_with_its_check_and_two_fillings_of_a_day_share_it()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { TorqueZero = 1e-8 });
        var history = History(study, Check(0, 0.4), Check(0, 0.5, loading: 2), Check(7, 0.6));
        var own = history.Checks.Select(check => check.Error.Part(SourceKind.TorqueZero)!.Value).ToArray();
        var correction = Assert.Single(history.Periods).Correction;
        Assert.Equal((own[0] + own[1]) / 3, Amount(correction, SourceKind.TorqueZero, "R1/2026-03-02"), 1e-12);
        Assert.Equal(own[2] / 3, Amount(correction, SourceKind.TorqueZero, "R1/2026-03-09"), 1e-12);
    }

    [Fact]
    public void One_check_uses_the_declared_scatter_and_says_so()
    {
        var history = History(TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.004 }), Check(0, 0.4));
        var period = Assert.Single(history.Periods);
        Assert.Equal((0.004, double.PositiveInfinity), (period.Scatter, period.ScatterDegreesOfFreedom));
        Assert.Equal(0.004, Amount(period.Correction, SourceKind.Calibration, "R1/1"), 1e-15);
        Assert.Equal(["check-scatter-declared"], history.Findings.Codes());
    }

    [Fact]
    public void One_check_and_no_declared_scatter_is_a_fault_and_gives_no_correction()
    {
        var history = History(Check(0, 0.4));
        Assert.Empty(history.Periods);
        var finding = Assert.Single(history.Findings);
        Assert.Equal(("check-scatter-unknown", Severity.Fault), (finding.Code, finding.Severity));
        var standing = history.On(1);
        Assert.Equal(InstrumentStatus.InOrder, standing.Status);
        Assert.Null(standing.Period);
        Assert.Equal(finding, Assert.Single(standing.Findings));
    }

    [Fact]
    public void Declared_scatter_gives_way_to_the_checks_own()
    {
        var history = History(TestStudy.With(TestStudy.Rheometer with { CheckScatter = 0.004 }), Check(0, 0.4), Check(7, 0.6));
        Assert.Equal(Math.Log(1.006 / 1.004) / Math.Sqrt(2), history.Periods[0].Scatter, 1e-10);
        Assert.Empty(history.Findings);
    }

    [Fact]
    public void Periods_and_checks_are_shown_in_one_line()
    {
        var history = History(Check(0, 0.4), Check(7, 0.6), Check(14, 9), Check(21, -0.3));
        Assert.Equal("R1: 4 checks, 2 periods, 0 findings", history.ToString());
        Assert.Equal("period R1/1, from 2026-03-02 to 2026-03-16: 2 checks, reads +0.50 %", history.Periods[0].ToString());
        Assert.Equal("period R1/2, from 2026-03-23: 1 checks, reads -0.30 %", history.Periods[1].ToString());
        Assert.Equal("check C14 of R1, 2026-03-16: +9.00 %, fails", history.Checks[2].ToString());
    }

    private static double Amount(Value value, SourceKind kind, string of) => value.Parts.Single(part => part.Source == new Source(kind, of)).Amount;
}
