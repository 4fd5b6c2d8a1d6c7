namespace HemoRheo;

/// <summary>Makes the chart between two adjustments.</summary>
internal static class ChartSegments
{
    // Fewer checks than this give no limits of any use: with four, Student's t for three sigma is already 9.2.
    private const int LeastBefore = 5;

    internal static ChartSegment Of(DateTimeOffset? from, ChartedCheck[] checks, int asked)
    {
        var gathered = checks.Where(check => check.Outcome != CheckOutcome.Fails).Take(asked).ToArray();
        var baseline = gathered.Length < 2 ? null : ChartBaseline.Of(gathered, gathered.Length == asked);
        var points = Points(checks, gathered, baseline).ToItems();
        var signals = ChartSignals.Of(points, baseline);
        var changes = signals.Count == 0 ? null : ChangeDating.Of(checks, signals.Min(signal => Array.IndexOf(checks, signal.First)));
        return new(from, points, baseline, signals, changes, ChartSegmentFindings.Of(checks, baseline, asked, signals, changes).ToItems());
    }

    private static IEnumerable<ChartPoint> Points(ChartedCheck[] checks, ChartedCheck[] gathered, ChartBaseline? baseline)
    {
        var complete = baseline is { Established: true } ? Array.IndexOf(checks, gathered[^1]) : checks.Length;
        var watch = new ChartWatch();
        var before = new List<double>();
        for (var i = 0; i < checks.Length; i++)
        {
            var check = checks[i];
            if (i <= complete)
            {
                var limits = FromBefore(before);
                var inBaseline = check.Outcome != CheckOutcome.Fails;
                if (inBaseline) before.Add(check.Error.X);
                yield return new(check, inBaseline, limits, null, null, limits?.Contains(check.Error.X) == false ? [ChartRule.BeyondLimits] : []);
                continue;
            }

            var (center, scatter) = (baseline!.Center.X, baseline.Scatter);
            var signs = watch.Next((check.Error.X - center) / scatter);
            var reach = watch.AverageReach * scatter;
            var broken = Enum.GetValues<ChartRule>().Where(signs.Breaks).ToItems();
            yield return new(check, false, baseline.Limits, center + watch.Average * scatter, new(center - reach, center + reach), broken);
        }
    }

    private static Interval? FromBefore(List<double> before)
    {
        var n = before.Count;
        if (n < LeastBefore) return null;
        var mean = before.Average();
        var s = Math.Sqrt(before.Sum(x => (x - mean) * (x - mean)) / (n - 1));
        var reach = StudentQuantile.At(n - 1, MathNet.Numerics.Distributions.Normal.CDF(0, 1, ControlChart.Width)) * s * Math.Sqrt(1 + 1.0 / n);
        return new(mean - reach, mean + reach);
    }
}
