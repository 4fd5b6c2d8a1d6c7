namespace HemoRheo;

/// <summary>90 % intervals of robust reference limits, by percentiles over resampled values.</summary>
/// <param name="LowerLimit">Interval of the lower limit.</param>
/// <param name="UpperLimit">Interval of the upper limit.</param>
/// <remarks>Source: Efron and Tibshirani 1993, An Introduction to the Bootstrap, chapter 13.</remarks>
internal sealed record RobustLimitsBootstrap(Interval LowerLimit, Interval UpperLimit)
{
    /// <summary>Resamples: with 1999 the 5th and 95th percentiles are the 100th and 1900th value.</summary>
    internal const int Resamples = 1999;

    /// <summary>The intervals, from streams of the study's seed and a name, so that one measurand's numbers do not depend on another's.</summary>
    internal static RobustLimitsBootstrap Of(IReadOnlyList<double> values, long seed, string name)
    {
        var quantile = RobustLimits.TwoSided(values.Count);
        var lower = new double[Resamples];
        var upper = new double[Resamples];
        var drawn = new double[values.Count];
        for (var k = 0; k < Resamples; k++)
        {
            var stream = RandomStream.Of(seed, name, k);
            for (var i = 0; i < drawn.Length; i++) drawn[i] = values[(int)(stream.Uniform() * values.Count)];
            var limits = RobustLimits.Find(drawn, quantile)?.Limits ?? new(drawn[drawn.Length / 2], drawn[drawn.Length / 2]);
            (lower[k], upper[k]) = (limits.Lower, limits.Upper);
        }

        return new(Middle(lower), Middle(upper));
    }

    private static Interval Middle(double[] values)
    {
        Array.Sort(values);
        return new(values[(Resamples + 1) / 20 - 1], values[19 * (Resamples + 1) / 20 - 1]);
    }
}
