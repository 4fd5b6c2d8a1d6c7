using MathNet.Numerics;
using MathNet.Numerics.Distributions;

namespace HemoRheo;

/// <summary>Quantiles of Student's t for any positive degrees of freedom, far tails and fractions of one degree included.</summary>
internal static class StudentQuantile
{
    private const double NearlyNormal = 1e6;

    /// <summary>The quantile at probability <paramref name="p"/>.</summary>
    /// <param name="degreesOfFreedom">Above zero; positive infinity gives the normal quantile.</param>
    /// <param name="p">Between 0 and 1, ends excluded.</param>
    public static double At(double degreesOfFreedom, double p)
    {
        if (p < 0.5) return -At(degreesOfFreedom, 1 - p);
        var z = Normal.InvCDF(0, 1, p);
        if (double.IsPositiveInfinity(degreesOfFreedom)) return z;
        if (degreesOfFreedom > NearlyNormal) return z + (z * z * z + z) / (4 * degreesOfFreedom);
        if (p == 0.5) return 0;

        // Bisection in the logarithm: the tail falls with t, and a fraction of a degree of freedom reaches numbers near the largest double.
        double low = -700, high = 350;
        while (high - low > 4e-16 * Math.Max(1, Math.Abs(low)))
        {
            var middle = (low + high) / 2;
            if (middle <= low || middle >= high) break;
            if (Tail(degreesOfFreedom, Math.Exp(middle)) > 1 - p) low = middle;
            else high = middle;
        }

        return Math.Exp((low + high) / 2);
    }

    private static double Tail(double df, double t) => SpecialFunctions.BetaRegularized(df / 2, 0.5, df / (df + t * t)) / 2;
}
