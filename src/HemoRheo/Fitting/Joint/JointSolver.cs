using static System.FormattableString;

namespace HemoRheo;

/// <summary>Solves a joint problem on the general path: damped steps, then undamped ones with weights at the stress of every step; unknowns that run to a bound are held there.</summary>
internal static class JointSolver
{
    private const int RoundLimit = 40;
    private const int FinishingLimit = 60;
    private const double StepLimit = 1e-12;
    private const double NoLongerFalls = 1e-8;

    private static readonly Convergence UnderWay = new(StopReason.IterationLimit, 0, "");

    /// <summary>Solves from a start.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="start">Start on the fitting scale, column by column; infinite for one that starts held at its bound.</param>
    /// <param name="deviations">Standard deviations of the readings, Pa; null for those at the fitted stress.</param>
    public static JointSolution Solve(JointProblem problem, double[] start, double[]? deviations = null)
    {
        var at = start.ToArray();
        var held = Array.ConvertAll(at, double.IsInfinity);
        var released = new bool[at.Length];
        while (true)
        {
            var solution = Settled(problem, at.ToArray(), held.ToArray(), deviations);
            solution.Scaled.CopyTo(at, 0);
            if (Hold(problem, at, held)) continue;
            if (!solution.End.Converged || !Release(problem, solution, at, held, released)) return solution;
        }
    }

    /// <summary>Holds what has passed its wall.</summary>
    private static bool Hold(JointProblem problem, double[] at, bool[] held)
    {
        var any = false;
        for (var c = 0; c < at.Length; c++)
        {
            if (held[c] || problem.Columns[c].Wall is not { } wall || !wall.IsPassedBy(at[c])) continue;
            (at[c], held[c], any) = (wall.Bound, true, true);
        }

        return any;
    }

    /// <summary>Lets go, once, of what would rather be inside.</summary>
    private static bool Release(JointProblem problem, JointSolution solution, double[] at, bool[] held, bool[] released)
    {
        int[] inward = [.. Enumerable.Range(0, at.Length).Where(c => held[c] && !released[c] && solution.FallsInward(c))];
        foreach (var c in inward) (at[c], held[c], released[c]) = (problem.Columns[c].Wall!.Inside, false, true);
        return inward.Length > 0;
    }

    /// <summary>Rounds of damped steps with fixed weights and undamped ones with the weights of every step; one round does unless weights and estimates pull at each other.</summary>
    private static JointSolution Settled(JointProblem problem, double[] at, bool[] held, double[]? known)
    {
        int[] free = [.. Enumerable.Range(0, at.Length).Where(c => !held[c])];
        var iterations = 0;
        for (var round = 1; ; round++)
        {
            var end = Descend(problem, at, free, known ?? new JointSolution(problem, at, held, null) { End = UnderWay }.Deviations);
            iterations += end.Iterations;
            if (known is null && end.Converged && !free.Any(c => problem.Columns[c].Wall?.IsPassedBy(at[c]) == true))
            {
                var step = Finish(problem, at, held, free, ref iterations);
                if (step > NoLongerFalls && round < RoundLimit) continue;
                end = step <= StepLimit ? new(StopReason.SmallStep, iterations, Invariant($"relative step {step:G2}, at most {StepLimit:G2}"))
                    : step <= NoLongerFalls ? new(StopReason.SmallDecrease, iterations, Invariant($"steps no longer fall: relative step {step:G2}"))
                    : new(StopReason.IterationLimit, iterations, Invariant($"after {round} rounds weights at the fitted stress still move an estimate by {step:G2}"));
            }

            return new(problem, at, held, known) { End = end with { Iterations = iterations } };
        }
    }

    /// <summary>Damped steps with these deviations. Logarithmic unknowns are counted from 1 at the start, so that a relative step is one of the parameter itself and not of its logarithm, which may be zero.</summary>
    private static Convergence Descend(JointProblem problem, double[] at, int[] free, double[] deviations)
    {
        var (points, size) = (problem.Points, at.Length);
        var slopes = new double[points * size];
        double[] offsets = [.. free.Select(c => problem.Columns[c].IsLogarithmic ? 1 - at[c] : 0)];
        double[] start = [.. free.Select((c, j) => at[c] + offsets[j])];
        double[] data = [.. problem.Stresses.Select((stress, i) => stress / deviations[i])];
        var solution = LeastSquares.Solve(Standardized, data, start);
        Put(solution.Parameters);
        return solution.End;

        void Standardized(ReadOnlySpan<double> x, Span<double> values, Span<double> freeSlopes)
        {
            Put(x);
            problem.Evaluate(at, values, slopes);
            for (var i = 0; i < points; i++)
            {
                values[i] /= deviations[i];
                for (var j = 0; j < free.Length; j++) freeSlopes[j * points + i] = slopes[free[j] * points + i] / deviations[i];
            }
        }

        void Put(ReadOnlySpan<double> x)
        {
            for (var j = 0; j < free.Length; j++) at[free[j]] = x[j] - offsets[j];
        }
    }

    /// <summary>Undamped steps, weights at the stress of each, while they get smaller.</summary>
    /// <returns>The last step taken, relative to its parameter.</returns>
    private static double Finish(JointProblem problem, double[] at, bool[] held, int[] free, ref int iterations)
    {
        var last = double.PositiveInfinity;
        for (var i = 0; i < FinishingLimit; i++)
        {
            var step = new JointSolution(problem, at, held, null) { End = UnderWay }.Step();
            var length = 0.0;
            foreach (var c in free)
            {
                var relative = step[c] == 0 ? 0 : Math.Abs(step[c]) / (problem.Columns[c].IsLogarithmic ? 1 : Math.Abs(at[c]) + Math.Abs(step[c]));
                if (!(relative <= length)) length = relative;
            }

            if (!(length < 0.9 * last)) break;
            foreach (var c in free) at[c] += step[c];
            (last, iterations) = (length, iterations + 1);
        }

        return last;
    }
}
