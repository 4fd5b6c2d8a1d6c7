namespace HemoRheo;

/// <summary>Slope of y against an x that is measured with a known error, within groups that have levels of their own.</summary>
/// <param name="Slope">Slope with the error of x taken out; the plain slope when that error is zero.</param>
/// <param name="Variance">Variance of the slope.</param>
/// <param name="Residual">Variance of y about the slope within groups.</param>
/// <param name="DegreesOfFreedom">Degrees of freedom of that variance.</param>
/// <param name="TrueScatter">Variance of x within groups less that of its error: q.</param>
/// <param name="TrueScatterError">Standard error of q.</param>
/// <remarks>
/// q = Sxx - u^2, b = Sxy / q, V(b) = [s^2/q + (s^2 u^2 + b^2 u^4)/q^2] / (n - groups).
/// Source: Fuller 1987, Measurement Error Models (known error variance).
/// </remarks>
internal sealed record ErrorAwareSlope(double Slope, double Variance, double Residual, int DegreesOfFreedom, double TrueScatter, double TrueScatterError)
{
    /// <summary>What is said where x scatters too little beyond its error.</summary>
    internal const string TooCoarse = "hematocrit is measured too coarsely to adjust";

    /// <summary>Whether x scatters beyond its error by at least three standard errors.</summary>
    internal bool Usable => DegreesOfFreedom >= 1 && TrueScatter > 0 && TrueScatter >= 3 * TrueScatterError;

    /// <summary>The slope over these groups.</summary>
    /// <param name="groups">Sums within each group.</param>
    /// <param name="errorVariance">Variance of the error of x.</param>
    internal static ErrorAwareSlope Of(IReadOnlyCollection<WithinGroup> groups, double errorVariance)
    {
        var df = groups.Sum(group => group.Count) - groups.Count;
        var xx = groups.Sum(group => group.Xx) / df;
        var q = xx - errorVariance;
        var slope = groups.Sum(group => group.Xy) / df / q;
        var residual = groups.Sum(group => group.Residual(slope)) / (df - 1);
        var variance = (residual / q + (residual * errorVariance + slope * slope * errorVariance * errorVariance) / (q * q)) / df;
        return new(slope, variance, residual, df - 1, q, xx * Math.Sqrt(2.0 / df));
    }
}
