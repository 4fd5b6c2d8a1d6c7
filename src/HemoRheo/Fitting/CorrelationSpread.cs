namespace HemoRheo;

/// <summary>An estimated correlation stands for three: the estimate and one on each side, with the weights of the normal distribution, so that what follows from it knows that it is an estimate. The sides lie on the inverse hyperbolic tangent scale, where a correlation scatters more evenly (Fisher 1915).</summary>
internal static class CorrelationSpread
{
    private const double Highest = 0.99;

    /// <summary>Correlations with their weights; one where the correlation is exact.</summary>
    /// <param name="correlation">The estimate, from 0 to below 1.</param>
    /// <param name="standardError">Its standard error.</param>
    /// <remarks>Source: Gauss-Hermite quadrature with three nodes, Abramowitz and Stegun 1964, Handbook of Mathematical Functions, table 25.10.</remarks>
    public static (double Weight, double Correlation)[] Of(double correlation, double standardError)
    {
        if (standardError == 0) return [(1, correlation)];
        var (middle, reach) = (Math.Atanh(correlation), Math.Sqrt(3) * standardError / (1 - correlation * correlation));
        return [(1.0 / 6, Math.Max(0, Math.Tanh(middle - reach))), (2.0 / 3, correlation), (1.0 / 6, Math.Max(correlation, Math.Min(Highest, Math.Tanh(middle + reach))))];
    }
}
