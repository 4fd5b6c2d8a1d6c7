using HemoRheo.Benchmarks.SimulatedCharts;

namespace HemoRheo.Tests.Calibration;

/// <summary>How long the chart's rules take to signal, by simulation with a fixed seed, against run lengths computed without one (tests/ReferenceData/control-charts).</summary>
public class ChartRunLengthTests
{
    private const int Charts = 3000;

    // About 70 comparisons are made in all: beyond four standard errors one is off by chance in 200 runs of all of them.
    private const double Errors = 4;

    public static TheoryData<string, double, double> Designs => new(
        ReferenceTable.Read("control-charts", "run-lengths.csv").Where(row => row["limits"] == "constant" && row["rule"] == "EWMA" && row["change"] == "step")
            .Select(row => (row["lambda"], row.Number("lambda"), row.Number("width"))).Distinct());

    [Theory]
    [MemberData(nameof(Designs))]
    public void A_weighted_average_with_constant_limits_runs_as_long_as_computed(string name, double weight, double width)
    {
        var steady = WeightedAverage.Reach(int.MaxValue, weight, width);
        foreach (var row in ReferenceTable.Read("control-charts", "run-lengths.csv").Where(row => row["limits"] == "constant" && row["rule"] == "EWMA" && row["lambda"] == name))
        {
            var shift = row.Number("size");
            Agrees(row.Number("mean_run_length"), Lengths($"constant/{name}/{shift}", random =>
            {
                var (average, checks) = (0.0, 0);
                while (Math.Abs(average) <= steady)
                {
                    average = WeightedAverage.Next(average, random.Normal() + shift, weight);
                    checks++;
                }

                return checks;
            }));
        }
    }

    [Theory]
    [InlineData(ChartRule.BeyondLimits, "beyond limits")]
    [InlineData(ChartRule.TwoOfThree, "two of three")]
    [InlineData(ChartRule.WeightedAverage, "EWMA")]
    public void Each_rule_of_the_chart_finds_steps_and_drifts_when_computed(ChartRule rule, string name)
    {
        var rows = ReferenceTable.Read("control-charts", "run-lengths.csv").Where(row => row["rule"] == name && (name != "EWMA" || (row["lambda"] == "0.2" && row["limits"] == "growing"))).ToArray();
        Assert.True(rows.Length >= 10);
        foreach (var row in rows)
        {
            var (size, drifts) = (row.Number("size"), row["change"] == "drift");
            Agrees(row.Number("mean_run_length"), Lengths($"{name}/{row["change"]}/{size}", random =>
            {
                var watch = new ChartWatch();
                for (var check = 1; ; check++)
                {
                    if (watch.Next(random.Normal() + (drifts ? size * check : size)).Breaks(rule)) return check;
                }
            }));
        }
    }

    [Theory]
    [InlineData(0, 370.4)]
    [InlineData(0.5, 155.2)]
    [InlineData(1, 43.9)]
    [InlineData(1.5, 15.0)]
    [InlineData(2, 6.30)]
    [InlineData(3, 2.00)]
    public void Three_sigma_limits_run_as_long_as_the_books_say(double shift, double published) =>
        Agrees(published, Lengths($"shewhart/{shift}", random =>
        {
            var watch = new ChartWatch();
            for (var check = 1; ; check++)
            {
                if (watch.Next(random.Normal() + shift).BeyondLimits) return check;
            }
        }));

    [Theory]
    [InlineData("20", 20)]
    [InlineData("30", 30)]
    [InlineData("50", 50)]
    [InlineData("100", 100)]
    [InlineData("known", null)]
    public void False_alarms_in_the_findings_are_those_computed_and_those_simulated_again(string label, int? baseline)
    {
        var simulated = ChartAlarms.Simulate(baseline, 10_000, seed: 7);
        var computed = ReferenceTable.Read("control-charts", "false-alarms.csv").Where(row => row["baseline"] == label).ToDictionary(row => row["rule"], row => row.Number("share_within_52"));
        Share(computed["beyond limits"], Printed(ChartRule.BeyondLimits), simulated.BeyondLimits);
        Share(computed["two of three"], Printed(ChartRule.TwoOfThree), simulated.TwoOfThree);
        Share(computed["EWMA"], Printed(ChartRule.WeightedAverage), simulated.WeightedAverage);
        var any = ChartFalseAlarms.OfAnyRule(baseline ?? 20);
        Assert.InRange(simulated.AnyRule, (baseline is null ? any.Within52Known : any.Within52) - 0.02, (baseline is null ? any.Within52Known : any.Within52) + 0.02);

        double Printed(ChartRule rule) => baseline is { } checks ? ChartFalseAlarms.Of(rule, checks).Within52 : ChartFalseAlarms.Of(rule, 20).Within52Known;

        // Ten thousand charts: four standard errors of a share near 0.25 are 0.0173.
        static void Share(double computed, double printed, double simulated)
        {
            Assert.Equal(computed, printed, 0.00006);
            Assert.Equal(computed, simulated, 0.0173);
        }
    }

    private static double[] Lengths(string name, Func<RandomStream, int> run) => [.. Enumerable.Range(0, Charts).Select(i => (double)run(RandomStream.Of(5, name, i)))];

    private static void Agrees(double expected, double[] lengths)
    {
        var mean = lengths.Average();
        var error = Math.Sqrt(lengths.Sum(length => (length - mean) * (length - mean)) / (lengths.Length - 1) / lengths.Length);
        Assert.InRange(mean, expected - Errors * error, expected + Errors * error);
    }
}
