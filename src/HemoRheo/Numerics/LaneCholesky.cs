namespace HemoRheo;

/// <summary>Cholesky factor of a small symmetric matrix in four lanes, scaled to a unit diagonal first.</summary>
/// <param name="size">Rows of the matrix.</param>
internal sealed class LaneCholesky(int size)
{
    private const double SmallestPivot = 1e-15;

    private readonly Lane[] _factor = new Lane[size * size];
    private readonly Lane[] _scale = new Lane[size];

    /// <summary>Smallest pivot of the scaled matrix.</summary>
    public Lane LeastPivot { get; private set; }

    /// <summary>Factors matrix + damping * diagonal. Pivots that vanish are held at a tiny number; <see cref="LeastPivot"/> tells.</summary>
    public void Factor(ReadOnlySpan<Lane> matrix, Lane damping, ReadOnlySpan<Lane> diagonal)
    {
        for (var k = 0; k < size; k++) _scale[k] = 1 / Lane.Sqrt(matrix[k * size + k] + damping * diagonal[k]);
        LeastPivot = new(1.0);
        for (var j = 0; j < size; j++)
        {
            var pivot = new Lane(1.0);
            for (var l = 0; l < j; l++) pivot -= Lane.Square(_factor[j * size + l]);
            LeastPivot = Lane.Select(pivot < LeastPivot | ~Lane.IsFinite(_scale[j]), Lane.Select(Lane.IsFinite(_scale[j]), pivot, Lane.Zero), LeastPivot);
            var root = Lane.Sqrt(Lane.Max(pivot, new(SmallestPivot)));
            _factor[j * size + j] = root;
            for (var i = j + 1; i < size; i++)
            {
                var sum = matrix[i * size + j] * _scale[i] * _scale[j];
                for (var l = 0; l < j; l++) sum -= _factor[i * size + l] * _factor[j * size + l];
                _factor[i * size + j] = sum / root;
            }
        }
    }

    /// <summary>Solves for a right-hand side.</summary>
    public void Solve(ReadOnlySpan<Lane> right, Span<Lane> solution)
    {
        for (var i = 0; i < size; i++)
        {
            var sum = right[i] * _scale[i];
            for (var l = 0; l < i; l++) sum -= _factor[i * size + l] * solution[l];
            solution[i] = sum / _factor[i * size + i];
        }

        for (var i = size - 1; i >= 0; i--)
        {
            var sum = solution[i];
            for (var l = i + 1; l < size; l++) sum -= _factor[l * size + i] * solution[l];
            solution[i] = sum / _factor[i * size + i];
        }

        for (var i = 0; i < size; i++) solution[i] *= _scale[i];
    }
}
