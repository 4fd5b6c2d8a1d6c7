using System.Globalization;

namespace HemoRheo;

/// <summary>Least squares for four data sets side by side: damped normal equations with gain ratio and scaling, finishing with undamped steps. A lane's answer never depends on the others.</summary>
/// <remarks>Source: Madsen, Nielsen and Tingleff 2004, Methods for Non-Linear Least Squares Problems; weights at the fitted values, iterated to their fixed point.</remarks>
internal static class LaneSolver
{
    private const int IterationLimit = 60;
    private const double StepLimit = 1e-12;
    private const double GradientLimit = 1e-12;
    private const double LongestStep = 3;
    private const double FirstDamping = 1e-4;

    public static LaneSolution Solve(LaneModel model, LaneProblem problem)
    {
        var size = problem.Start.Length;
        var at = problem.Start.ToArray();
        var (trial, step, diagonal) = (new Lane[size], new Lane[size], new Lane[size]);
        var (here, there, factor) = (new LaneSums(problem), new LaneSums(problem), new LaneCholesky(size));
        var ends = new Convergence[Lane.Count];
        here.Evaluate(model, at);
        here.Sum();
        var active = Lane.IsFinite(here.ChiSquare);
        for (var lane = 0; lane < Lane.Count; lane++)
        {
            if (!active.TrueAt(lane)) ends[lane] = new(StopReason.BadData, 0, "the model is not finite at the start");
        }

        var damping = new Lane(FirstDamping);
        var last = new Lane(double.PositiveInfinity);
        var atWall = Lane.Zero;
        for (var iteration = 1; active.AnyTrue && iteration <= IterationLimit; iteration++)
        {
            for (var k = 0; k < size; k++) diagonal[k] = Lane.Max(here.Normal[k * size + k], diagonal[k]);
            factor.Factor(here.Normal, damping, diagonal);
            factor.Solve(here.Gradient, step);
            var shorten = Shorten(step);
            for (var k = 0; k < size; k++)
            {
                step[k] *= shorten;
                trial[k] = at[k] + step[k];
            }

            var (relative, decrement, predicted) = Measure(here, step, at);
            there.Evaluate(model, trial);
            var chiSquare = here.ChiSquareOf(there);
            var gain = (here.ChiSquare - chiSquare) / predicted;
            var finishing = predicted < 1e-10 * here.ChiSquare + new Lane(1e-20);
            var accept = active & Lane.IsFinite(chiSquare) & (finishing | gain > new Lane(1e-4)) & factor.LeastPivot > new Lane(1e-14);
            for (var k = 0; k < size; k++) at[k] = Lane.Select(accept, trial[k], at[k]);
            here.Take(there, accept);
            here.Sum();
            damping = Damp(damping, gain, accept, finishing);

            var below = Lane.Zero;
            for (var k = 0; k < size; k++) below |= at[k] < problem.Wall[k];
            atWall |= below & accept;
            var small = relative < new Lane(StepLimit);
            var flat = decrement < GradientLimit * Lane.Sqrt(1 + here.ChiSquare);
            var stalled = finishing & relative < new Lane(1e-8) & relative > 0.5 * last;
            var done = accept & (small | flat | stalled | atWall);
            last = Lane.Select(accept, relative, last);
            for (var lane = 0; done.AnyTrue && lane < Lane.Count; lane++)
            {
                if (!done.TrueAt(lane)) continue;
                ends[lane] = small.TrueAt(lane) ? Ended(StopReason.SmallStep, iteration, $"relative step {relative[lane]:G2}, at most {StepLimit:G2}")
                    : flat.TrueAt(lane) ? Ended(StopReason.SmallGradient, iteration, $"distance to the minimum {decrement[lane]:G2} standard errors, at most {GradientLimit:G2}")
                    : atWall.TrueAt(lane) ? Ended(StopReason.IterationLimit, iteration, $"a parameter runs to its bound")
                    : Ended(StopReason.SmallDecrease, iteration, $"steps no longer fall: relative step {relative[lane]:G2}");
            }

            active &= ~done;
        }

        for (var lane = 0; lane < Lane.Count; lane++)
        {
            ends[lane] ??= Ended(StopReason.IterationLimit, IterationLimit, $"{IterationLimit} iterations, relative step {last[lane]:G2}, more than {StepLimit:G2}");
        }

        return Finish(problem, at, here, factor, atWall, ends);
    }

    private static Convergence Ended(StopReason reason, int iterations, FormattableString message) => new(reason, iterations, message.ToString(CultureInfo.InvariantCulture));

    /// <summary>Factor that keeps every step on the fitting scale below a longest one.</summary>
    private static Lane Shorten(ReadOnlySpan<Lane> step)
    {
        var longest = Lane.Zero;
        foreach (var s in step) longest = Lane.Max(Lane.Abs(s), longest);
        return Lane.Select(longest > new Lane(LongestStep), LongestStep / longest, new(1.0));
    }

    private static (Lane Relative, Lane Decrement, Lane Predicted) Measure(LaneSums here, ReadOnlySpan<Lane> step, ReadOnlySpan<Lane> at)
    {
        var (relative, along, curved) = (Lane.Zero, Lane.Zero, Lane.Zero);
        for (var j = 0; j < step.Length; j++)
        {
            relative = Lane.Max(Lane.Abs(step[j]) / (1 + Lane.Abs(at[j])), relative);
            along += step[j] * here.Gradient[j];
            var row = Lane.Zero;
            for (var k = 0; k < step.Length; k++) row += here.Normal[j * step.Length + k] * step[k];
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

    private static LaneSolution Finish(LaneProblem problem, Lane[] at, LaneSums here, LaneCholesky factor, Lane atWall, Convergence[] ends)
    {
        var size = at.Length;
        var points = problem.X.Length;
        var (unit, column, inverse, response, right) = (new Lane[size], new Lane[size], new Lane[size * size], new Lane[size], new Lane[size]);
        factor.Factor(here.Normal, Lane.Zero, unit);
        for (var k = 0; k < size; k++)
        {
            Array.Clear(unit);
            unit[k] = new(1.0);
            factor.Solve(unit, column);
            for (var j = 0; j < size; j++) inverse[j * size + k] = column[j] & problem.Free[k] & problem.Free[j];
            for (var i = 0; i < points; i++) right[k] += here.Weights[i] * here.Slopes[k * points + i] & problem.Present[i];
        }

        factor.Solve(right, response);
        var residuals = new Lane[points];
        for (var i = 0; i < points; i++) residuals[i] = (problem.Y[i] - here.Values[i]) * Lane.Sqrt(here.Weights[i]) & problem.Present[i];
        return new(at, inverse, response, residuals, here.ChiSquare, factor.LeastPivot, atWall, ends);
    }
}
