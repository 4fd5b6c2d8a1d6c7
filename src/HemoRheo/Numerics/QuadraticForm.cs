namespace HemoRheo;

/// <summary>Weighted sums of independent chi-square numbers of one degree of freedom, weights of either sign.</summary>
/// <remarks>Source: Imhof 1961, Biometrika 48:419-426. His integral over u is taken over ln u by the trapezoidal rule, which is exact to rounding there since the integrand is analytic and dies out exponentially both ways.</remarks>
internal static class QuadraticForm
{
    private const double Step = 0.25;
    private const double From = -40;
    private const double To = 80;

    /// <summary>The probability that the sum is above zero.</summary>
    /// <param name="weights">The weights.</param>
    public static double ProbabilityAboveZero(IReadOnlyCollection<double> weights)
    {
        var largest = weights.Count == 0 ? 0 : weights.Max(Math.Abs);
        if (largest == 0) return 0;
        if (weights.All(weight => weight >= 0)) return 1;
        if (weights.All(weight => weight <= 0)) return 0;
        var sum = 0.0;
        for (var x = From; x <= To; x += Step)
        {
            var u = Math.Exp(x) / largest;
            double angle = 0, damping = 0;
            foreach (var weight in weights)
            {
                angle += Math.Atan(weight * u);
                damping += Math.Log(1 + weight * u * weight * u);
            }

            sum += Math.Sin(angle / 2) * Math.Exp(-damping / 4);
        }

        return Math.Clamp(0.5 + Step * sum / Math.PI, 0, 1);
    }
}
