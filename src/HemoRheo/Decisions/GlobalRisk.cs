using MathNet.Numerics.Distributions;
using MathNet.Numerics.Integration;
using static System.FormattableString;

namespace HemoRheo;

/// <summary>What limits of acceptance do to a whole population of items whose true values are normally distributed and which are measured with a normal error.</summary>
/// <param name="Consumer">Probability that an item lies beyond the limits of tolerance and is accepted.</param>
/// <param name="Producer">Probability that an item lies within them and is rejected.</param>
/// <param name="Conforming">Probability that an item lies within them.</param>
/// <remarks>Source: JCGM 106:2012, clause 9.5. By Gauss-Legendre quadrature over the true value.</remarks>
public sealed record GlobalRisk(double Consumer, double Producer, double Conforming)
{
    // Nine standard deviations leave 2e-19; panels of half the narrower deviation carry 20 points each.
    private const double Reach = 9;
    private const int Points = 20;

    /// <summary>The risks of a population.</summary>
    /// <param name="mean">Mean of the true values.</param>
    /// <param name="deviation">Their standard deviation, above zero.</param>
    /// <param name="standardUncertainty">Standard uncertainty of one measurement, above zero.</param>
    /// <param name="limits">Limits of tolerance; an end may be infinite.</param>
    /// <param name="guard">The guard band.</param>
    /// <exception cref="ArgumentOutOfRangeException">Deviation or uncertainty is not above zero.</exception>
    public static GlobalRisk Of(double mean, double deviation, double standardUncertainty, Interval limits, GuardBand guard)
    {
        if (!(deviation > 0)) throw new ArgumentOutOfRangeException(nameof(deviation), deviation, "The standard deviation of the true values must be above zero.");
        if (!(standardUncertainty > 0)) throw new ArgumentOutOfRangeException(nameof(standardUncertainty), standardUncertainty, "The standard uncertainty of a measurement must be above zero.");
        var (low, high) = (mean - Reach * deviation, mean + Reach * deviation);
        var lower = Math.Clamp(limits.Lower, low, high);
        var upper = Math.Clamp(limits.Upper, low, high);
        var panel = Math.Min(deviation, standardUncertainty) / 2;
        double Integral(Func<double, double> of, double from, double to)
        {
            var panels = (int)Math.Ceiling((to - from) / panel);
            var width = panels == 0 ? 0 : (to - from) / panels;
            return Enumerable.Range(0, panels).Sum(i => GaussLegendreRule.Integrate(of, from + i * width, from + (i + 1) * width, Points));
        }

        double Density(double x) => Normal.PDF(mean, deviation, x);
        double Accepted(double x) => guard.AcceptanceLimits(limits, standardUncertainty) is { } accepted
            ? Normal.CDF(x, standardUncertainty, accepted.Upper) - Normal.CDF(x, standardUncertainty, accepted.Lower)
            : 0;
        var consumer = Integral(x => Density(x) * Accepted(x), low, lower) + Integral(x => Density(x) * Accepted(x), upper, high);
        return new(consumer, Integral(x => Density(x) * (1 - Accepted(x)), lower, upper), Normal.CDF(mean, deviation, limits.Upper) - Normal.CDF(mean, deviation, limits.Lower));
    }

    /// <inheritdoc/>
    public override string ToString() => Invariant($"{100 * Consumer:G3} % wrongly accepted, {100 * Producer:G3} % wrongly rejected, {100 * Conforming:G3} % conform");
}
