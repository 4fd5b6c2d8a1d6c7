namespace HemoRheo;

/// <summary>Least squares with a function of the parameters held at a value: damped steps of the free parameters, each state exactly on the constraint.</summary>
/// <remarks>Source: Moré 1978, Lecture Notes in Mathematics 630:105-116 (damping and scaling).</remarks>
/// <param name="fit">The free fit.</param>
/// <param name="held">Its sum of squares with weights held.</param>
/// <param name="function">The function.</param>
internal sealed class ConstrainedFit(FittedLaw fit, HeldWeights held, FitFunction function)
{
    private const int IterationLimit = 200;
    private const double FirstDamping = 1e-3;
    private const double LargestDamping = 1e12;
    private const double LongestStep = 3;
    private const double Flat = 1e-15;

    /// <summary>A parameter that moves no reading by this share of its standard deviation is not a parameter there.</summary>
    private const double Silent = 1e-8;

    private readonly double[] _firstGuess = FirstGuess(fit);

    /// <summary>Lowest stress of the curve, Pa.</summary>
    public double LowestStress { get; } = fit.Curve.Points.Min(point => point.Stress.Pascals);

    /// <summary>The least sum of squares at a value, started near some parameters; a parameter near its bound is also started inside. Null where the function cannot have the value.</summary>
    public ConstrainedMinimum? At(double value, ReadOnlySpan<double> near)
    {
        var best = Descend(value, near);
        if (fit.Law.Boundary is not { } boundary || boundary.Parameter == function.Parameter) return best;
        var parameter = fit.Law.Parameters[boundary.Parameter];
        if (!(near[boundary.Parameter] <= parameter.ToScaled(boundary.WallAt(new(LowestStress))[0]))) return best;
        var inside = near.ToArray();
        inside[boundary.Parameter] = parameter.ToScaled(boundary.InsideAt(LowestStress));
        return Descend(value, inside) is { } other && !(other.Sum >= best?.Sum) ? other : best;
    }

    /// <summary>The lowest minimum at the same value from far starts: the law's own first guess of the curve, and each other parameter in turn far off; null where there is none.</summary>
    public ConstrainedMinimum? Elsewhere(ConstrainedMinimum point)
    {
        ConstrainedMinimum? best = null;
        foreach (var near in FarStarts(point.Scaled))
        {
            if (Descend(point.Value, near) is { } other && !(other.Sum >= best?.Sum)) best = other;
        }

        return best;
    }

    private IEnumerable<double[]> FarStarts(double[] scaled)
    {
        yield return _firstGuess;
        for (var k = 0; k < scaled.Length; k++)
        {
            if (k == function.Parameter || double.IsInfinity(scaled[k])) continue;
            foreach (var side in (int[])[-1, 1])
            {
                var near = (double[])scaled.Clone();
                near[k] += side * Longest(k, near[k]) / 2;
                yield return near;
            }
        }
    }

    private ConstrainedMinimum? Descend(double value, ReadOnlySpan<double> near)
    {
        var state = ConstrainedState.Near(held, function, value, near);
        if (state is null) return null;
        var damping = FirstDamping;
        for (var iteration = 0; iteration < IterationLimit && damping < LargestDamping; iteration++)
        {
            var (step, predicted, whole) = Step(state, damping);
            if (whole && !(predicted > Flat * state.Sum)) break;
            var next = state.Moved(value, step);
            var gain = (state.Sum - next?.Sum) / predicted;
            if (predicted > Flat * state.Sum && gain > 1e-4)
            {
                state = next!;
                damping *= gain > 0.25 ? 0.1 : 1;
            }
            else
            {
                damping = Math.Max(8 * damping, 1e-6);
            }
        }

        return new(value, state.Scaled, state.Sum, state.SlopeOfSum);
    }

    /// <summary>A damped step, how far the linear model falls with it, and whether it is whole: not shortened.</summary>
    private (double[] Step, double Predicted, bool Whole) Step(ConstrainedState state, double damping)
    {
        var size = state.Scaled.Length;
        var columns = new double[size][];
        var free = new List<int>(size);
        for (var k = 0; k < size; k++)
        {
            if (k == state.GivesWay || double.IsInfinity(state.Scaled[k])) continue;
            columns[k] = new double[held.Points];
            state.ReducedColumn(k, columns[k]);
            if (Length(columns[k]) > Silent) free.Add(k);
        }

        var step = new double[size];
        if (free.Count == 0) return (step, 0, true);
        var rows = held.Points + free.Count;
        var qr = new HouseholderQr(rows, free.Count);
        for (var j = 0; j < free.Count; j++)
        {
            columns[free[j]].CopyTo(qr.Matrix, j * rows);
            qr.Matrix[j * rows + held.Points + j] = Math.Sqrt(damping) * Length(columns[free[j]]);
        }

        qr.Factor();
        var right = new double[rows];
        state.Residuals.CopyTo(right);
        qr.Turn(right);
        var solution = new double[free.Count];
        qr.Solve(right, solution);
        double shorten = 1;
        for (var j = 0; j < free.Count; j++) shorten = Math.Min(shorten, Longest(free[j], state.Scaled[free[j]]) / Math.Abs(solution[j]));
        for (var j = 0; j < free.Count; j++) step[free[j]] = shorten * solution[j];
        return (step, Fall(state, columns, step), shorten == 1);
    }

    /// <summary>A long step of a parameter: 3 where its fitting scale is a logarithm or logit.</summary>
    private double Longest(int k, double scaled) => double.IsInfinity(fit.Law.Parameters[k].Lower) ? LongestStep * Math.Max(1, Math.Abs(scaled)) : LongestStep;

    private static double Fall(ConstrainedState state, double[][] columns, double[] step)
    {
        double fall = 0;
        for (var i = 0; i < state.Residuals.Length; i++)
        {
            double change = 0;
            for (var k = 0; k < step.Length; k++) change += columns[k] is { } column ? column[i] * step[k] : 0;
            fall += change * (2 * state.Residuals[i] - change);
        }

        return fall;
    }

    private static double[] FirstGuess(FittedLaw fit)
    {
        var guess = new double[fit.Scaled.Count];
        fit.Law.FirstGuess([.. fit.Curve.Points.Select(point => point.Rate.ReciprocalSeconds)], [.. fit.Curve.Points.Select(point => point.Stress.Pascals)], guess);
        return fit.Law.ToScaled(guess);
    }

    private static double Length(double[] column)
    {
        double sum = 0;
        foreach (var x in column) sum += x * x;
        return double.IsFinite(sum) ? Math.Sqrt(sum) : 0;
    }
}
