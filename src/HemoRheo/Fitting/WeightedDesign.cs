using MathNet.Numerics.LinearAlgebra;

namespace HemoRheo;

/// <summary>
/// A fit near its solution in weighted coordinates, where every reading has a standard deviation of 1: residual = M error with M = I - Q Q', Q an orthonormal basis of the slopes.
/// Readings of a ramp are correlated by rho to the power of the difference of their numbers, so that a reading that was set aside still counts as a step.
/// </summary>
internal sealed class WeightedDesign
{
    private readonly int[] _numbers;
    private readonly int[] _free;
    private readonly int _size;
    private readonly Matrix<double> _basis;
    private readonly Matrix<double> _triangle;

    private WeightedDesign(int[] numbers, int[] free, int size, Matrix<double> basis, Matrix<double> triangle)
    {
        (_numbers, _free, _size, _basis, _triangle) = (numbers, free, size, basis, triangle);
        Projection = Matrix<double>.Build.DenseIdentity(numbers.Length) - basis * basis.Transpose();
    }

    /// <summary>Number of readings.</summary>
    public int Points => _numbers.Length;

    /// <summary>M, from errors to residuals.</summary>
    public Matrix<double> Projection { get; }

    /// <summary>The weighted slopes of a fit; null where it has no covariance.</summary>
    public static WeightedDesign? Of(FittedLaw fit)
    {
        if (fit.Covariance.Count == 0) return null;
        var (points, size) = (fit.Curve.Points, fit.Scaled.Count);
        var free = Enumerable.Range(0, size).Where(k => !fit.Parameters[k].AtBound).ToArray();
        var slopes = Matrix<double>.Build.Dense(points.Count, free.Length);
        var gradient = new double[size];
        for (var i = 0; i < points.Count; i++)
        {
            var stress = fit.Law.StressAt(points[i].Rate.ReciprocalSeconds, fit.Scaled.Span, gradient);
            var deviation = Math.Sqrt(fit.Errors.VarianceAt(stress));
            for (var k = 0; k < free.Length; k++) slopes[i, k] = gradient[free[k]] / deviation;
        }

        var factors = slopes.QR(MathNet.Numerics.LinearAlgebra.Factorization.QRMethod.Thin);
        return new([.. points.Select(point => point.Number)], free, size, factors.Q, factors.R);
    }

    /// <summary>Correlations between the readings.</summary>
    public Matrix<double> Correlations(double correlation) => Matrix<double>.Build.Dense(Points, Points, (i, j) => Math.Pow(correlation, Lag(i, j)));

    /// <summary>Difference of the numbers of two readings.</summary>
    public int Lag(int i, int j) => Math.Abs(_numbers[i] - _numbers[j]);

    /// <summary>How the sum of squared residuals is distributed when the law is right and the variances are.</summary>
    public SquaresDistribution Squares(double correlation)
    {
        var once = Projection * Correlations(correlation);
        var twice = once * once;
        return new(once.Trace(), twice.Trace(), (twice * once).Trace());
    }

    /// <summary>Covariance of the estimates on the fitting scale, row by row, with zero rows for a held parameter: least squares with independent weights, readings that are correlated.</summary>
    public double[] Covariance(double correlation)
    {
        var inverse = _triangle.Inverse();
        var free = inverse * (_basis.Transpose() * Correlations(correlation) * _basis) * inverse.Transpose();
        var covariance = new double[_size * _size];
        for (var k = 0; k < _free.Length; k++)
        {
            for (var l = 0; l < _free.Length; l++) covariance[_free[k] * _size + _free[l]] = 0.5 * (free[k, l] + free[l, k]);
        }

        return covariance;
    }

    /// <summary>The least generalized sum of squares, by one linear step from the solution, and the log determinant of the correlations.</summary>
    /// <param name="residuals">Standardized residuals.</param>
    /// <param name="correlation">Correlation of neighboring readings.</param>
    public (double Squares, double LogDeterminant) Generalized(IReadOnlyList<double> residuals, double correlation)
    {
        var root = Correlations(correlation).Cholesky();
        var white = root.Factor.Inverse();
        var (residual, basis) = (white * Vector<double>.Build.DenseOfEnumerable(residuals), white * _basis);
        var explained = basis.QR(MathNet.Numerics.LinearAlgebra.Factorization.QRMethod.Thin).Q.TransposeThisAndMultiply(residual);
        return (residual * residual - explained * explained, root.DeterminantLn);
    }
}
