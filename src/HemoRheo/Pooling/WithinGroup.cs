namespace HemoRheo;

/// <summary>Means of one group, and sums of squares and products about them.</summary>
internal sealed record WithinGroup(int Count, double MeanX, double MeanY, double Xx, double Xy, double Yy)
{
    internal static WithinGroup Of(IReadOnlyList<double> x, IReadOnlyList<double> y)
    {
        var (meanX, meanY) = (x.Average(), y.Average());
        double xx = 0, xy = 0, yy = 0;
        for (var i = 0; i < x.Count; i++)
        {
            xx += (x[i] - meanX) * (x[i] - meanX);
            xy += (x[i] - meanX) * (y[i] - meanY);
            yy += (y[i] - meanY) * (y[i] - meanY);
        }

        return new(x.Count, meanX, meanY, xx, xy, yy);
    }

    /// <summary>Sum of squares about a line of this slope through the means.</summary>
    internal double Residual(double slope) => Math.Max(0, Yy - 2 * slope * Xy + slope * slope * Xx);
}
