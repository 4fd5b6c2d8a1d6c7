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
    /// <summary>The difference, or null where x scatters too little beyond its error or there are too few.</summary>
    internal static ErrorAwareDifference? Of(WithinGroup first, WithinGroup second, double variance)
    {
        if (first.Count + second.Count < 4 || ErrorAwareSlope.Of([first, second], variance) is not { Usable: true } within) return null;
        var distance = second.MeanX - first.MeanX;
        var scatter = Math.Sqrt(within.Residual * (1.0 / first.Count + 1.0 / second.Count));
        return new(second.MeanY - first.MeanY - within.Slope * distance, within.Slope, scatter, Math.Sqrt(within.Variance), distance, within.DegreesOfFreedom);
    }

    /// <summary>How many standard errors the groups' own slopes lie apart; null where a group cannot show its slope.</summary>
    internal static double? SlopesApart(WithinGroup first, double firstVariance, WithinGroup second, double secondVariance) =>
        Own(first, firstVariance) is { } a && Own(second, secondVariance) is { } b ? Math.Abs(a.Slope - b.Slope) / Math.Sqrt(a.Variance + b.Variance) : null;

    private static ErrorAwareSlope? Own(WithinGroup group, double variance) =>
        group.Count >= 4 && ErrorAwareSlope.Of([group], variance) is { TrueScatter: > 0 } slope ? slope : null;
}
