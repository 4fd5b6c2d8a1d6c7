namespace HemoRheo;

/// <summary>Cholesky factor of a positive semidefinite matrix: a parameter without variance gets a column of zeros.</summary>
internal static class SemidefiniteCholesky
{
    /// <summary>The lower factor L of A = L L'.</summary>
    /// <param name="matrix">A, row by row.</param>
    /// <param name="size">Its number of rows.</param>
    public static double[,] Factor(IReadOnlyList<double> matrix, int size)
    {
        var factor = new double[size, size];
        for (var column = 0; column < size; column++)
        {
            var pivot = matrix[column * size + column];
            for (var k = 0; k < column; k++) pivot -= factor[column, k] * factor[column, k];
            if (!(pivot > 0)) continue;
            factor[column, column] = Math.Sqrt(pivot);
            for (var row = column + 1; row < size; row++)
            {
                var sum = matrix[row * size + column];
                for (var k = 0; k < column; k++) sum -= factor[row, k] * factor[column, k];
                factor[row, column] = sum / factor[column, column];
            }
        }

        return factor;
    }
}
