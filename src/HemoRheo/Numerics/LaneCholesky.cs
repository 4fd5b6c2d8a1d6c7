namespace HemoRheo;

/// <summary>Cholesky factor of a small symmetric matrix in four lanes, scaled to a unit diagonal first.</summary>
internal sealed class LaneCholesky
{
    private const double SmallestPivot = 1e-15;

    private readonly Lane[] _factor = new Lane[LaneDual.Slopes * LaneDual.Slopes];
    private readonly Lane[] _scale = new Lane[LaneDual.Slopes];
    private readonly Lane[] _inverseRoot = new Lane[LaneDual.Slopes];
    private int _size;

    /// <summary>Smallest pivot of the scaled matrix.</summary>
    public Lane LeastPivot { get; private set; }

    /// <summary>Factors matrix + damping * diagonal. Pivots that vanish are held at a tiny number; <see cref="LeastPivot"/> tells.</summary>
    public void Factor(ReadOnlySpan<Lane> matrix, Lane damping, ReadOnlySpan<Lane> diagonal)
    {
        var size = _size = diagonal.Length;
        var factor = _factor.AsSpan(0, size * size);
        var scale = _scale.AsSpan(0, size);
        for (var k = 0; k < size; k++) scale[k] = 1 / Lane.Sqrt(matrix[k * size + k] + damping * diagonal[k]);
        var least = new Lane(1.0);
        for (var j = 0; j < size; j++)
        {
            var pivot = new Lane(1.0);
            for (var l = 0; l < j; l++) pivot -= Lane.Square(factor[j * size + l]);
            var sound = Lane.IsFinite(scale[j]);
            least = Lane.Select(pivot < least | ~sound, pivot & sound, least);
            _inverseRoot[j] = 1 / Lane.Sqrt(Lane.Max(pivot, new(SmallestPivot)));
            for (var i = j + 1; i < size; i++)
            {
                var sum = matrix[i * size + j] * scale[i] * scale[j];
                for (var l = 0; l < j; l++) sum -= factor[i * size + l] * factor[j * size + l];
                factor[i * size + j] = sum * _inverseRoot[j];
            }
        }

        LeastPivot = least;
    }

    /// <summary>Solves for a right-hand side.</summary>
    public void Solve(ReadOnlySpan<Lane> right, Span<Lane> solution)
    {
        var size = _size;
        for (var i = 0; i < size; i++)
        {
            var sum = right[i] * _scale[i];
            for (var l = 0; l < i; l++) sum -= _factor[i * size + l] * solution[l];
            solution[i] = sum * _inverseRoot[i];
        }

        for (var i = size - 1; i >= 0; i--)
        {
            var sum = solution[i];
            for (var l = i + 1; l < size; l++) sum -= _factor[l * size + i] * solution[l];
            solution[i] = sum * _inverseRoot[i];
        }

        for (var i = 0; i < size; i++) solution[i] *= _scale[i];
    }
}
