namespace HemoRheo;

/// <summary>The sums of a weighted least-squares problem in four lanes, where its parameters stand: normal equations, gradient, sum of squares. Sums run in point order inside a lane.</summary>
internal sealed class LaneSums
{
    private LaneProblem _problem = new();
    private Lane[] _values = [];
    private Lane[] _slopes = [];
    private Lane[] _weights = [];
    private readonly Lane[] _normal = new Lane[LaneDual.Slopes * LaneDual.Slopes];
    private readonly Lane[] _gradient = new Lane[LaneDual.Slopes];

    public ReadOnlySpan<Lane> Values => _values.AsSpan(0, _problem.Points);

    /// <summary>Slope k of point i at k * points + i; those of held parameters are zero.</summary>
    public ReadOnlySpan<Lane> Slopes => _slopes.AsSpan(0, _problem.Points * _problem.Size);

    public ReadOnlySpan<Lane> Weights => _problem.WeightsAreGiven ? _problem.Weights : _weights.AsSpan(0, _problem.Points);

    /// <summary>Normal equations, row by row; the diagonal of a held parameter is 1.</summary>
    public ReadOnlySpan<Lane> Normal => _normal.AsSpan(0, _problem.Size * _problem.Size);

    public ReadOnlySpan<Lane> Gradient => _gradient.AsSpan(0, _problem.Size);

    /// <summary>Sum of squares with the weights that belong to these values.</summary>
    public Lane ChiSquare { get; private set; }

    /// <summary>Sum of squares with the weights that belonged to the values before.</summary>
    public Lane ChiSquareAsBefore { get; private set; }

    public void Begin(LaneProblem problem)
    {
        _problem = problem;
        if (_values.Length < problem.Points) (_values, _weights) = (new Lane[2 * problem.Points], new Lane[2 * problem.Points]);
        if (_slopes.Length < problem.Points * problem.Size) _slopes = new Lane[2 * problem.Points * problem.Size];
    }

    /// <summary>Evaluates the model, and sums.</summary>
    /// <param name="model">The model.</param>
    /// <param name="parameters">Where.</param>
    /// <param name="before">Weights of the values before; empty for none.</param>
    public void Evaluate(ILaneModel model, ReadOnlySpan<Lane> parameters, ReadOnlySpan<Lane> before)
    {
        var (points, size) = (_problem.Points, _problem.Size);
        model.Evaluate(_problem.X, parameters, _values.AsSpan(0, points), _slopes.AsSpan(0, points * size));
        if (!_problem.AllAreFree) Hold();
        if (!_problem.WeightsAreGiven) Weigh();
        if (before.IsEmpty) before = Weights;
        if (size == 2) SumOfTwo(before);
        else if (size == 3) SumOfThree(before);
        else Sum(before);
        Close();
    }

    /// <summary>Takes over everything of another evaluation in the lanes of a mask.</summary>
    public void Take(LaneSums other, Lane where)
    {
        Take(_values, other._values, _problem.Points, where);
        Take(_weights, other._weights, _problem.Points, where);
        Take(_slopes, other._slopes, _problem.Points * _problem.Size, where);
        Take(_normal, other._normal, _problem.Size * _problem.Size, where);
        Take(_gradient, other._gradient, _problem.Size, where);
        ChiSquare = Lane.Select(where, other.ChiSquare, ChiSquare);
    }

    private static void Take(Lane[] to, Lane[] from, int count, Lane where)
    {
        for (var i = 0; i < count; i++) to[i] = Lane.Select(where, from[i], to[i]);
    }

    private void Hold()
    {
        for (var k = 0; k < _problem.Size; k++)
        {
            var free = _problem.Free[k];
            foreach (ref var slope in _slopes.AsSpan(k * _problem.Points, _problem.Points)) slope &= free;
        }
    }

    private void Weigh()
    {
        var values = Values;
        var weights = _weights.AsSpan(0, _problem.Points);
        var present = _problem.Present;
        var (relative, floor) = (_problem.Relative, Lane.Square(_problem.Floor));
        for (var i = 0; i < values.Length; i++) weights[i] = 1 / (Lane.Square(relative * values[i]) + floor) & present[i];
    }

    /// <summary>Straight sums for two parameters, all in registers.</summary>
    private void SumOfTwo(ReadOnlySpan<Lane> before)
    {
        var points = _problem.Points;
        var values = Values;
        var y = _problem.Y;
        var weights = Weights;
        var s0 = Slopes[..points];
        var s1 = Slopes.Slice(points, points);
        Lane chi = default, was = default, g0 = default, g1 = default, n00 = default, n10 = default, n11 = default;
        for (var i = 0; i < values.Length; i++)
        {
            var residual = y[i] - values[i];
            var weighted = weights[i] * residual;
            chi += weighted * residual;
            was += before[i] * residual * residual;
            g0 += s0[i] * weighted;
            g1 += s1[i] * weighted;
            var w1 = s1[i] * weights[i];
            n00 += s0[i] * weights[i] * s0[i];
            n10 += w1 * s0[i];
            n11 += w1 * s1[i];
        }

        (ChiSquare, ChiSquareAsBefore) = (chi, was);
        (_gradient[0], _gradient[1]) = (g0, g1);
        (_normal[0], _normal[2], _normal[3]) = (n00, n10, n11);
    }

    /// <summary>Straight sums for three parameters.</summary>
    private void SumOfThree(ReadOnlySpan<Lane> before)
    {
        var points = _problem.Points;
        var values = Values;
        var y = _problem.Y;
        var weights = Weights;
        var s0 = Slopes[..points];
        var s1 = Slopes.Slice(points, points);
        var s2 = Slopes.Slice(2 * points, points);
        Lane chi = default, was = default, g0 = default, g1 = default, g2 = default;
        Lane n00 = default, n10 = default, n11 = default, n20 = default, n21 = default, n22 = default;
        for (var i = 0; i < values.Length; i++)
        {
            var residual = y[i] - values[i];
            var weighted = weights[i] * residual;
            chi += weighted * residual;
            was += before[i] * residual * residual;
            g0 += s0[i] * weighted;
            g1 += s1[i] * weighted;
            g2 += s2[i] * weighted;
            var (w1, w2) = (s1[i] * weights[i], s2[i] * weights[i]);
            n00 += s0[i] * weights[i] * s0[i];
            n10 += w1 * s0[i];
            n11 += w1 * s1[i];
            n20 += w2 * s0[i];
            n21 += w2 * s1[i];
            n22 += w2 * s2[i];
        }

        (ChiSquare, ChiSquareAsBefore) = (chi, was);
        (_gradient[0], _gradient[1], _gradient[2]) = (g0, g1, g2);
        (_normal[0], _normal[3], _normal[4], _normal[6], _normal[7], _normal[8]) = (n00, n10, n11, n20, n21, n22);
    }

    private void Sum(ReadOnlySpan<Lane> before)
    {
        var (points, size) = (_problem.Points, _problem.Size);
        var values = Values;
        var y = _problem.Y;
        var weights = Weights;
        var slopes = Slopes;
        Array.Clear(_normal);
        Array.Clear(_gradient);
        Lane chi = default, was = default;
        for (var i = 0; i < values.Length; i++)
        {
            var residual = y[i] - values[i];
            var weighted = weights[i] * residual;
            chi += weighted * residual;
            was += before[i] * residual * residual;
            for (var j = 0; j < size; j++)
            {
                var slope = slopes[j * points + i];
                _gradient[j] += slope * weighted;
                var scaled = slope * weights[i];
                for (var k = 0; k <= j; k++) _normal[j * size + k] += scaled * slopes[k * points + i];
            }
        }

        (ChiSquare, ChiSquareAsBefore) = (chi, was);
    }

    /// <summary>The upper half as the lower one, and 1 on the diagonal of what is held.</summary>
    private void Close()
    {
        var size = _problem.Size;
        for (var j = 0; j < size; j++)
        {
            for (var k = 0; k < j; k++) _normal[k * size + j] = _normal[j * size + k];
            _normal[j * size + j] = Lane.Select(_problem.Free[j], _normal[j * size + j], new(1.0));
        }
    }
}
