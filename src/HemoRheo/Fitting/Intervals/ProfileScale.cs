namespace HemoRheo;

/// <summary>What rises of a sum of squares are measured by.</summary>
/// <param name="least">The sum of squares of the fit.</param>
/// <param name="unit">Its unit: 1 where the sizes of the errors are known, else the estimated scale squared.</param>
/// <param name="limit">Limit of the root of the rise.</param>
internal sealed class ProfileScale(double least, double unit, double limit)
{
    /// <summary>A rise that is more than the arithmetic's, in units.</summary>
    private const double Notable = 1e-6;

    public double Limit => limit;

    public double Root(ConstrainedMinimum point) => Math.Sqrt(Math.Max(0, point.Sum - least) / unit);

    /// <summary>Change of the root a change of the held value.</summary>
    public double SlopeOfRoot(ConstrainedMinimum point) => point.Slope / (2 * unit * Root(point));

    public bool IsLower(ConstrainedMinimum point, ConstrainedMinimum than) => point.Sum < than.Sum - Notable * unit;

    public bool IsBelowTheFit(ConstrainedMinimum point) => point.Sum < least - Notable * unit;
}
