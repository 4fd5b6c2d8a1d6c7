using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Factorization;

namespace HemoRheo;

/// <summary>How standardized residuals follow each other along the curve, from low rates to high ones.</summary>
/// <param name="Signs">Their signs, e.g. <c>--+++---</c>.</param>
/// <param name="Runs">Number of runs of equal signs.</param>
/// <param name="Correlation">First-order correlation: sum of products of neighbors over sum of squares; null where no degrees of freedom are left or every residual is zero.</param>
/// <param name="Expected">What is expected of it when the law is right and readings are independent: below zero, since a fit follows its points.</param>
/// <param name="Probability">Probability of a correlation as large or larger when the law is right and the errors are normal, independent and of the stated relative sizes.</param>
/// <remarks>
/// The probability is that of a ratio of quadratic forms of normal numbers, with the projection of the fit in it: exact where the law is linear in its parameters near the estimate.
/// It does not need the size of the errors. Misfit of a law gives positive correlation, and so do readings that are correlated by themselves.
/// At a dozen points a test of runs has no power, so runs are counted and not tested. The correlation finds Casson fitted to a Quemada curve of 12 points (ratio 0.2, at 5 %) in 87 % at 1 % noise and in 33 % at 3 %; the pattern over a whole study says more (<c>LawEvidence.PatternProbability</c>).
/// Sources: Durbin and Watson 1950, Biometrika 37:409-428; Imhof 1961, Biometrika 48:419-426.
/// </remarks>
public sealed record ResidualPattern(string Signs, int Runs, double? Correlation, double? Expected, double? Probability)
{
    /// <summary>The pattern of a fit that ended with estimates.</summary>
    internal static ResidualPattern Of(FittedLaw fit)
    {
        int[] order = [.. Enumerable.Range(0, fit.Residuals.Count).OrderBy(i => fit.Curve.Points[i].Rate.ReciprocalSeconds)];
        double[] residuals = [.. order.Select(i => fit.Residuals[i])];
        var signs = string.Concat(residuals.Select(residual => residual < 0 ? '-' : '+'));
        var runs = 1 + Enumerable.Range(1, signs.Length - 1).Count(i => signs[i] != signs[i - 1]);
        var squares = residuals.Sum(residual => residual * residual);
        var slopes = Slopes(fit, order);
        if (squares == 0 || slopes.ColumnCount >= slopes.RowCount || !slopes.Enumerate().All(double.IsFinite)) return new(signs, runs, null, null, null);

        var correlation = Enumerable.Range(1, residuals.Length - 1).Sum(i => residuals[i] * residuals[i - 1]) / squares;
        var left = slopes.QR(QRMethod.Full).Q.SubMatrix(0, slopes.RowCount, slopes.ColumnCount, slopes.RowCount - slopes.ColumnCount);
        var neighbors = Matrix<double>.Build.Dense(slopes.RowCount, slopes.RowCount, (i, j) => Math.Abs(i - j) == 1 ? 0.5 : 0);
        double[] roots = [.. (left.Transpose() * neighbors * left).Evd(Symmetricity.Symmetric).EigenValues.Select(root => root.Real)];
        return new(signs, runs, correlation, roots.Average(), QuadraticForm.ProbabilityAboveZero([.. roots.Select(root => root - correlation)]));
    }

    /// <summary>Slopes of the free parameters over the standard deviation, a row a point.</summary>
    private static Matrix<double> Slopes(FittedLaw fit, int[] order)
    {
        int[] free = [.. Enumerable.Range(0, fit.Scaled.Count).Where(k => !fit.Parameters[k].AtBound)];
        var slopes = new double[fit.Scaled.Count];
        var matrix = Matrix<double>.Build.Dense(order.Length, free.Length);
        for (var row = 0; row < order.Length; row++)
        {
            var stress = fit.Law.StressAt(fit.Curve.Points[order[row]].Rate.ReciprocalSeconds, fit.Scaled.Span, slopes);
            var (relative, floor) = (fit.Errors.Relative * stress, fit.Errors.Floor.Pascals);
            var size = Math.Sqrt(relative * relative + floor * floor);
            for (var column = 0; column < free.Length; column++) matrix[row, column] = slopes[free[column]] / size;
        }

        return matrix;
    }
}
