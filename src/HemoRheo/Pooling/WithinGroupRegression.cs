namespace HemoRheo;

/// <summary>
/// Straight line of y against an x that is measured with a known error, within groups that have levels of their own.
/// </summary>
/// <param name="Slope">Slope with the error of x taken out; the plain slope when that error is zero.</param>
/// <param name="Variance">Variance of the slope.</param>
/// <param name="ResidualVariance">Variance of y about the line within groups.</param>
/// <param name="DegreesOfFreedom">Degrees of freedom of the residual variance.</param>
/// <param name="TrueScatter">Scatter of x within groups less the variance of its error.</param>
/// <param name="TrueScatterError">Standard error of that scatter.</param>
/// <remarks>Source: Fuller 1987, Measurement Error Models, 2.2 (known error variance).</remarks>
internal sealed record WithinGroupRegression(double Slope, double Variance, double ResidualVariance, double DegreesOfFreedom, double TrueScatter, double TrueScatterError)
{
    /// <summary>The reason shown when x scatters too little beyond its error.</summary>
    public const string TooCoarse = "hematocrit is measured too coarsely to adjust";

    /// <summary>Whether x scatters enough beyond its error: at least three standard errors.</summary>
    public bool Usable => TrueScatter > 0 && TrueScatter >= 3 * TrueScatterError && DegreesOfFreedom >= 1;

    /// <summary>Fits the line.</summary>
    /// <param name="points">Group, x, y of every member.</param>
    /// <param name="errorVariance">Variance of the error of x.</param>
    public static WithinGroupRegression Fit(IReadOnlyList<(string Group, double X, double Y)> points, double errorVariance)
    {
        var groups = points.GroupBy(point => point.Group).ToDictionary(group => group.Key, group => (X: group.Average(point => point.X), Y: group.Average(point => point.Y)));
        var centered = points.Select(point => (X: point.X - groups[point.Group].X, Y: point.Y - groups[point.Group].Y)).ToArray();
        double df = points.Count - groups.Count;
        var sxx = centered.Sum(point => point.X * point.X) / df;
        var q = sxx - errorVariance;
        var slope = centered.Sum(point => point.X * point.Y) / df / q;
        var residual = centered.Sum(point => Square(point.Y - slope * point.X)) / (df - 1);
        var variance = (residual / q + (residual * errorVariance + Square(slope * errorVariance)) / (q * q)) / df;
        return new(slope, variance, residual, df - 1, q, sxx * Math.Sqrt(2 / df));
    }

    private static double Square(double x) => x * x;
}
