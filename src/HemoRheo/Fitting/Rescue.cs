namespace HemoRheo;

/// <summary>What happens to a curve that its lane did not settle, judged on that curve alone: its boundary case, the general path, other starts.</summary>
internal static class Rescue
{
    private const double OtherStart = 1.5;

    public static CurveSolution Of(FlowLaw law, CurveData curve, double[] start, LaneOutcome outcome)
    {
        if (outcome.AtWall)
        {
            return AtBoundary(law, curve, outcome.Solution.Scaled);
        }

        var first = General(law, curve, start);
        if (IsBeyondWall(law, curve, first) && AtBoundary(law, curve, first.Scaled) is var bound && Settled(bound)) return bound;
        if (Settled(first)) return first;
        CurveSolution? best = null;
        foreach (var other in OtherStarts(start))
        {
            var solution = General(law, curve, other);
            if (Settled(solution) && !(solution.ChiSquare >= best?.ChiSquare)) best = solution;
        }

        return best is null ? first : IsBeyondWall(law, curve, best) ? AtBoundary(law, curve, best.Scaled) : best;
    }

    private static CurveSolution AtBoundary(FlowLaw law, CurveData curve, double[] near)
    {
        var lanes = LaneGroup.OfThisThread;
        var settled = BoundaryCase.Solve(lanes, law, curve, near);
        var solution = lanes.Outcome(0, curve).Solution;
        return settled ? solution : solution.Ended(new(StopReason.Singular, solution.End.Iterations, $"{law.Boundary!.Law}, its boundary, does not describe the curve either"));
    }

    private static CurveSolution General(FlowLaw law, CurveData curve, double[] start)
    {
        var s = LeastSquares.Solve(new LawOnPoints(law, curve.Rates).Evaluate, curve.Stresses, start, curve.Errors.Relative, curve.Errors.Floor.Pascals, curve.Deviations);
        return new(s.Parameters, s.Inverse, s.Response, s.Residuals, s.ChiSquare, s.End, null);
    }

    private static bool Settled(CurveSolution solution) => solution.End.Converged;

    private static bool IsBeyondWall(FlowLaw law, CurveData curve, CurveSolution solution) =>
        law.Boundary is { } boundary && solution.Scaled[boundary.Parameter] < LaneGroup.WallOf(law, curve);

    private static IEnumerable<double[]> OtherStarts(double[] start)
    {
        for (var k = 0; k < start.Length; k++)
        {
            foreach (var shift in (double[])[-OtherStart, OtherStart])
            {
                var other = start.ToArray();
                other[k] += shift;
                yield return other;
            }
        }
    }
}
