using HemoRheo.Benchmarks.SimulatedCharts;
using static System.FormattableString;

namespace HemoRheo.Benchmarks;

/// <summary>The figures of control charts that the library and its pages print.</summary>
internal static class ChartRun
{
    private const long Seed = 20261201;

    public static IEnumerable<string> Run(int charts)
    {
        yield return Invariant($"share of {charts} steady instruments that signal among 52 checks: beyond limits, two of three, weighted average, any rule");
        foreach (var baseline in new int?[] { 20, 30, 50, 100, null })
        {
            var alarms = ChartAlarms.Simulate(baseline, charts, Seed);
            yield return Invariant($"{baseline?.ToString(System.Globalization.CultureInfo.InvariantCulture) ?? "known",6}  {alarms.BeyondLimits:F4}  {alarms.TwoOfThree:F4}  {alarms.WeightedAverage:F4}  {alarms.AnyRule:F4}");
        }

        var series = Math.Max(100, charts / 100);
        yield return Invariant($"dating of a change, {series} series each; per cent of 95 % intervals that hold the moment, per cent not earlier than the chart's earliest, per cent right shape, mean interval in days, mean checks to the signal");
        foreach (var (shape, sizes) in new[] { (ChangeShape.Step, new[] { 1.5, 2, 3, 5 }), (ChangeShape.Drift, [0.1, 0.2, 0.46, 0.77]) })
        {
            foreach (var size in sizes)
            {
                foreach (var after in new[] { 0, 5, 12 })
                {
                    var run = SimulatedChanges.Of(shape, size, 40, after, series, Seed);
                    yield return Invariant($"{shape,5} {size,4} sigma, {after,2} checks after the signal: {Share(run.Held)}  {Share(run.HeldEither)}  {Share(run.RightShape)}  {run.MeanDays:F0}  {run.MeanChecks:F1}");

                    string Share(int count) => Invariant($"{100.0 * count / run.Charts,5:F1}");
                }
            }
        }
    }
}
