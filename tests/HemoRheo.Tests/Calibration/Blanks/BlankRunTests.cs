using static HemoRheo.Tests.Calibration.Blanks.EmptyGap;

namespace HemoRheo.Tests.Calibration.Blanks;

/// <summary>What a recording of an empty gap gives, and what is wrong with it.</summary>
public sealed class BlankRunTests
{
    private static readonly Study Study = TestStudy.With(TestStudy.Rheometer with { TorqueFloor = 2e-8 });

    [Fact]
    public void Zero_and_noise_are_mean_and_scatter_and_the_uncertainty_is_that_of_the_mean()
    {
        // Deviation of 12 torques of +-3 nN.m about their mean: 3 sqrt(12 / 11).
        var run = Read(Study, Run("B", TestStudy.Start, About(1e-9, 3e-9)));
        var noise = 3e-9 * Math.Sqrt(12.0 / 11);
        Assert.Equal(1e-9, run.Zero, 1e-18);
        Assert.Equal(noise, run.Noise, 1e-18);
        Assert.Equal(noise / Math.Sqrt(12), run.ZeroUncertainty, 1e-18);
        Assert.Equal(11, run.DegreesOfFreedom);
        Assert.Empty(run.Findings);
    }

    [Fact]
    public void The_drag_of_air_is_no_torque_zero()
    {
        // U.S. Standard Atmosphere 1976, sea level: 15 degC, 1.7894e-5 Pa.s.
        Assert.Equal(1.7894e-5, AirInGap.ViscosityAt(new(15)).PascalSeconds, 1e-9);
        double[] rates = [10, 100, 300];
        var readings = Enumerable.Range(0, 12).Select(i => TestStudy.Turned(i + 1, rates[i % 3], rates[i % 3] * 1.7894e-5 + (i % 2 == 0 ? 1e-5 : -1e-5), temperature: 15));
        var run = Read(Study, Run("B", TestStudy.Start) with { Geometry = "cylinders", Readings = readings.ToItems() });
        Assert.False(run.ZeroBySpeed);
        Assert.Equal(0, run.Zero * PerTorque, 1e-7);
    }

    [Fact]
    public void Exported_stresses_become_torques_by_the_geometry()
    {
        var readings = About(0, 1e-9).Select((torque, i) => TestStudy.Reading(i + 1, 1e-9, torque * PerTorque));
        var run = Read(Study, Run("B", TestStudy.Start) with { Geometry = "cylinders", Readings = readings.ToItems() });
        Assert.Equal(1e-9 * Math.Sqrt(12.0 / 11), run.Noise, 1e-15);
    }

    [Fact]
    public void A_step_that_hides_the_noise_is_an_uncertainty_of_its_own()
    {
        var study = TestStudy.With(TestStudy.Rheometer with { TorqueResolution = 1e-8 });
        var run = Read(study, Run("B", TestStudy.Start, new double[12]));
        var step = 1e-8 / Math.Sqrt(12);
        Assert.Equal(step, run.Noise, 1e-18);
        Assert.Equal(step * Math.Sqrt(1 + 1.0 / 12), run.ZeroUncertainty, 1e-18);
    }

    [Fact]
    public void Few_readings_a_zero_off_zero_and_one_beyond_the_floor_are_findings()
    {
        Assert.Equal(["blank-run-short"], Codes(Study, Run("B", TestStudy.Start, 1e-9, -1e-9, 0)));
        Assert.Equal(["torque-zero-not-zero"], Codes(Study, Run("B", TestStudy.Start, About(1e-8, 2e-9))));
        Assert.Equal(["torque-zero-not-zero", "torque-zero-beyond-floor"], Codes(Study, Run("B", TestStudy.Start, About(-3e-8, 2e-9))));
        Assert.Contains("blank-run-drifts", Codes(Study, Run("B", TestStudy.Start, [.. Enumerable.Range(0, 12).Select(i => 1e-9 * i + (i % 2 == 0 ? 1e-10 : -1e-10))])));
    }

    [Fact]
    public void What_gives_no_run_is_a_finding_of_the_history()
    {
        var good = Run("B", TestStudy.Start, About(0, 1e-9));
        Recording[] bad =
        [
            good with { Sample = "one reading", Readings = [good.Readings[0]] },
            good with { Sample = "stresses without geometry", Readings = [TestStudy.Reading(1, 1, 0.1), TestStudy.Reading(2, 1, 0.1)] },
            good with { Sample = "cut", Findings = [ExportFindings.FileCut.At(good.Where, "Found a last line without a line end.")] },
        ];
        var history = History(Study, bad);
        Assert.Empty(history.Blanks);
        Assert.Equal(bad.Select(one => one.Sample), history.Findings.Where(finding => finding.Code == "blank-run-unusable").Select(finding => finding.Where.Sample!));
    }

    [Fact]
    public void Goes_into_the_log_of_its_instrument_and_comes_back()
    {
        var run = Read(Study, Run("B", TestStudy.Start, About(1e-9, 3e-9)));
        using var folder = new LogFolder();
        folder.Log.Append(run.ToLog(), TestStudy.Start, "A. Miller");
        var back = Assert.Single(InstrumentLog.Open(folder.Path).Read().BlankRuns);
        Assert.Equal(run.ToLog(), back);
        Assert.Equal(new LoggedBlankReading(0.1, run.Zero, run.Noise, 12), Assert.Single(back.Readings));
    }

    private static string[] Codes(Study study, Recording recording) => [.. Read(study, recording).Findings.Select(finding => finding.Code)];
}
