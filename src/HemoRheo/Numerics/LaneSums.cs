namespace HemoRheo;

/// <summary>The sums of a weighted least-squares problem in four lanes: normal equations, gradient, sum of squares. Sums run in point order inside a lane.</summary>
/// <param name="problem">The problem.</param>
internal sealed class LaneSums(LaneProblem problem)
{
    private readonly LaneProblem _problem = problem;
    private readonly int _points = problem.X.Length;
    private readonly int _size = problem.Start.Length;

    public Lane[] Values { get; } = new Lane[problem.X.Length];

    public Lane[] Slopes { get; } = new Lane[problem.X.Length * problem.Start.Length];

    public Lane[] Weights { get; } = new Lane[problem.X.Length];

    public Lane[] Normal { get; } = new Lane[problem.Start.Length * problem.Start.Length];

    public Lane[] Gradient { get; } = new Lane[problem.Start.Length];

    public Lane ChiSquare { get; private set; }

    /// <summary>Evaluates the model; slopes of held parameters are zero.</summary>
    public void Evaluate(LaneModel model, ReadOnlySpan<Lane> parameters)
    {
        model(_problem.X, parameters, Values, Slopes);
        for (var k = 0; k < _size; k++)
        {
            var free = _problem.Free[k];
            for (var i = 0; i < _points; i++) Slopes[k * _points + i] &= free;
        }
    }

    /// <summary>Takes values and slopes of another evaluation in the lanes of a mask.</summary>
    public void Take(LaneSums other, Lane where)
    {
        for (var i = 0; i < _points; i++) Values[i] = Lane.Select(where, other.Values[i], Values[i]);
        for (var i = 0; i < Slopes.Length; i++) Slopes[i] = Lane.Select(where, other.Slopes[i], Slopes[i]);
    }

    /// <summary>Weights at these values, and the sums with them.</summary>
    public void Sum()
    {
        Array.Clear(Normal);
        Array.Clear(Gradient);
        ChiSquare = default;
        var floor = _problem.Floor * _problem.Floor;
        for (var i = 0; i < _points; i++)
        {
            var present = _problem.Present[i];
            var weight = 1 / (Lane.Square(_problem.Relative * Values[i]) + floor) & present;
            var residual = (_problem.Y[i] - Values[i]) & present;
            Weights[i] = weight;
            var weighted = weight * residual;
            ChiSquare += weighted * residual;
            for (var j = 0; j < _size; j++)
            {
                var slope = Slopes[j * _points + i] & present;
                Gradient[j] += slope * weighted;
                var ws = slope * weight;
                for (var k = 0; k <= j; k++) Normal[j * _size + k] += ws * (Slopes[k * _points + i] & present);
            }
        }

        for (var j = 0; j < _size; j++)
        {
            for (var k = 0; k < j; k++) Normal[k * _size + j] = Normal[j * _size + k];
            Normal[j * _size + j] = Lane.Select(_problem.Free[j], Normal[j * _size + j], new(1.0));
        }
    }

    /// <summary>Sum of squares of another evaluation with the weights of this one.</summary>
    public Lane ChiSquareOf(LaneSums other)
    {
        var sum = Lane.Zero;
        for (var i = 0; i < _points; i++)
        {
            var residual = (_problem.Y[i] - other.Values[i]) & _problem.Present[i];
            sum += Weights[i] * residual * residual;
        }

        return sum;
    }
}
