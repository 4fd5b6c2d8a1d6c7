using MathNet.Numerics;

namespace HemoRheo;

/// <summary>What a chart's limits rest on.</summary>
/// <param name="Checks">How many checks it has.</param>
/// <param name="Established">Whether it has as many as were asked for; else it is provisional.</param>
/// <param name="Center">Mean ln error: a bias of the instrument that its checks agree on, with what they share (certificate, fluid, thermometer, torque zero) and their scatter s/sqrt(n).</param>
/// <param name="Scatter">Standard deviation of one check, s/c4.</param>
/// <param name="MovingRangeScatter">The same from the mean moving range divided by 1.128: much smaller than <paramref name="Scatter"/> where the baseline wanders.</param>
/// <param name="SuccessiveRatio">Mean square of successive differences over the variance, about 2 when checks are independent.</param>
/// <remarks>
/// s/c4 is used, not the moving range: it is the estimate that the correction of values rests on, has 1.65 times the precision, and a wandering baseline,
/// which it would hide, is looked for by the successive ratio. Sources: Cryer and Ryan 1990, Journal of Quality Technology 22:187-192 (both estimators);
/// von Neumann 1941, Annals of Mathematical Statistics 12:367-395 (ratio and its variance).
/// </remarks>
public sealed record ChartBaseline(int Checks, bool Established, Value Center, double Scatter, double MovingRangeScatter, double SuccessiveRatio)
{
    // Lower 1 % of the normal distribution.
    private const double Quantile = 2.3263;

    /// <summary>Lower and upper three-sigma limit.</summary>
    public Interval Limits => new(Center.X - ControlChart.Width * Scatter, Center.X + ControlChart.Width * Scatter);

    /// <summary>The successive ratio that one steady baseline in a hundred falls below.</summary>
    internal double LeastRatio => 2 - Quantile * Math.Sqrt(4.0 * (Checks - 2) / ((double)Checks * Checks - 1));

    /// <summary>The baseline of at least two checks in order of time.</summary>
    internal static ChartBaseline Of(IReadOnlyList<ChartedCheck> checks, bool established)
    {
        var mean = checks.Average(check => check.Error.X);
        var squares = checks.Sum(check => (check.Error.X - mean) * (check.Error.X - mean));
        var steps = checks.Zip(checks.Skip(1), (one, next) => next.Error.X - one.Error.X).ToArray();
        var s = Math.Sqrt(squares / (checks.Count - 1));
        var shared = Value.Mean([.. checks.Select(check => check.Error.Only(source => source.Kind is not (SourceKind.Fit or SourceKind.Day)))]);
        var center = shared.With(new(new(SourceKind.Calibration, "baseline"), s / Math.Sqrt(checks.Count), "baseline", checks.Count - 1));
        return new(checks.Count, established, center, s / C4(checks.Count), steps.Average(Math.Abs) / RangeOfTwo, squares > 0 ? steps.Sum(step => step * step) / squares : 2);
    }

    /// <summary>Mean of s over sigma for n normal numbers.</summary>
    internal static double C4(int n) => Math.Sqrt(2.0 / (n - 1)) * Math.Exp(SpecialFunctions.GammaLn(n / 2.0) - SpecialFunctions.GammaLn((n - 1) / 2.0));

    // Mean range of two normal numbers in standard deviations, 2/sqrt(pi).
    private static double RangeOfTwo => 2 / Math.Sqrt(Math.PI);
}
