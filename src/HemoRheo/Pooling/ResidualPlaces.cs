namespace HemoRheo;

/// <summary>The residuals of many curves sorted into places along the curves, as many as a curve has points: what they have in common at a place is not noise.</summary>
internal sealed class ResidualPlaces
{
    private const double LeastVariance = 1e-18;

    private readonly double[][] _centered;

    /// <summary>Sorts the residuals of fits.</summary>
    /// <param name="fits">At least one fit.</param>
    public ResidualPlaces(IReadOnlyList<FittedLaw> fits)
    {
        Count = (int)Math.Round((double)fits.Sum(fit => fit.Residuals.Count) / fits.Count);
        _centered = [.. fits.Select(fit => fit.Residuals.ToArray())];
        var sorted = fits.SelectMany((fit, curve) => fit.Residuals.Select((residual, i) => (Curve: curve, Point: i, Rate: fit.Curve.Points[i].Rate.ReciprocalSeconds, Residual: residual))).OrderBy(item => item.Rate).ToArray();
        Fewest = double.PositiveInfinity;
        for (var place = 0; place < Count; place++)
        {
            var slice = sorted[(place * sorted.Length / Count)..((place + 1) * sorted.Length / Count)];
            double n = slice.Length;
            var mean = slice.Average(item => item.Residual);
            var variance = Math.Max(LeastVariance, slice.Sum(item => (item.Residual - mean) * (item.Residual - mean)) / (n - 1));
            Statistic += n * mean * mean / variance;
            Largest = Math.Max(Largest, Math.Abs(mean) / Math.Sqrt(variance));
            Fewest = Math.Min(Fewest, n);
            foreach (var item in slice) _centered[item.Curve][item.Point] -= mean;
        }
    }

    /// <summary>Number of places.</summary>
    public int Count { get; }

    /// <summary>Sum over the places of the squared mean over its estimated variance.</summary>
    public double Statistic { get; }

    /// <summary>Largest mean at a place, in standard deviations of the residuals there.</summary>
    public double Largest { get; }

    /// <summary>Fewest residuals at a place.</summary>
    public double Fewest { get; }

    /// <summary>Residuals of a fit less the mean of their places.</summary>
    public IReadOnlyList<double> Centered(int fit) => _centered[fit];
}
