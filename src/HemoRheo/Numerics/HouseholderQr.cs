namespace HemoRheo;

/// <summary>Least squares of a tall matrix by Householder reflections.</summary>
/// <remarks>Source: Golub and Van Loan 2013, Matrix Computations, 4th ed., section 5.2.</remarks>
/// <param name="rows">Rows.</param>
/// <param name="columns">Columns, not more than rows.</param>
internal sealed class HouseholderQr(int rows, int columns)
{
    private readonly double[] _scale = new double[columns];
    private readonly double[] _heads = new double[columns];
    private readonly double[] _factors = new double[columns];

    /// <summary>The matrix, column by column; after <see cref="Factor"/> its upper triangle, columns scaled to length one, on and above the diagonal.</summary>
    public double[] Matrix { get; } = new double[rows * columns];

    /// <summary>Smallest diagonal of the triangle of the scaled matrix, at most 1; 0 where a column vanishes.</summary>
    public double LeastPivot { get; private set; }

    /// <summary>Factors the matrix.</summary>
    public void Factor()
    {
        LeastPivot = 1;
        for (var k = 0; k < columns; k++)
        {
            var column = Matrix.AsSpan(k * rows, rows);
            var length = Length(column);
            _scale[k] = length > 0 ? 1 / length : 0;
            for (var i = 0; i < rows; i++) column[i] *= _scale[k];
        }

        for (var k = 0; k < columns; k++)
        {
            var column = Matrix.AsSpan(k * rows, rows);
            var length = Length(column[k..]);
            LeastPivot = double.IsFinite(length) ? Math.Min(LeastPivot, length) : 0;
            if (length == 0) continue;
            var alpha = column[k] > 0 ? -length : length;
            column[k] -= alpha;
            (_heads[k], _factors[k]) = (column[k], 1 / (-alpha * column[k]));
            for (var j = k + 1; j < columns; j++) Reflect(column, Matrix.AsSpan(j * rows, rows), k, _factors[k]);
            column[k] = alpha;
        }
    }

    /// <summary>Turns a right-hand side.</summary>
    /// <param name="right">Right-hand side; receives Q' times itself.</param>
    public void Turn(Span<double> right)
    {
        for (var k = 0; k < columns; k++)
        {
            var column = Matrix.AsSpan(k * rows, rows);
            var diagonal = column[k];
            column[k] = _heads[k];
            Reflect(column, right, k, _factors[k]);
            column[k] = diagonal;
        }
    }

    /// <summary>Solves the triangle for a turned right-hand side.</summary>
    public void Solve(ReadOnlySpan<double> turned, Span<double> solution)
    {
        for (var i = columns - 1; i >= 0; i--)
        {
            var sum = turned[i];
            for (var j = i + 1; j < columns; j++) sum -= Matrix[j * rows + i] * solution[j];
            solution[i] = sum / Matrix[i * rows + i];
        }

        for (var i = 0; i < columns; i++) solution[i] *= _scale[i];
    }

    /// <summary>Inverse of matrix' matrix, row by row.</summary>
    public double[] InverseOfNormal()
    {
        var inverse = new double[columns * columns];
        var triangle = new double[columns * columns];
        var unit = new double[columns];
        for (var k = 0; k < columns; k++)
        {
            Array.Clear(unit);
            unit[k] = 1;
            Solve(unit, triangle.AsSpan(k * columns, columns));
        }

        for (var k = 0; k < columns; k++)
        {
            for (var i = 0; i < columns; i++)
            {
                for (var j = 0; j < columns; j++) inverse[i * columns + j] += triangle[k * columns + i] * triangle[k * columns + j];
            }
        }

        return inverse;
    }

    private static double Length(ReadOnlySpan<double> x)
    {
        double largest = 0, sum = 0;
        foreach (var v in x) largest = Math.Max(largest, Math.Abs(v));
        if (!(largest > 0)) return largest;
        foreach (var v in x) sum += v / largest * (v / largest);
        return largest * Math.Sqrt(sum);
    }

    private static void Reflect(ReadOnlySpan<double> reflector, Span<double> target, int from, double factor)
    {
        double dot = 0;
        for (var i = from; i < reflector.Length; i++) dot += reflector[i] * target[i];
        dot *= factor;
        for (var i = from; i < reflector.Length; i++) target[i] -= dot * reflector[i];
    }
}
