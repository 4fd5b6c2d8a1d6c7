namespace HemoRheo;

/// <summary>A difference of two groups at equal x, where x is measured with a known error: slope within groups, corrected for that error.</summary>
/// <param name="Difference">Second group less first, at equal x.</param>
/// <param name="Slope">The slope within groups.</param>
/// <param name="Scatter">Contribution of the scatter about the slope.</param>
/// <param name="SlopeUncertainty">Standard uncertainty of the slope.</param>
/// <param name="MeanDistance">Second group's mean x less the first's.</param>
/// <param name="DegreesOfFreedom">Degrees of freedom of the scatter and of all that rests on it.</param>
/// <remarks>
/// q = Sxx - u^2, b = Sxy / q, difference = dy - b dx, variance s^2 (1/nA + 1/nB) + dx^2 V(b),
/// V(b) = [s^2/q + (s^2 u^2 + b^2 u^4)/q^2] / (n - 2). One residual variance for both groups.
/// Source: Fuller 1987, Measurement Error Models (known error variance).
/// </remarks>
internal sealed record ErrorAwareDifference(double Difference, double Slope, double Scatter, double SlopeUncertainty, double MeanDistance, int DegreesOfFreedom)
{
    internal const string TooCoarse = "hematocrit is measured too coarsely to adjust";

    /// <summary>The difference, or null where q is below three times its standard error or there are too few.</summary>
    internal static ErrorAwareDifference? Of(WithinGroup first, WithinGroup second, double variance)
    {
        var df = first.Count + second.Count - 2;
        if (df < 2) return null;
        var xx = (first.Xx + second.Xx) / df;
        var xy = (first.Xy + second.Xy) / df;
        var q = xx - variance;
        if (q <= 0 || q < 3 * xx * Math.Sqrt(2.0 / df)) return null;
        var slope = xy / q;
        var residual = (first.Residual(slope) + second.Residual(slope)) / (df - 1);
        var distance = second.MeanX - first.MeanX;
        var scatter = Math.Sqrt(residual * (1.0 / first.Count + 1.0 / second.Count));
        return new(second.MeanY - first.MeanY - slope * distance, slope, scatter, Math.Sqrt(SlopeVariance(residual, q, slope, variance, df)), distance, df - 1);
    }

    /// <summary>How many standard errors the groups' own slopes lie apart; null where a group cannot show its slope.</summary>
    internal static double? SlopesApart(WithinGroup first, double firstVariance, WithinGroup second, double secondVariance) =>
        Own(first, firstVariance) is var (a, va) && Own(second, secondVariance) is var (b, vb) ? Math.Abs(a - b) / Math.Sqrt(va + vb) : null;

    private static (double Slope, double Variance)? Own(WithinGroup group, double variance)
    {
        var df = group.Count - 1;
        var q = group.Xx / df - variance;
        if (df < 3 || q <= 0) return null;
        var slope = group.Xy / df / q;
        return (slope, SlopeVariance(group.Residual(slope) / (df - 1), q, slope, variance, df));
    }

    private static double SlopeVariance(double residual, double q, double slope, double variance, int df) =>
        (residual / q + (residual * variance + slope * slope * variance * variance) / (q * q)) / df;
}
