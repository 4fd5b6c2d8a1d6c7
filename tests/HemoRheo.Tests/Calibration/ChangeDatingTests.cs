using HemoRheo.Benchmarks.SimulatedCharts;

namespace HemoRheo.Tests.Calibration;

public class ChangeDatingTests
{
    private static readonly DateTimeOffset Start = new(2026, 3, 2, 9, 0, 0, TimeSpan.FromHours(1));

    [Theory]
    [InlineData("step")]
    [InlineData("drift")]
    public void Dates_a_change_as_plain_least_squares_at_every_moment_does(string shape)
    {
        var checks = ReferenceTable.Read("control-charts", "series.csv").Select((row, i) => Check(i, row.Number("day"), row.Number("error"))).ToArray();
        var expected = ReferenceTable.Read("control-charts", "change-dating.csv").Single(row => row["shape"] == shape);
        var changes = ChangeDating.Of(checks, signal: 34);
        var change = shape == "step" ? changes.Step : changes.Drift;
        Assert.Equal(expected.Number("most_likely"), (change.MostLikely - Start).TotalDays, 1e-6);
        Assert.Equal(expected.Number("earliest"), (change.Earliest - Start).TotalDays, 1e-6);
        Assert.Equal(expected.Number("latest"), (change.Latest - Start).TotalDays, 1e-6);
        Assert.Equal(expected.Number("size"), change.Size, 1e-9);
        Assert.Equal(expected.Number("uncertainty"), change.SizeUncertainty, 1e-9);
        Assert.Equal(expected.Number("log_likelihood"), change.LogLikelihood, 1e-6);
        Assert.Equal(5, changes.ChecksSinceSignal);
    }

    [Fact]
    public void Says_which_describes_better_and_when_it_cannot_tell()
    {
        var step = new ChartChange(ChangeShape.Step, Start, Start.AddDays(-7), Start.AddDays(7), 0.01, 0.002, 100);
        var drift = new ChartChange(ChangeShape.Drift, Start, Start.AddDays(-20), Start, 0.01, 0.002, 101);
        var open = new ChartChanges(step, drift, 4);
        Assert.Equal((drift, step, false, true), (open.Better, open.Other, open.ToldApart, open.Preliminary));
        Assert.Equal(Math.E, open.LikelihoodRatio, 1e-12);
        Assert.Contains("a step cannot be ruled out (2.7 times less likely)", open.ToString(), StringComparison.Ordinal);
        var sure = new ChartChanges(step with { LogLikelihood = 110 }, drift, 5);
        Assert.Equal((step with { LogLikelihood = 110 }, true, false), (sure.Better, sure.ToldApart, sure.Preliminary));
        Assert.Equal(Start.AddDays(-20), sure.Earliest);
    }

    // 95 % of 400 with three standard errors (0.0109 each) is 91.7 %. Intervals of steps end at checks, so they hold more.
    [Theory]
    [InlineData(ChangeShape.Step, 2, 5)]
    [InlineData(ChangeShape.Step, 3, 0)]
    [InlineData(ChangeShape.Drift, 0.2, 5)]
    [InlineData(ChangeShape.Drift, 0.46, 5)]
    public void The_interval_holds_the_true_moment_in_95_percent(ChangeShape shape, double size, int after)
    {
        var run = SimulatedChanges.Of(shape, size, 40, after, 600, seed: 3);
        Assert.InRange(run.Charts, 300, 600);
        Assert.InRange(run.Held / (double)run.Charts, 0.95 - 3 * Math.Sqrt(0.95 * 0.05 / run.Charts), 1);
        Assert.InRange(run.HeldEither / (double)run.Charts, 0.95 - 3 * Math.Sqrt(0.95 * 0.05 / run.Charts), 1);
    }

    [Fact]
    public void A_drift_of_1_percent_a_month_is_found_within_the_checks_that_theory_gives()
    {
        // Weekly checks of 0.5 % scatter: 7/30.4375 % a check, 0.46 sigma. With known limits the weighted average takes 4.93 checks from a drift that begins at the center
        // (run-lengths.csv; three-sigma limits 5.88). The true moment lies half a check before, the average is not at the center then, and three rules look: within one check of it.
        var theory = ReferenceTable.Read("control-charts", "run-lengths.csv").Single(row => row["rule"] == "EWMA" && row["change"] == "drift" && row["size"] == "0.46").Number("mean_run_length");
        var run = SimulatedChanges.Of(ChangeShape.Drift, 7 / 30.4375 / 0.5, 220, 0, 150, seed: 4, baseline: 200);
        Assert.InRange(run.MeanChecks, theory - 1, theory + 0.5);
    }

    private static ChartedCheck Check(int number, double day, double error) => new($"C{number}", Start.AddDays(day), Value.Exact(error), "oil, lot 7", CheckOutcome.Passes);
}
