namespace HemoRheo;

/// <summary>What happens to a curve that its lane did not settle, judged on that curve alone: its boundary case, the general path, other starts.</summary>
internal static class Rescue
{
    /// <summary>The general path is for hard models; a flow law on its fitting scale that has not arrived by then runs off.</summary>
    private const int IterationLimit = 200;

    /// <summary>Sum of squares a degree of freedom above which a curve is not of the law's shape. There, and at a bound, fits have been seen to end in the higher of two minima; elsewhere in 14 of a million hard curves, mostly a minimum as good but for a thousandth.</summary>
    private const double OfAnotherShape = 100;

    /// <summary>The numbers of a curve, from its lane where they stand.</summary>
    public static CurveSolution Settled(FlowLaw law, CurveData curve, double[] start, LaneOutcome outcome)
    {
        var solution = outcome.Good ? outcome.Solution : Of(law, curve, start, outcome);
        var degrees = Math.Max(1, curve.Rates.Length - start.Length);
        var asked = solution.Other is not null || (start.Length == 1 && !law.MayHaveManyMinima) || !solution.End.Converged;
        var alone = !law.MayHaveManyMinima && solution.Held is null && solution.ChiSquare <= OfAnotherShape * degrees;
        var given = asked || alone ? solution : OtherStarts.Nearest(law, curve, [solution, .. OtherStarts.Reached(law, curve, start)])!;
        return !given.End.Converged || given.Inverse.All(double.IsFinite) ? given : given.Ended(new(StopReason.Singular, given.End.Iterations, "the sum of squares does not change with a parameter"));
    }

    public static CurveSolution Of(FlowLaw law, CurveData curve, double[] start, LaneOutcome outcome)
    {
        if (outcome.AtWall)
        {
            return AtBoundary(law, curve, outcome.Solution.Scaled);
        }

        var first = General(law, curve, start);
        if (IsBeyondWall(law, curve, first) && AtBoundary(law, curve, first.Scaled) is { End.Converged: true } bound) first = bound;
        CurveSolution[] own = first.End.Converged ? [first] : [];
        if (OtherStarts.Nearest(law, curve, [.. own, .. OtherStarts.Reached(law, curve, start)]) is not { } nearest) return first;

        // A minimum farther from the readings than a fit that found none is no answer.
        return OtherStarts.Distance(law, curve, first) < OtherStarts.Distance(law, curve, nearest) * (1 - OtherStarts.SameDistance) ? first : nearest;
    }

    /// <summary>The law with one parameter at its bound, or inside again where the sum of squares is lower.</summary>
    public static CurveSolution AtBoundary(FlowLaw law, CurveData curve, double[] near)
    {
        var lanes = LaneGroup.OfThisThread;
        var settled = BoundaryCase.Solve(lanes, law, curve, near);
        var solution = lanes.Outcome(0, curve).Solution;
        return settled ? solution : solution.Ended(new(StopReason.Singular, solution.End.Iterations, $"{law.Boundary!.Law}, its boundary, does not describe the curve either"));
    }

    private static CurveSolution General(FlowLaw law, CurveData curve, double[] start)
    {
        var s = LeastSquares.Solve(new LawOnPoints(law, curve.Rates).Evaluate, curve.Stresses, start, curve.Errors.Relative, curve.Errors.Floor.Pascals, curve.Deviations, IterationLimit);
        return new(s.Parameters, s.Inverse, s.Response, s.Residuals, s.ChiSquare, s.End, null);
    }

    private static bool IsBeyondWall(FlowLaw law, CurveData curve, CurveSolution solution) =>
        law.Boundary is { } boundary && solution.Scaled[boundary.Parameter] < LaneGroup.WallOf(law, curve);
}
