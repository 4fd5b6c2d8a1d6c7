namespace HemoRheo;

/// <summary>
/// Vogel-Fulcher-Tammann: ln(viscosity) = a + b / (T - T0), through three rows exactly, through more by least squares in the logarithm;
/// through two with T0 = 178.15 K, the value that serves mineral oils.
/// </summary>
/// <remarks>Source: Vogel 1921, Phys Z 22:645-646; Fulcher 1925; Tammann and Hesse 1926. T0 of mineral oils (95 K below 0 degC): Cameron 1966, The Principles of Lubrication.</remarks>
internal sealed class VogelCurve : IViscosityCurve
{
    private const double OfMineralOils = 178.15;
    private const int MostSteps = 50;

    private readonly double _a;
    private readonly double _b;
    private readonly double _t0;
    private readonly WeightedFit _fit;

    private VogelCurve(double[] kelvins, double[] logarithms, double[] weights, double t0, bool free)
    {
        Parameters = free ? 3 : 2;
        _t0 = t0;
        (_a, _b, _fit) = Line(kelvins, logarithms, weights, t0);
        for (var step = 0; free && step < MostSteps; step++)
        {
            // Linear in a, b and the change of T0.
            _fit = new(kelvins.Select(t => Slopes(t)).ToArray(), logarithms, weights);
            var change = _fit.Coefficients[2];
            (_a, _b, _t0) = (_fit.Coefficients[0], _fit.Coefficients[1], _t0 + change);
            if (!Sound(kelvins) || Math.Abs(change) <= 1e-10 * Math.Abs(_t0)) break;
        }
    }

    /// <inheritdoc/>
    public int Parameters { get; }

    /// <summary>The curve with its own T0; null where the rows follow none: they then bend the wrong way or not at all.</summary>
    public static VogelCurve? Free(double[] kelvins, double[] logarithms, double[] weights)
    {
        if (kelvins.Length < 3 || StartOf(kelvins, logarithms) is not { } start || !(start < kelvins[0] - 1)) return null;
        var curve = new VogelCurve(kelvins, logarithms, weights, start, free: true);
        return curve.Sound(kelvins) ? curve : null;
    }

    /// <summary>The curve with the T0 of mineral oils.</summary>
    public static VogelCurve OfTwo(double[] kelvins, double[] logarithms, double[] weights) => new(kelvins, logarithms, weights, OfMineralOils, free: false);

    /// <inheritdoc/>
    public double LnViscosity(double kelvins) => _a + _b / (kelvins - _t0);

    /// <inheritdoc/>
    public double[] Influence(double kelvins) => _fit.InfluenceAt(Parameters == 3 ? Slopes(kelvins) : [1, 1 / (kelvins - _t0)]);

    private double[] Slopes(double kelvins) => [1, 1 / (kelvins - _t0), _b / ((kelvins - _t0) * (kelvins - _t0))];

    private bool Sound(double[] kelvins) => double.IsFinite(_a) && _b > 0 && _t0 < kelvins[0] - 1;

    private static (double A, double B, WeightedFit Fit) Line(double[] kelvins, double[] logarithms, double[] weights, double t0)
    {
        var fit = new WeightedFit([.. kelvins.Select(t => new[] { 1, 1 / (t - t0) })], logarithms, weights);
        return (fit.Coefficients[0], fit.Coefficients[1], fit);
    }

    // From the ratio of differences between the first, a middle and the last row, which is linear in T0.
    private static double? StartOf(double[] kelvins, double[] logarithms)
    {
        var middle = kelvins.Length / 2;
        var (t1, t2, t3) = (kelvins[0], kelvins[middle], kelvins[^1]);
        var ratio = (logarithms[0] - logarithms[middle]) / (logarithms[middle] - logarithms[^1]);
        var t0 = (ratio * t1 * (t3 - t2) - t3 * (t2 - t1)) / (ratio * (t3 - t2) - (t2 - t1));
        return double.IsFinite(t0) ? t0 : null;
    }
}
