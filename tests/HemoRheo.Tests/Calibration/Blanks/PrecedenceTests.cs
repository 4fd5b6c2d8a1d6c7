using static HemoRheo.Tests.Calibration.Blanks.EmptyGap;

namespace HemoRheo.Tests.Calibration.Blanks;

/// <summary>Blank run of the day, else the last one with its age, else the declared floor, else none.</summary>
public sealed class PrecedenceTests
{
    private static readonly Instrument Instrument = TestStudy.Rheometer with { TorqueFloor = 2e-8, TorqueZero = 5e-9 };
    private static readonly Study Study = TestStudy.With(Instrument);
    private static readonly DateTimeOffset Noon = TestStudy.Start.AddHours(3);

    [Fact]
    public void The_last_run_of_the_day_before_the_moment_comes_first()
    {
        var torque = At(Study, Noon, Quiet("other day", TestStudy.Start.AddDays(-1)), Quiet("early", TestStudy.Start), Quiet("late", TestStudy.Start.AddHours(2)), Quiet("evening", TestStudy.Start.AddHours(9)));
        Assert.Equal((TorqueBasis.BlankOfDay, "late", TimeSpan.FromHours(1), 0.0), (torque.Basis, torque.BlankRun, torque.Age, torque.DeclaredZero));
        Assert.Equal("R1/2026-03-02 (2)", Assert.Single(torque.ZeroParts([null])).Source.Of);
    }

    [Fact]
    public void Then_one_made_later_that_day()
    {
        var torque = At(Study, Noon, Quiet("other day", TestStudy.Start.AddDays(-1)), Quiet("evening", TestStudy.Start.AddHours(9)));
        Assert.Equal((TorqueBasis.BlankOfDay, "evening", TimeSpan.FromHours(-6)), (torque.Basis, torque.BlankRun, torque.Age));
    }

    [Fact]
    public void Then_the_last_one_with_its_age_and_the_declared_zero_of_the_day_beside_its_own()
    {
        var torque = At(Study, Noon, Quiet("B", TestStudy.Start.AddDays(-2)), Quiet("next day", TestStudy.Start.AddDays(1)));
        Assert.Equal((TorqueBasis.EarlierBlank, "B", TimeSpan.FromHours(51)), (torque.Basis, torque.BlankRun, torque.Age));
        Assert.Equal("last blank run B, 2.1 d old: floor 0.02 uN.m", torque.ToString());
        var parts = torque.ZeroParts([null]).ToArray();
        Assert.Equal(["R1/2026-02-28", "R1/2026-03-02"], parts.Select(part => part.Source.Of));
        Assert.Equal([11, double.PositiveInfinity], parts.Select(part => Math.Round(part.DegreesOfFreedom, 9)));
        Assert.Equal(5e-9, parts[1].Amount);
    }

    [Fact]
    public void Then_what_the_study_file_declares()
    {
        var torque = At(Study, Noon, Quiet("next day", TestStudy.Start.AddDays(1)));
        Assert.Equal((TorqueBasis.Declared, (string?)null, 2e-8), (torque.Basis, torque.BlankRun, torque.Floor()));
        Assert.Equal(new Contribution(new(SourceKind.TorqueZero, "R1/2026-03-02"), 5e-9), Assert.Single(torque.ZeroParts([null])));
    }

    [Fact]
    public void Then_nothing_and_every_value_is_marked()
    {
        var study = TestStudy.With(Instrument with { TorqueFloor = null });
        Assert.Equal((TorqueBasis.None, null), (At(study, Noon).Basis, At(study, Noon).Floor()));
        var values = Evaluated(study, []).Samples[0].Values;
        Assert.NotEmpty(values);
        Assert.All(values.Where(value => value.Basis == HematocritBasis.Native), value => Assert.Contains(value.Findings, finding => finding.Code == "torque-floor-not-declared"));
    }

    [Fact]
    public void A_blank_run_takes_the_place_of_a_floor_that_is_not_declared()
    {
        var study = TestStudy.With(Instrument with { TorqueFloor = null });
        var noise = 3e-9 * Math.Sqrt(12.0 / 11);
        Assert.Equal(3 * Math.Sqrt(noise * noise * (1 + 1.0 / 12)), At(study, Noon, Quiet("B", TestStudy.Start)).Floor()!.Value, 1e-15);
    }

    [Fact]
    public void A_noisy_run_raises_the_floor_and_a_quiet_one_does_not_lower_it()
    {
        Assert.Equal(2e-8, At(Study, Noon, Quiet("B", TestStudy.Start)).Floor());
        Assert.True(At(Study, Noon, Run("B", TestStudy.Start, About(0, 3e-8))).Floor() > 9e-8);
    }

    [Fact]
    public void A_run_before_an_adjustment_does_not_count_after_it()
    {
        var study = TestStudy.With(Instrument with { Adjusted = [TestStudy.Start.AddHours(1)] });
        Assert.Equal(TorqueBasis.Declared, At(study, Noon, Quiet("B", TestStudy.Start)).Basis);
        Assert.Equal(TorqueBasis.BlankOfDay, At(study, Noon, Quiet("B", TestStudy.Start.AddHours(2))).Basis);
        Assert.Equal(TorqueBasis.Declared, At(study, TestStudy.Start, Quiet("B", TestStudy.Start.AddHours(2))).Basis);
    }

    [Fact]
    public void Loadings_and_a_table_say_what_their_torques_rest_on()
    {
        var declares = Study with { Files = Study.Files with { Blanks = ["blanks"] } };
        var of = Evaluated(declares, [Quiet("B-1", TestStudy.Start)]);
        Assert.DoesNotContain(of.Samples[0].Findings, finding => finding.Code.StartsWith("blank-run", StringComparison.Ordinal));
        Assert.Contains("blank run of the day,B-1", of.TorqueTable().ToCsv(), StringComparison.Ordinal);
        var earlier = Evaluated(declares, [Quiet("B-1", TestStudy.Start.AddDays(-1))]);
        Assert.Contains(earlier.Samples[0].Loadings[0].Findings, finding => finding.Code == "blank-run-of-another-day");
        Assert.Contains("last blank run,B-1", earlier.TorqueTable().ToCsv(), StringComparison.Ordinal);
        var none = Evaluated(declares, []);
        Assert.Contains(none.Samples[0].Findings, finding => finding.Code == "blank-run-missing");
        Assert.Contains("declared floor", none.TorqueTable().ToCsv(), StringComparison.Ordinal);
        Assert.DoesNotContain(Evaluated(Study, []).Samples[0].Findings, finding => finding.Code == "blank-run-missing");
    }

    private static Recording Quiet(string name, DateTimeOffset at) => Run(name, at, About(0, 3e-9));

    private static TorqueTrust At(Study study, DateTimeOffset moment, params Recording[] blanks) => History(study, blanks).TorqueAt(moment);

    private static AnalyzedStudy Evaluated(Study study, Items<Recording> blanks)
    {
        var readings = TestStudy.Rates.Select((rate, i) => TestStudy.Turned(i + 1, rate, FlowLaw.Casson.Stress(rate.PerSecond(), 0.005, 0.0033).Pascals));
        return study.Evaluate(TestStudy.Readings(study, null, [TestStudy.Blood("S-1", readings, at: Noon)], [TestStudy.Sample("S-1", TestStudy.Start)]) with { Blanks = blanks }, cancel: TestContext.Current.CancellationToken);
    }
}
