namespace HemoRheo.Tests.Calibration;

public class ControlChartTests
{
    private static readonly DateTimeOffset Start = new(2026, 3, 2, 9, 0, 0, TimeSpan.FromHours(1));

    // Twenty checks, mean 0, sum of squares 20 * 0.005^2, neighbors unlike.
    private static readonly double[] Steady = [.. Enumerable.Range(0, 20).Select(i => i % 2 == 0 ? 0.005 : -0.005)];

    [Fact]
    public void Limits_are_mean_and_three_times_s_over_c4_of_the_first_20_checks()
    {
        var chart = Chart([.. Steady, 0.001]);
        var baseline = chart.Current.Baseline!;
        // s = 0.005 sqrt(20/19); c4(20) = 0.98693 (Montgomery, appendix of factors).
        Assert.Equal(0.005 * Math.Sqrt(20.0 / 19) / 0.98693, baseline.Scatter, 1e-7);
        Assert.Equal(0.010 / 1.128, baseline.MovingRangeScatter, 1e-5);
        Assert.Equal((20, true), (baseline.Checks, baseline.Established));
        Assert.Equal(0, baseline.Center.X, 1e-15);
        Assert.Equal(baseline.Limits, chart.Current.Points[20].Limits);
        Assert.Equal(3 * baseline.Scatter, baseline.Limits.Upper, 1e-15);
        Assert.Equal(0.2 * 0.001, chart.Current.Points[20].Average!.Value, 1e-15);
        Assert.Equal(2.962 * 0.2 * baseline.Scatter, chart.Current.Points[20].AverageLimits!.Value.Upper, 1e-12);
        Assert.Empty(chart.Findings);
    }

    [Fact]
    public void The_center_carries_what_the_checks_share_and_their_scatter()
    {
        var shared = new Contribution(new(SourceKind.Certificate, "oil, lot 7"), -0.002);
        var own = new Contribution(new(SourceKind.Fit, "C/1/0"), 0.003);
        var chart = ControlChart.Of("R1", Steady.Select((x, i) => Check(i, 0.01 + x) with { Error = new(0.01 + x, [shared, own]) }), []);
        var center = chart.Current.Baseline!.Center;
        Assert.Equal(0.01, center.X, 1e-12);
        Assert.Equal(-0.002, center.Part(SourceKind.Certificate)!.Value, 1e-12);
        Assert.Equal(0.005 * Math.Sqrt(20.0 / 19) / Math.Sqrt(20), center.Part(SourceKind.Calibration)!.Value, 1e-12);
        Assert.Equal(2, center.Parts.Count);
    }

    [Fact]
    public void Before_20_checks_it_is_provisional_and_says_so()
    {
        var chart = Chart(Steady[..12]);
        Assert.Equal("12 of 20 checks for the baseline are there; until then a check is held against those before it, and neither the weighted average nor two of three are judged.", Assert.Single(chart.Findings).Message);
        Assert.False(chart.Current.Baseline!.Established);
        Assert.All(chart.Current.Points.Take(5), point => Assert.Null(point.Limits));
        Assert.All(chart.Current.Points, point => Assert.Null(point.Average));
        // Six checks before the seventh: mean 0, s = 0.005 sqrt(6/5), Student's t with 5 degrees of freedom at Phi(3) = 0.99865: 5.5070 (R qt).
        Assert.Equal(5.5070 * 0.005 * Math.Sqrt(6.0 / 5) * Math.Sqrt(7.0 / 6), chart.Current.Points[6].Limits!.Value.Upper, 1e-6);
    }

    [Fact]
    public void A_provisional_signal_has_the_false_alarms_of_three_sigma_with_known_limits()
    {
        // 1 - 0.9973^52 = 0.1311; 3,000 instruments of 20 checks, 15 of them judged: 1 - 0.9973^15 = 0.0397, standard error 0.0036.
        var signaled = Enumerable.Range(0, 3000).Count(i =>
        {
            var random = RandomStream.Of(9, "provisional", i);
            return Chart([.. Enumerable.Range(0, 20).Select(_ => random.Normal())]).Current.Signals.Count > 0;
        });
        Assert.InRange(signaled / 3000.0, 0.0397 - 3 * 0.0036, 0.0397 + 3 * 0.0036);
        var signal = Assert.Single(Chart([.. Steady[..12], 0.1]).Current.Signals);
        Assert.True(signal.Provisional);
        Assert.Equal(0.131, signal.FalseAlarm.Within52, 0.0015);
    }

    [Fact]
    public void A_failed_check_makes_no_baseline_but_is_drawn_and_judged()
    {
        var checks = Steady.Select((x, i) => Check(i, x)).Append(Check(20, 0.001)).Select((check, i) => i == 8 ? check with { Outcome = CheckOutcome.Fails, Error = Value.Exact(0.06) } : check);
        var chart = ControlChart.Of("R1", checks, []);
        Assert.Equal((21, 20), (chart.Current.Points.Count, chart.Current.Baseline!.Checks));
        Assert.False(chart.Current.Points[8].InBaseline);
        Assert.True(chart.Current.Points[20].InBaseline);
        Assert.Equal([ChartRule.BeyondLimits], chart.Current.Points[8].Breaks);
    }

    [Fact]
    public void Successive_checks_that_break_a_rule_are_one_signal_with_its_false_alarms()
    {
        var chart = Chart([.. Steady, 0.017, 0.018, 0, 0.011, 0.011]);
        var beyond = chart.Current.Signals.Single(signal => signal.Rule == ChartRule.BeyondLimits);
        Assert.Equal(("C20", 2, true, false), (beyond.First.Name, beyond.Checks, beyond.Upwards, beyond.Provisional));
        Assert.Equal(
            "Check 'C20' of 2026-07-20 is +1.71 %; limits -1.55 to +1.57 %; 2 checks in a row. False alarms: an instrument that has not changed gives such a signal among 52 checks in 25 of 100 cases (limits from 20 checks; 13 of 100 were they known exactly).",
            beyond.Finding.Message);
        Assert.Equal(["chart-beyond-limits", "chart-two-of-three", "chart-two-of-three", "chart-weighted-average"], chart.Current.Signals.Select(signal => signal.Finding.Code).Order(StringComparer.Ordinal));
        Assert.Equal("chart-changed", chart.Findings[^1].Code);
    }

    [Fact]
    public void Two_of_three_asks_for_one_side()
    {
        // Two sigma is 0.0104 here.
        Assert.Contains(Chart([.. Steady, 0.011, 0, 0.011]).Current.Signals, signal => signal.Rule == ChartRule.TwoOfThree);
        Assert.DoesNotContain(Chart([.. Steady, 0.011, 0, -0.011]).Current.Signals, signal => signal.Rule == ChartRule.TwoOfThree);
        Assert.DoesNotContain(Chart([.. Steady, 0.011, 0, 0, 0.011]).Current.Signals, signal => signal.Rule == ChartRule.TwoOfThree);
    }

    [Fact]
    public void An_adjustment_starts_it_anew()
    {
        var chart = ControlChart.Of("R1", Steady.Concat(Steady).Select((x, i) => Check(i, i < 20 ? x : x + 0.05)), [Start.AddDays(7 * 20)]);
        Assert.Equal(2, chart.Segments.Count);
        Assert.Equal([20, 20], chart.Segments.Select(segment => segment.Points.Count));
        Assert.Equal(0.05, chart.Current.Baseline!.Center.X, 1e-12);
        Assert.Empty(chart.Findings);
        var empty = ControlChart.Of("R1", Steady.Select((x, i) => Check(i, x)), [Start.AddDays(1000)]);
        Assert.Empty(empty.Current.Points);
        Assert.Equal("chart-provisional", Assert.Single(empty.Current.Findings).Code);
    }

    [Fact]
    public void A_wandering_baseline_is_found_and_a_steady_one_in_1_of_100()
    {
        Assert.Contains("chart-baseline-unsteady", Chart([.. Enumerable.Range(0, 20).Select(i => 0.001 * i + (i % 2 == 0 ? 0.001 : -0.001))]).Findings.Codes());
        var found = Enumerable.Range(0, 4000).Count(i =>
        {
            var random = RandomStream.Of(10, "baseline", i);
            return Chart([.. Enumerable.Range(0, 20).Select(_ => random.Normal())]).Findings.Codes().Contains("chart-baseline-unsteady");
        });
        Assert.InRange(found / 4000.0, 0.01 - 4 * 0.0016, 0.01 + 4 * 0.0016);
    }

    [Fact]
    public void A_new_lot_is_named_where_it_begins()
    {
        var chart = ControlChart.Of("R1", Steady.Select((x, i) => Check(i, x) with { Fluid = i < 9 ? "oil, lot 7" : "oil, lot 8" }), []);
        Assert.Equal("From check 'C9' of 2026-05-04 on the fluid is oil, lot 8, before it was oil, lot 7; a step there may be the certificates'.", Assert.Single(chart.Findings).Message);
    }

    [Fact]
    public void Misuse_is_told()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => ControlChart.Of("R1", [], [], baseline: 19));
        Assert.Throws<ArgumentException>(() => Chart([0, double.NaN]));
        Assert.Throws<ArgumentOutOfRangeException>(() => ChartFalseAlarms.Of(ChartRule.TwoOfThree, 5));
        Assert.Empty(Chart([]).Current.Points);
        Assert.Null(Chart([0.001]).Current.Baseline);
    }

    [Fact]
    public void A_history_is_charted_one_point_a_filling()
    {
        var checks = Enumerable.Range(0, 6).SelectMany(day => new[] { InvestigatedInstrument.Check(7 * day, 0.1 * day), InvestigatedInstrument.Check(7 * day, 0.1 * day) }).ToArray();
        var chart = InvestigatedInstrument.History(checks).ControlChart();
        Assert.Equal(6, chart.Current.Points.Count);
        Assert.Equal("oil, lot 7", chart.Current.Points[0].Check.Fluid);
    }

    private static ControlChart Chart(IReadOnlyList<double> errors) => ControlChart.Of("R1", errors.Select((error, i) => Check(i, error)), []);

    private static ChartedCheck Check(int week, double error) => new($"C{week}", Start.AddDays(7 * week), Value.Exact(error), "oil, lot 7", CheckOutcome.Passes);
}
