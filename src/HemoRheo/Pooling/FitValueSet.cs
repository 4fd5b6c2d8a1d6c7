using MathNet.Numerics.LinearAlgebra;

namespace HemoRheo;

/// <summary>Several measurands of one fit.</summary>
/// <param name="x">The measurands on their working scales.</param>
/// <param name="columns">Contributions of the fit: a row a measurand, a column a column of the covariance's Cholesky factor.</param>
internal sealed class FitValueSet(Vector<double> x, Matrix<double> columns)
{
    public Vector<double> X => x;

    public Matrix<double> Columns => columns;

    /// <summary>Whether the fit tells every one of them to better than a factor: standard uncertainty of the logarithm at most a half.</summary>
    public bool Identified => Enumerable.Range(0, columns.RowCount).All(row => columns.Row(row).L2Norm() <= FarthestUncertainty);

    /// <summary>The largest standard uncertainty of a logarithm at which a value still says something of its size.</summary>
    internal const double FarthestUncertainty = 0.5;

    /// <summary>The same with a number added to every measurand.</summary>
    public FitValueSet ShiftedBy(double amount) => new(x + amount, columns);

    /// <summary>The measurands of a fit; null where one of them does not come from it.</summary>
    public static FitValueSet? Of(FittedLaw fit, IReadOnlyList<Measurand> measurands)
    {
        var values = measurands.Select(measurand => measurand.From(fit)).ToArray();
        if (values.Any(value => value is null || !double.IsFinite(value.X))) return null;
        return new(
            Vector<double>.Build.DenseOfEnumerable(values.Select(value => value!.X)),
            Matrix<double>.Build.DenseOfRowArrays(values.Select(value => value!.Columns(fit))));
    }
}
