namespace HemoRheo;

/// <summary>Least squares for four data sets side by side: damped normal equations with gain ratio and scaling, finishing with undamped steps. A lane's answer never depends on the others. One solver serves one thread, again and again, without allocating.</summary>
/// <remarks>Source: Madsen, Nielsen and Tingleff 2004, Methods for Non-Linear Least Squares Problems; weights at the fitted values, iterated to their fixed point.</remarks>
internal sealed class LaneSolver
{
    public const double StepLimit = 1e-12;
    public const double GradientLimit = 1e-12;

    private const int IterationLimit = 60;
    private const double LongestStep = 3;
    private const double FirstDamping = 1e-4;

    private readonly LaneCholesky _factor = new();
    private readonly LaneEnd[] _ends = new LaneEnd[Lane.Count];
    private readonly Lane[] _at = new Lane[LaneDual.Slopes];
    private readonly Lane[] _trial = new Lane[LaneDual.Slopes];
    private readonly Lane[] _step = new Lane[LaneDual.Slopes];
    private readonly Lane[] _diagonal = new Lane[LaneDual.Slopes];
    private LaneProblem _problem = new();
    private LaneSums _here = new();
    private LaneSums _there = new();

    /// <summary>Estimates.</summary>
    public ReadOnlySpan<Lane> Estimates => _at.AsSpan(0, _problem.Size);

    /// <summary>Sum of squared standardized residuals.</summary>
    public Lane ChiSquare => _here.ChiSquare;

    /// <summary>Smallest pivot of the scaled normal equations: 1 less the squared multiple correlation of a parameter with those before it.</summary>
    public Lane LeastPivot => _factor.LeastPivot;

    /// <summary>How each lane ended.</summary>
    public ReadOnlySpan<LaneEnd> Ends => _ends;

    /// <summary>Solves; the answer stands in the properties until the next problem.</summary>
    public void Solve(ILaneModel model, LaneProblem problem)
    {
        _problem = problem;
        var size = problem.Size;
        var at = _at.AsSpan(0, size);
        var trial = _trial.AsSpan(0, size);
        var step = _step.AsSpan(0, size);
        var diagonal = _diagonal.AsSpan(0, size);
        problem.Start.CopyTo(at);
        diagonal.Clear();
        _here.Begin(problem);
        _there.Begin(problem);
        _here.Evaluate(model, at, default);
        var active = Lane.IsFinite(_here.ChiSquare);
        for (var lane = 0; lane < Lane.Count; lane++) _ends[lane] = new(active.TrueAt(lane) ? StopReason.IterationLimit : StopReason.BadData, 0, 0);

        var damping = new Lane(FirstDamping);
        var last = new Lane(double.PositiveInfinity);
        for (var iteration = 1; active.AnyTrue && iteration <= IterationLimit; iteration++)
        {
            for (var k = 0; k < size; k++) diagonal[k] = Lane.Max(_here.Normal[k * size + k], diagonal[k]);
            _factor.Factor(_here.Normal, damping, diagonal);
            _factor.Solve(_here.Gradient, step);
            var shorten = Shorten(step);
            for (var k = 0; k < size; k++)
            {
                // A lane that is done stands still, so that its next evaluation has the bits of this one.
                step[k] = step[k] * shorten & active;
                trial[k] = at[k] + step[k];
            }

            var (relative, decrement, predicted) = Measure(step, at);
            _there.Evaluate(model, trial, _here.Weights);
            var gain = (_here.ChiSquare - _there.ChiSquareAsBefore) / predicted;
            var finishing = predicted < 1e-10 * _here.ChiSquare + new Lane(1e-20);
            var accept = active & Lane.IsFinite(_there.ChiSquareAsBefore) & (finishing | gain > new Lane(1e-4)) & _factor.LeastPivot > new Lane(1e-14);
            if ((active & ~accept).AnyTrue) _here.Take(_there, accept);
            else (_here, _there) = (_there, _here);
            for (var k = 0; k < size; k++) at[k] = Lane.Select(accept, trial[k], at[k]);
            damping = Damp(damping, gain, accept, finishing);

            var atWall = Lane.Zero;
            for (var k = 0; k < size; k++) atWall |= at[k] < problem.Wall[k];
            var small = relative < new Lane(StepLimit);
            var flat = decrement < GradientLimit * Lane.Sqrt(1 + _here.ChiSquare);
            var stalled = finishing & relative < new Lane(1e-8) & relative > 0.5 * last;
            var done = accept & (small | flat | stalled | atWall);
            last = Lane.Select(accept, relative, last);
            for (var lane = 0; done.AnyTrue && lane < Lane.Count; lane++)
            {
                if (!done.TrueAt(lane)) continue;
                _ends[lane] = small.TrueAt(lane) ? new(StopReason.SmallStep, iteration, relative[lane], atWall.TrueAt(lane))
                    : flat.TrueAt(lane) ? new(StopReason.SmallGradient, iteration, decrement[lane], atWall.TrueAt(lane))
                    : atWall.TrueAt(lane) ? new(StopReason.IterationLimit, iteration, relative[lane], true)
                    : new(StopReason.SmallDecrease, iteration, relative[lane]);
            }

            active &= ~done;
        }

        for (var lane = 0; lane < Lane.Count; lane++)
        {
            if (active.TrueAt(lane)) _ends[lane] = new(StopReason.IterationLimit, IterationLimit, last[lane]);
        }

        diagonal.Clear();
        _factor.Factor(_here.Normal, Lane.Zero, diagonal);
    }

    /// <summary>Inverse of the normal equations, row by row; zero rows for parameters that were held.</summary>
    public void Inverse(Span<Lane> inverse)
    {
        var size = _problem.Size;
        var unit = _trial.AsSpan(0, size);
        var column = _step.AsSpan(0, size);
        for (var k = 0; k < size; k++)
        {
            unit.Clear();
            unit[k] = new(1.0);
            _factor.Solve(unit, column);
            for (var j = 0; j < size; j++) inverse[j * size + k] = column[j] & _problem.Free[k] & _problem.Free[j];
        }
    }

    /// <summary>Change of the estimates when 1 is added to every datum.</summary>
    public void Response(Span<Lane> response)
    {
        var right = _trial.AsSpan(0, _problem.Size);
        right.Clear();
        for (var k = 0; k < right.Length; k++)
        {
            var slopes = _here.Slopes.Slice(k * _problem.Points, _problem.Points);
            for (var i = 0; i < slopes.Length; i++) right[k] += _here.Weights[i] * slopes[i];
        }

        _factor.Solve(right, response);
    }

    /// <summary>Standardized residual of a point.</summary>
    public Lane Residual(int point) => (_problem.Y[point] - _here.Values[point]) * Lane.Sqrt(_here.Weights[point]);

    /// <summary>Factor that keeps every step on the fitting scale below a longest one.</summary>
    private static Lane Shorten(ReadOnlySpan<Lane> step)
    {
        var longest = Lane.Zero;
        foreach (var s in step) longest = Lane.Max(Lane.Abs(s), longest);
        return Lane.Select(longest > new Lane(LongestStep), LongestStep / longest, new(1.0));
    }

    private (Lane Relative, Lane Decrement, Lane Predicted) Measure(ReadOnlySpan<Lane> step, ReadOnlySpan<Lane> at)
    {
        var normal = _here.Normal;
        var gradient = _here.Gradient;
        var (relative, along, curved) = (Lane.Zero, Lane.Zero, Lane.Zero);
        for (var j = 0; j < step.Length; j++)
        {
            relative = Lane.Max(Lane.Abs(step[j]) / (1 + Lane.Abs(at[j])), relative);
            along += step[j] * gradient[j];
            var row = Lane.Zero;
            for (var k = 0; k < step.Length; k++) row += normal[j * step.Length + k] * step[k];
            curved += step[j] * row;
        }

        return (relative, Lane.Sqrt(Lane.Max(along, Lane.Zero)), along + along - curved);
    }

    private static Lane Damp(Lane damping, Lane gain, Lane accept, Lane finishing)
    {
        var less = damping * 0.05;
        less = Lane.Select(less < new Lane(1e-7), Lane.Zero, less);
        var more = Lane.Max(damping * 8, new(1e-3));
        var accepted = Lane.Select(finishing, Lane.Zero, Lane.Select(gain > new Lane(0.5), less, Lane.Select(gain > new Lane(0.2), damping, more)));
        return Lane.Select(accept, accepted, more);
    }
}
