namespace HemoRheo.Benchmarks.SimulatedCharts;

/// <summary>How often the chart's rules signal on an instrument that has not changed, by simulation with a fixed seed.</summary>
/// <param name="BeyondLimits">Share of charts with a check beyond three sigma.</param>
/// <param name="TwoOfThree">Share with two of three beyond two sigma.</param>
/// <param name="WeightedAverage">Share with the weighted average beyond its limits.</param>
/// <param name="AnyRule">Share with any of these.</param>
internal sealed record ChartAlarms(double BeyondLimits, double TwoOfThree, double WeightedAverage, double AnyRule)
{
    private const int Checks = 52;

    /// <summary>Charts with limits from a baseline of so many checks, or known exactly where it is null.</summary>
    public static ChartAlarms Simulate(int? baseline, int charts, long seed)
    {
        var (beyond, two, average, any) = (0, 0, 0, 0);
        for (var chart = 0; chart < charts; chart++)
        {
            var random = RandomStream.Of(seed, FormattableString.Invariant($"chart/{baseline}"), chart);
            var (center, scatter) = baseline is { } n ? Limits(n, random) : (0, 1);
            var watch = new ChartWatch();
            var seen = new ChartSigns(false, false, false);
            for (var check = 0; check < Checks; check++)
            {
                var signs = watch.Next((random.Normal() - center) / scatter);
                seen = new(seen.BeyondLimits || signs.BeyondLimits, seen.TwoOfThree || signs.TwoOfThree, seen.WeightedAverage || signs.WeightedAverage);
            }

            if (seen.BeyondLimits) beyond++;
            if (seen.TwoOfThree) two++;
            if (seen.WeightedAverage) average++;
            if (seen.Any) any++;
        }

        return new(beyond / (double)charts, two / (double)charts, average / (double)charts, any / (double)charts);
    }

    private static (double Center, double Scatter) Limits(int n, RandomStream random)
    {
        var checks = new double[n];
        for (var i = 0; i < n; i++) checks[i] = random.Normal();
        var mean = checks.Average();
        return (mean, Math.Sqrt(checks.Sum(x => (x - mean) * (x - mean)) / (n - 1)) / ChartBaseline.C4(n));
    }
}
