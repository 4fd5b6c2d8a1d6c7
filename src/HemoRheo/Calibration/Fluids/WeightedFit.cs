namespace HemoRheo;

/// <summary>Ordinates as a weighted sum of basis functions by least squares, and how each ordinate moves what is fitted anywhere.</summary>
internal sealed class WeightedFit
{
    private readonly double[][] _basis;
    private readonly double[] _weights;
    private readonly double[] _inverse;

    /// <summary>Fits.</summary>
    /// <param name="basis">Basis functions at each ordinate.</param>
    /// <param name="ordinates">The ordinates.</param>
    /// <param name="weights">One over the variance of each.</param>
    public WeightedFit(double[][] basis, double[] ordinates, double[] weights)
    {
        (_basis, _weights) = (basis, weights);
        var (rows, columns) = (basis.Length, basis[0].Length);
        var qr = new HouseholderQr(rows, columns);
        var right = new double[rows];
        for (var i = 0; i < rows; i++)
        {
            var scale = Math.Sqrt(weights[i]);
            right[i] = scale * ordinates[i];
            for (var k = 0; k < columns; k++) qr.Matrix[k * rows + i] = scale * basis[i][k];
        }

        qr.Factor();
        qr.Turn(right);
        Coefficients = new double[columns];
        qr.Solve(right, Coefficients);
        _inverse = qr.InverseOfNormal();
    }

    /// <summary>Coefficients of the basis functions.</summary>
    public double[] Coefficients { get; }

    /// <summary>Change of the fitted value where the basis functions have these values, per change of each ordinate.</summary>
    public double[] InfluenceAt(double[] at)
    {
        var size = at.Length;
        var solved = Enumerable.Range(0, size).Select(k => Enumerable.Range(0, size).Sum(j => _inverse[k * size + j] * at[j])).ToArray();
        return [.. _basis.Select((row, i) => _weights[i] * row.Zip(solved, (a, b) => a * b).Sum())];
    }
}
