using MathNet.Numerics;

namespace HemoRheo;

/// <summary>Distribution of a sum of squares of normal numbers that may be correlated: the sum of lambda times chi-square with one degree of freedom over eigenvalues lambda.</summary>
/// <param name="First">Sum of the eigenvalues, which is the expectation.</param>
/// <param name="Second">Sum of their squares, half the variance.</param>
/// <param name="Third">Sum of their cubes.</param>
/// <remarks>
/// The tail is that of a chi-square moved and stretched to the first three cumulants; with all eigenvalues 1 it is the chi-square itself.
/// Source: Buckley and Eagleson 1988, Australian Journal of Statistics 30A:150-159.
/// </remarks>
internal readonly record struct SquaresDistribution(double First, double Second, double Third)
{
    /// <summary>The chi-square of independent numbers.</summary>
    public static SquaresDistribution Independent(int degreesOfFreedom) => new(degreesOfFreedom, degreesOfFreedom, degreesOfFreedom);

    /// <summary>The sum of two independent sums of squares.</summary>
    public static SquaresDistribution operator +(SquaresDistribution a, SquaresDistribution b) => new(a.First + b.First, a.Second + b.Second, a.Third + b.Third);

    /// <summary>Probability of a sum as large or larger.</summary>
    public double ProbabilityAbove(double sum)
    {
        var matched = Second / Third * (Second / Third) * Second;
        var moved = matched + (sum - First) * Math.Sqrt(matched / Second);
        return moved > 0 ? SpecialFunctions.GammaUpperRegularized(0.5 * matched, 0.5 * moved) : 1;
    }
}
