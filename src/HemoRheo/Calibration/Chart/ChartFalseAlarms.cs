namespace HemoRheo;

/// <summary>False alarms of the chart's rules.</summary>
/// <remarks>
/// Of independent normal checks, center and scatter estimated from the baseline as the chart does, then 52 checks. Any rule: 400,000 simulated charts a baseline,
/// standard error at most 0.0008 (<c>HemoRheo.Benchmarks chart 400000</c> makes them again). The single rules: the same simulation agrees with quadrature
/// (tests/ReferenceData/control-charts) within 0.0011, and the values by quadrature stand here. Checks that are correlated, or not normal, give more false alarms.
/// </remarks>
public static class ChartFalseAlarms
{
    private static readonly int?[] Baselines = [20, 30, 50, 100, null];
    private static readonly double[] BeyondLimits = [0.2548, 0.2196, 0.1869, 0.1598, 0.1311];
    private static readonly double[] TwoOfThree = [0.2134, 0.1766, 0.1445, 0.1195, 0.0946];
    private static readonly double[] WeightedAverage = [0.2932, 0.2401, 0.1894, 0.1468, 0.1022];
    private static readonly double[] AnyRule = [0.4273, 0.3859, 0.3433, 0.3016, 0.2538];

    /// <summary>False alarms of one rule.</summary>
    /// <param name="rule">The rule.</param>
    /// <param name="baseline">Checks in the baseline, at least 20; the figure of the next smaller simulated baseline (20, 30, 50, 100) is given.</param>
    /// <exception cref="ArgumentOutOfRangeException">The baseline has fewer than 20 checks.</exception>
    public static ChartFalseAlarm Of(ChartRule rule, int baseline) => At(baseline, rule switch
    {
        ChartRule.BeyondLimits => BeyondLimits,
        ChartRule.TwoOfThree => TwoOfThree,
        ChartRule.WeightedAverage => WeightedAverage,
        _ => throw new ArgumentOutOfRangeException(nameof(rule)),
    });

    /// <summary>False alarms of any of the three rules, taken together.</summary>
    /// <param name="baseline">Checks in the baseline, at least 20.</param>
    /// <exception cref="ArgumentOutOfRangeException">The baseline has fewer than 20 checks.</exception>
    public static ChartFalseAlarm OfAnyRule(int baseline) => At(baseline, AnyRule);

    /// <summary>Of one check held against those before it, while a baseline is gathered: exactly that of a three-sigma rule with known limits.</summary>
    internal static ChartFalseAlarm Provisional => new(null, BeyondLimits[^1], BeyondLimits[^1]);

    private static ChartFalseAlarm At(int baseline, double[] shares)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(baseline, ControlChart.LeastBaseline);
        var i = Array.FindLastIndex(Baselines, known => known <= baseline);
        return new(Baselines[i], shares[i], shares[^1]);
    }
}
