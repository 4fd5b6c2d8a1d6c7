namespace HemoRheo;

/// <summary>A law with one parameter at its bound, solved alone in a group of lanes.</summary>
internal static class BoundaryCase
{
    /// <summary>Solves at the bound, and once more from inside; the lower sum of squares is kept. The answer stands in the first lane of the group.</summary>
    /// <param name="lanes">The group.</param>
    /// <param name="law">A law with a boundary.</param>
    /// <param name="curve">The curve.</param>
    /// <param name="near">Estimates on the way to the bound, on the fitting scale.</param>
    /// <returns>Whether the law at its bound has a minimum.</returns>
    public static bool Solve(LaneGroup lanes, FlowLaw law, CurveData curve, ReadOnlySpan<double> near)
    {
        var boundary = law.Boundary!;
        var bounded = law.Parameters[boundary.Parameter];
        Span<double> held = stackalloc double[near.Length];
        near.CopyTo(held);
        held[boundary.Parameter] = bounded.ToScaled(bounded.Lower);
        lanes.SolveAlone(law, curve, held, boundary.Parameter);
        if (!lanes.IsGood(0)) return false;
        lanes.Estimates(0, held);
        var chiSquare = lanes.ChiSquareOf(0);
        Span<double> inside = stackalloc double[near.Length];
        held.CopyTo(inside);
        inside[boundary.Parameter] = bounded.ToScaled(boundary.InsideAt(curve.LowestStress));
        lanes.SolveAlone(law, curve, inside);
        if (!lanes.IsGood(0) || lanes.ChiSquareOf(0) >= chiSquare) lanes.SolveAlone(law, curve, held, boundary.Parameter);
        return true;
    }
}
