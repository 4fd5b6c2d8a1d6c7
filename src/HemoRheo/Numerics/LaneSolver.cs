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
    private Lane _active;
    private Lane _accept;
    private Lane _finishing;
    private Lane _damping;
    private Lane _relative;
    private Lane _distance;
    private Lane _predicted;
    private Lane _last;
    private Lane _lastShrinking;

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
        Begin(model, problem);
        for (var iteration = 1; _active.AnyTrue && iteration <= IterationLimit; iteration++)
        {
            Propose();
            Measure();
            _there.Evaluate(model, _trial.AsSpan(0, problem.Size), _here.Weights);
            Judge();
            End(iteration);
        }

        for (var lane = 0; lane < Lane.Count; lane++)
        {
            if (_active.TrueAt(lane)) _ends[lane] = new(StopReason.IterationLimit, IterationLimit, _last[lane]);
        }

        var none = _diagonal.AsSpan(0, problem.Size);
        none.Clear();
        _factor.Factor(_here.Normal, Lane.Zero, none);
    }

    private void Begin(ILaneModel model, LaneProblem problem)
    {
        _problem = problem;
        var at = _at.AsSpan(0, problem.Size);
        problem.Start.CopyTo(at);
        Array.Clear(_diagonal);
        _here.Begin(problem);
        _there.Begin(problem);
        _here.Evaluate(model, at, default);
        _active = Lane.IsFinite(_here.ChiSquare);
        for (var lane = 0; lane < Lane.Count; lane++) _ends[lane] = new(_active.TrueAt(lane) ? StopReason.IterationLimit : StopReason.BadData, 0, 0);
        _damping = new(FirstDamping);
        _last = new(double.PositiveInfinity);
        _lastShrinking = new(double.PositiveInfinity);
    }

    /// <summary>The damped step, none of it longer than a longest one. A lane that is done stands still, so that its next evaluation has the bits of this one.</summary>
    private void Propose()
    {
        var size = _problem.Size;
        var step = _step.AsSpan(0, size);
        var diagonal = _diagonal.AsSpan(0, size);
        for (var k = 0; k < size; k++) diagonal[k] = Lane.Max(_here.Normal[k * size + k], diagonal[k]);
        _factor.Factor(_here.Normal, _damping, diagonal);
        _factor.Solve(_here.Gradient, step);
        var longest = Lane.Zero;
        foreach (var s in step) longest = Lane.Max(Lane.Abs(s), longest);
        var shorten = Lane.Select(longest > new Lane(LongestStep), LongestStep / longest, new(1.0));
        for (var k = 0; k < size; k++)
        {
            step[k] = step[k] * shorten & _active;
            _trial[k] = _at[k] + step[k];
        }
    }

    /// <summary>The size of the step, how far the minimum is, and the decrease that the linear model foretells.</summary>
    private void Measure()
    {
        var size = _problem.Size;
        var step = _step.AsSpan(0, size);
        var normal = _here.Normal;
        var gradient = _here.Gradient;
        var relative = Lane.Zero;
        var along = Lane.Zero;
        var curved = Lane.Zero;
        for (var j = 0; j < step.Length; j++)
        {
            relative = Lane.Max(Lane.Abs(step[j]) / (1 + Lane.Abs(_at[j])), relative);
            along += step[j] * gradient[j];
            var row = Lane.Zero;
            for (var k = 0; k < step.Length; k++) row += normal[j * size + k] * step[k];
            curved += step[j] * row;
        }

        _relative = relative;
        _distance = Lane.Sqrt(Lane.Max(along, Lane.Zero));
        _predicted = along + along - curved;
    }

    /// <summary>Takes the trial where the sum of squares falls as foretold, or where it is too flat to judge by; sets the damping.</summary>
    private void Judge()
    {
        var gain = (_here.ChiSquare - _there.ChiSquareAsBefore) / _predicted;
        _finishing = _predicted < 1e-10 * _here.ChiSquare + new Lane(1e-20);
        _accept = _active & Lane.IsFinite(_there.ChiSquareAsBefore) & (_finishing | gain > new Lane(1e-4)) & _factor.LeastPivot > new Lane(1e-14);
        if ((_active & ~_accept).AnyTrue) _here.Take(_there, _accept);
        else (_here, _there) = (_there, _here);
        for (var k = 0; k < _problem.Size; k++) _at[k] = Lane.Select(_accept, _trial[k], _at[k]);

        var less = _damping * 0.05;
        less = Lane.Select(less < new Lane(1e-7), Lane.Zero, less);
        var more = Lane.Max(_damping * 8, new(1e-3));
        var accepted = Lane.Select(_finishing, Lane.Zero, Lane.Select(gain > new Lane(0.5), less, Lane.Select(gain > new Lane(0.2), _damping, more)));
        _damping = Lane.Select(_accept, accepted, more);
    }

    /// <summary>Ends the lanes that have arrived: the step, or the one to come where steps shrink steadily, is small; or a parameter is beyond its wall.</summary>
    private void End(int iteration)
    {
        var atWall = Lane.Zero;
        for (var k = 0; k < _problem.Size; k++) atWall |= _at[k] < _problem.Wall[k];
        var shrinking = _relative / _last;
        var next = Lane.Select(_finishing, _relative * Lane.Max(shrinking, _lastShrinking), _relative);
        var size = Lane.Min(_relative, next);
        var small = size < new Lane(StepLimit);
        var distance = _distance / Lane.Sqrt(1 + _here.ChiSquare);
        var flat = distance < new Lane(GradientLimit);
        var stalled = _finishing & _relative < new Lane(1e-8) & _relative > 0.5 * _last;
        var done = _accept & (small | flat | stalled | atWall);
        _last = Lane.Select(_accept, _relative, _last);
        _lastShrinking = Lane.Select(_accept, shrinking, _lastShrinking);
        if (!done.AnyTrue) return;
        _active &= ~done;
        for (var lane = 0; lane < Lane.Count; lane++)
        {
            if (!done.TrueAt(lane)) continue;
            _ends[lane] = small.TrueAt(lane) ? new(StopReason.SmallStep, iteration, size[lane], atWall.TrueAt(lane))
                : flat.TrueAt(lane) ? new(StopReason.SmallGradient, iteration, distance[lane], atWall.TrueAt(lane))
                : atWall.TrueAt(lane) ? new(StopReason.IterationLimit, iteration, _relative[lane], true)
                : new(StopReason.SmallDecrease, iteration, _relative[lane]);
        }
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
}
