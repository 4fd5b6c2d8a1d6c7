namespace HemoRheo;

/// <summary>
/// Squares and products of neighboring residuals of one curve, and what they are expected to be for errors of variance 1 that are correlated by rho to the power of the lag:
/// polynomials in rho, since the residuals are M times the errors.
/// </summary>
/// <param name="Squares">Sum of squared residuals.</param>
/// <param name="Products">Sum of products of residuals whose numbers differ by one.</param>
/// <param name="OfSquares">Coefficients of the expected squares, by lag.</param>
/// <param name="OfProducts">Coefficients of the expected products, by lag.</param>
internal sealed record LagProducts(double Squares, double Products, double[] OfSquares, double[] OfProducts)
{
    /// <summary>Those of a usable fit.</summary>
    /// <param name="fit">The fit.</param>
    /// <param name="residuals">Its residuals, less what all curves have in common.</param>
    public static LagProducts Of(FittedLaw fit, IReadOnlyList<double> residuals)
    {
        var design = WeightedDesign.Of(fit)!;
        var (n, m) = (design.Points, design.Projection);
        var longest = 0;
        for (var i = 0; i < n; i++) longest = Math.Max(longest, design.Lag(0, i));
        double squares = 0, products = 0;
        var neighbors = MathNet.Numerics.LinearAlgebra.Matrix<double>.Build.Dense(n, n, (i, j) => design.Lag(i, j) == 1 ? 0.5 : 0);
        var projected = m * neighbors * m;
        var (ofSquares, ofProducts) = (new double[2 * longest + 1], new double[2 * longest + 1]);
        for (var i = 0; i < n; i++)
        {
            squares += residuals[i] * residuals[i];
            for (var j = 0; j < n; j++)
            {
                products += neighbors[i, j] * residuals[i] * residuals[j];
                ofSquares[design.Lag(i, j)] += m[i, j];
                ofProducts[design.Lag(i, j)] += projected[i, j];
            }
        }

        return new(squares, products, ofSquares, ofProducts);
    }

    /// <summary>Expected squares at a correlation.</summary>
    public double ExpectedSquares(double correlation) => At(OfSquares, correlation);

    /// <summary>Expected products at a correlation.</summary>
    public double ExpectedProducts(double correlation) => At(OfProducts, correlation);

    private static double At(double[] coefficients, double x)
    {
        double sum = 0;
        for (var k = coefficients.Length - 1; k >= 0; k--) sum = sum * x + coefficients[k];
        return sum;
    }
}
