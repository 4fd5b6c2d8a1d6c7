using MathNet.Numerics;
using static System.FormattableString;

namespace HemoRheo;

/// <summary>Whether curves share what a joint fit makes them share: by how much the sum of squares rises over fits of each curve alone, the weights being the joint fit's in both.</summary>
/// <param name="Rise">By how much the weighted sum of squared residuals rises.</param>
/// <param name="DegreesOfFreedom">By how many parameters the joint fit has fewer.</param>
/// <param name="ScaleChiSquare">Where the size of the errors is estimated: sum of squares of the fits alone, which it is estimated from; null where the sizes are known.</param>
/// <param name="ScaleDegreesOfFreedom">Degrees of freedom of that estimate; null where the sizes are known.</param>
/// <remarks>
/// Known sizes: chi-square of nested models. Sizes up to scale: F = (Rise / DegreesOfFreedom) / (ScaleChiSquare / ScaleDegreesOfFreedom).
/// Where a parameter is held at its bound the probability is approximate. Source: Seber and Wild 1989, Nonlinear Regression, section 5.9.
/// </remarks>
public sealed record Compatibility(double Rise, int DegreesOfFreedom, double? ScaleChiSquare, int? ScaleDegreesOfFreedom)
{
    /// <summary>F of the rise; null where the sizes of the errors are known.</summary>
    public double? F => ScaleChiSquare is { } squares && ScaleDegreesOfFreedom is { } degrees ? Rise == 0 ? 0 : Rise / DegreesOfFreedom / (squares / degrees) : null;

    /// <summary>Probability of a rise as large or larger if the curves do share these parameters.</summary>
    public double Probability => F is { } f && ScaleDegreesOfFreedom is { } degrees
        ? f == 0 ? 1 : SpecialFunctions.BetaRegularized(0.5 * degrees, 0.5 * DegreesOfFreedom, degrees / (degrees + DegreesOfFreedom * f))
        : SpecialFunctions.GammaUpperRegularized(0.5 * DegreesOfFreedom, 0.5 * Rise);

    /// <summary>Whether the curves contradict the sharing: the probability is below 0.001.</summary>
    public bool Contradicts => Probability < LackOfFit.SmallestProbability;

    /// <inheritdoc/>
    public override string ToString() => F is { } f
        ? Invariant($"F {f:F2} on {DegreesOfFreedom} and {ScaleDegreesOfFreedom} degrees of freedom, probability {Probability:G2}")
        : Invariant($"chi-square rises by {Rise:F1} on {DegreesOfFreedom} degrees of freedom, probability {Probability:G2}");
}
