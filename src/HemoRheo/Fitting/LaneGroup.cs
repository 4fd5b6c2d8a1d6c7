namespace HemoRheo;

/// <summary>Up to four curves solved side by side, one a lane.</summary>
internal static class LaneGroup
{
    /// <summary>Smallest pivot of the normal equations with which a lane is trusted; the general path takes over below.</summary>
    private const double SmallestPivot = 1e-8;

    /// <summary>Solves curves from given starts.</summary>
    /// <param name="law">The law.</param>
    /// <param name="curves">One to four curves.</param>
    /// <param name="starts">Starts on the fitting scale, one a curve.</param>
    /// <param name="errors">The error model.</param>
    /// <param name="held">Number of the parameter that is held at its start; null to fit all.</param>
    /// <returns>One outcome a curve.</returns>
    public static LaneOutcome[] Solve(FlowLaw law, ReadOnlySpan<CurveData> curves, ReadOnlySpan<double[]> starts, ErrorModel errors, int? held = null)
    {
        var size = law.Parameters.Count;
        var points = 0;
        foreach (var curve in curves) points = Math.Max(points, curve.Rates.Length);
        var (x, y, present) = (new Lane[points], new Lane[points], new Lane[points]);
        for (var i = 0; i < points; i++)
        {
            (x[i], y[i], present[i]) = Point(curves, i);
        }

        var (start, free, wall) = (new Lane[size], new Lane[size], new Lane[size]);
        for (var k = 0; k < size; k++)
        {
            start[k] = new(starts[0][k], At(starts, 1)[k], At(starts, 2)[k], At(starts, 3)[k]);
            free[k] = k == held ? Lane.Zero : Lane.Everywhere;
            wall[k] = new(double.NegativeInfinity);
        }

        if (law.Boundary is { } boundary && held is null)
        {
            wall[boundary.Parameter] = new(WallOf(law, curves[0]), WallOf(law, At(curves, 1)), WallOf(law, At(curves, 2)), WallOf(law, At(curves, 3)));
        }

        var solution = LaneSolver.Solve(law.StressesAndSlopes, new LaneProblem(x, y, present, start, free, wall, errors.Relative, errors.Floor.Pascals));
        var outcomes = new LaneOutcome[curves.Length];
        for (var lane = 0; lane < outcomes.Length; lane++) outcomes[lane] = Read(solution, lane, curves[lane].Rates.Length, held);
        return outcomes;
    }

    /// <summary>The scaled value at which a curve's parameter has run to its bound.</summary>
    public static double WallOf(FlowLaw law, CurveData curve) =>
        law.Boundary is { } boundary ? law.Parameters[boundary.Parameter].ToScaled(boundary.WallAt(curve.LowestStress)) : double.NegativeInfinity;

    private static LaneOutcome Read(LaneSolution solution, int lane, int points, int? held)
    {
        var solved = new CurveSolution(
            Column(solution.Parameters, lane, solution.Parameters.Length),
            Column(solution.Inverse, lane, solution.Inverse.Length),
            Column(solution.Response, lane, solution.Response.Length),
            Column(solution.Residuals, lane, points),
            solution.ChiSquare[lane],
            solution.Ends[lane],
            held);
        var atWall = solution.AtWall.TrueAt(lane);
        return new(solved, atWall, !atWall && solved.End.Converged && solution.LeastPivot[lane] >= SmallestPivot);
    }

    private static double[] Column(Lane[] lanes, int lane, int count)
    {
        var column = new double[count];
        for (var i = 0; i < count; i++) column[i] = lanes[i][lane];
        return column;
    }

    private static (Lane X, Lane Y, Lane Present) Point(ReadOnlySpan<CurveData> curves, int i)
    {
        Span<double> x = stackalloc double[Lane.Count];
        Span<double> y = stackalloc double[Lane.Count];
        Span<double> there = stackalloc double[Lane.Count];
        for (var lane = 0; lane < Lane.Count; lane++)
        {
            var curve = At(curves, lane);
            var has = i < curve.Rates.Length;
            (x[lane], y[lane], there[lane]) = has ? (curve.Rates[i], curve.Stresses[i], 1) : (1, 1, 0);
        }

        return (new(x[0], x[1], x[2], x[3]), new(y[0], y[1], y[2], y[3]), new Lane(there[0], there[1], there[2], there[3]) > Lane.Zero);
    }

    /// <summary>Lanes without a curve of their own repeat the last one.</summary>
    private static T At<T>(ReadOnlySpan<T> list, int lane) => list[Math.Min(lane, list.Length - 1)];
}
