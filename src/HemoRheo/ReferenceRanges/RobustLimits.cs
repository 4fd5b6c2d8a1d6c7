using MathNet.Numerics.Distributions;

namespace HemoRheo;

/// <summary>Robust reference limits, the 2.5th and 97.5th percentile, of values on a scale where the bulk of them is roughly symmetric.</summary>
/// <param name="Count">Number of values.</param>
/// <param name="Median">Their median.</param>
/// <param name="Deviation">Median absolute deviation about the median, divided by 0.6745.</param>
/// <param name="Location">Biweight location with tuning constant 3.7.</param>
/// <param name="OuterScale">Biweight scale with tuning constant 205.6: nearly every value counts.</param>
/// <param name="InnerScale">Biweight scale with tuning constant 3.7: values far out do not count.</param>
/// <param name="LocationScale">Standard error of the location.</param>
/// <param name="Quantile">Student's t, 97.5 %, with count - 1 degrees of freedom.</param>
/// <remarks>
/// Limits: location -+ quantile * sqrt(outer scale^2 + location scale^2), a prediction interval for one more value.
/// Source: Horn, Pesce and Copeland 1998, Clin Chem 44:622-631. Meant for 20 values and more.
/// </remarks>
public sealed record RobustLimits(int Count, double Median, double Deviation, double Location, double OuterScale, double InnerScale, double LocationScale, double Quantile)
{
    private const double Inner = 3.7;
    private const double Outer = 205.6;

    /// <summary>The published source.</summary>
    public static Citation Source { get; } = new("Horn, Pesce and Copeland", 1998, "A robust approach to reference interval estimation and evaluation, Clin Chem 44:622-631");

    /// <summary>The limits.</summary>
    public Interval Limits
    {
        get
        {
            var reach = Quantile * Math.Sqrt(OuterScale * OuterScale + LocationScale * LocationScale);
            return new(Location - reach, Location + reach);
        }
    }

    /// <summary>The limits of these values.</summary>
    /// <param name="values">Two or more finite values in any order; half of them or more may not be equal.</param>
    /// <exception cref="ArgumentException">There are too few values, one is not finite, or they have no spread.</exception>
    public static RobustLimits Of(IReadOnlyList<double> values)
    {
        if (values.Count < 2) throw new ArgumentException($"Reference limits need two values or more; there are {values.Count}.", nameof(values));
        if (values.Any(value => !double.IsFinite(value))) throw new ArgumentException("A value is not a finite number. Leave out values that could not be had before limits are made.", nameof(values));
        return Find([.. values], TwoSided(values.Count))
            ?? throw new ArgumentException("The values have no spread: the middle half of them is one and the same number, so no limits can be made.", nameof(values));
    }

    internal static double TwoSided(int count) => StudentT.InvCDF(0, 1, count - 1, 0.975);

    /// <summary>The limits, or null where the values have no spread. Sorts the values.</summary>
    internal static RobustLimits? Find(double[] values, double quantile)
    {
        Array.Sort(values);
        var median = MedianOfSorted(values);
        var deviation = MedianDeviation(values, median);
        if (deviation <= 0) return null;
        var location = LocationOf(values, median, deviation);
        var outer = Outer * deviation * Math.Sqrt(values.Length * Ratio(values, median, Outer * deviation));
        var inner = Inner * deviation * Math.Sqrt(values.Length * Ratio(values, median, Inner * deviation));
        var error = Inner * inner * Math.Sqrt(Ratio(values, location, Inner * inner));
        return double.IsFinite(outer) && double.IsFinite(error) ? new(values.Length, median, deviation, location, outer, inner, error, quantile) : null;
    }

    private static double LocationOf(double[] values, double median, double deviation)
    {
        var location = median;
        for (var pass = 0; pass < 1000; pass++)
        {
            double weights = 0, sum = 0;
            foreach (var value in values)
            {
                var u = (value - location) / (Inner * deviation);
                if (Math.Abs(u) >= 1) continue;
                var weight = (1 - u * u) * (1 - u * u);
                weights += weight;
                sum += weight * value;
            }

            var next = sum / weights;
            var step = Math.Abs(next - location);
            location = next;
            if (step < 1e-14 * deviation) break;
        }

        return location;
    }

    /// <summary>sum u^2 (1 - u^2)^4 / [D max(1, D - 1)], D = sum (1 - u^2)(1 - 5 u^2), over the values with |u| below 1.</summary>
    private static double Ratio(double[] values, double center, double scale)
    {
        double numerator = 0, d = 0;
        foreach (var value in values)
        {
            var u = (value - center) / scale;
            var w = 1 - u * u;
            if (w <= 0) continue;
            numerator += u * u * w * w * w * w;
            d += w * (1 - 5 * u * u);
        }

        return numerator / (d * Math.Max(1, d - 1));
    }

    private static double MedianOfSorted(double[] sorted) =>
        sorted.Length % 2 == 1 ? sorted[sorted.Length / 2] : (sorted[sorted.Length / 2 - 1] + sorted[sorted.Length / 2]) / 2;

    private static double MedianDeviation(double[] values, double median)
    {
        var deviations = Array.ConvertAll(values, value => Math.Abs(value - median));
        Array.Sort(deviations);
        return MedianOfSorted(deviations) / 0.6745;
    }
}
