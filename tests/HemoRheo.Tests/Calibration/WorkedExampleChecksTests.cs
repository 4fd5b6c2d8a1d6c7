namespace HemoRheo.Tests.Calibration;

/// <summary>The checks of tests/ReferenceData/worked-example (independent script): mean, scatter and signed contributions of the correction.</summary>
public class WorkedExampleChecksTests
{
    private static readonly InstrumentHistory History = Worked();

    [Fact]
    public void All_eight_checks_make_one_period()
    {
        var period = Assert.Single(History.Periods);
        Assert.Equal(8, period.Checks.Count);
        Assert.Equal("R1/1", period.Key);
        Assert.Empty(History.Findings);
        Assert.All(History.Checks, check => Assert.Equal(CheckOutcome.Passes, check.Outcome));
    }

    [Fact]
    public void The_correction_is_the_mean_of_the_checks_brought_to_the_certificate()
    {
        // Mean of ln(viscosity / 0.00625) + 0.022 (T - 25) over checks.csv, by Python's statistics module.
        Assert.Equal(0.012756809571463513, History.Periods[0].Correction.X, 1e-10);
    }

    [Fact]
    public void Scatter_and_contributions_are_those_of_every_sample_with_the_sign_turned()
    {
        // expected.csv lists them for corrected values, which subtract the correction; c_day is the scatter itself.
        var period = History.Periods[0];
        var rows = ReferenceTable.Read("worked-example", "expected.csv").Where(row => row["value"] == "native").ToArray();
        Assert.Equal(36, rows.Length);
        Assert.All(rows, row =>
        {
            Assert.Equal(row.Number("c_day"), period.Scatter, 1e-7);
            Assert.Equal(-row.Number("c_calibration"), Part(SourceKind.Calibration, "R1/1").Amount, 1e-7);
            Assert.Equal(-row.Number("c_certificate"), Part(SourceKind.Certificate, "oil, lot 7").Amount, 1e-7);
            Assert.Equal(-row.Number("c_fluid_beta"), Part(SourceKind.FluidBeta, "oil").Amount, 1e-7);
            Assert.Equal(row.Number("c_thermometer"), (0.026 * 0.1) - Part(SourceKind.Thermometer, "R1").Amount, 1e-7);
        });
        Assert.Equal(4, period.Correction.Parts.Count);
    }

    [Fact]
    public void The_scatter_is_one_variance_estimate_with_seven_degrees_of_freedom()
    {
        var period = History.Periods[0];
        Assert.Equal(("checks of R1", 7.0), (period.ScatterEstimate, period.ScatterDegreesOfFreedom));
        var calibration = Part(SourceKind.Calibration, "R1/1");
        Assert.Equal(("checks of R1", 7.0), (calibration.Estimate, calibration.DegreesOfFreedom));
        Assert.All(period.Correction.Parts.Where(part => part.Source.Kind != SourceKind.Calibration), part => Assert.Equal(double.PositiveInfinity, part.DegreesOfFreedom));
    }

    private static Contribution Part(SourceKind kind, string of) => History.Periods[0].Correction.Parts.Single(part => part.Source == new Source(kind, of));

    private static InstrumentHistory Worked()
    {
        var checks = ReferenceTable.Read("worked-example", "checks.csv")
            .Select((row, i) => TestStudy.Check(row["day"], TestStudy.Start.AddDays(i), row.Number("viscosity_Pa_s"), row.Number("temperature_C")));
        var study = TestStudy.With(TestStudy.Rheometer with { CheckLimit = 0.06 });
        return Assert.Single(study.CheckInstruments(TestStudy.Readings(study, checks)));
    }
}
