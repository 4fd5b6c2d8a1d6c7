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

    /// <summary>The law with one parameter at its bound; back inside if the sum of squares falls that way.</summary>
    private static CurveSolution AtBoundary(FlowLaw law, CurveData curve, double[] near)
    {
        var boundary = law.Boundary!;
        var parameter = boundary.Parameter;
        var start = near.ToArray();
        start[parameter] = law.Parameters[parameter].ToScaled(law.Parameters[parameter].Lower);
        var held = LaneGroup.Outcomes(law, [curve], [start], parameter)[0];
        if (!held.Good) return held.Solution.Ended(new(StopReason.Singular, held.Solution.End.Iterations, $"{boundary.Law}, its boundary, does not describe the curve either"));
        if (!FallsInward(law, curve, held.Solution)) return held.Solution;
        var inside = held.Solution.Scaled.ToArray();
        inside[parameter] = law.Parameters[parameter].ToScaled(boundary.InsideAt(curve.LowestStress));
        var again = LaneGroup.Outcomes(law, [curve], [inside])[0];
        return again.Good ? again.Solution : held.Solution;
    }

    /// <summary>Whether the sum of squares falls when the held parameter leaves its bound.</summary>
    private static bool FallsInward(FlowLaw law, CurveData curve, CurveSolution held)
    {
        var parameter = law.Boundary!.Parameter;
        var wall = held.Scaled.ToArray();
        wall[parameter] = LaneGroup.WallOf(law, curve);
        var slopes = new double[wall.Length];
        double score = 0;
        for (var i = 0; i < curve.Rates.Length; i++)
        {
            var stress = law.StressAt(curve.Rates[i], wall, slopes);
            score += slopes[parameter] * (curve.Stresses[i] - stress) / curve.VarianceOf(i, stress);
        }

        return score > 0;
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
