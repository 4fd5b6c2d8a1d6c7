namespace HemoRheo;

/// <summary>Fits of one law to many curves from given starts, without records: numbers into arrays of the caller. Nothing is allocated once a thread is warm, except for curves that their lane does not settle.</summary>
internal static class BareFits
{
    /// <summary>Fits every curve; each has the bits of a fit alone from the same start, but that a fit at its bound, or of another shape, is not tried from other starts.</summary>
    /// <param name="law">The law.</param>
    /// <param name="curves">The curves, without faults; standard deviations are given for all of them or for none.</param>
    /// <param name="starts">Starts on the fitting scale, curve after curve.</param>
    /// <param name="estimates">Receives the estimates on the fitting scale, curve after curve; minus infinity for a parameter held at its bound.</param>
    /// <param name="chiSquares">Receives the sums of squares.</param>
    /// <param name="converged">Receives whether each fit reached a minimum.</param>
    public static void Of(FlowLaw law, ReadOnlySpan<CurveData> curves, ReadOnlySpan<double> starts, Span<double> estimates, Span<double> chiSquares, Span<bool> converged)
    {
        var size = law.Parameters.Count;
        var lanes = LaneGroup.OfThisThread;
        for (var from = 0; from < curves.Length; from += Lane.Count)
        {
            var members = curves.Slice(from, Math.Min(Lane.Count, curves.Length - from));
            lanes.Begin(law, members);
            for (var lane = 0; lane < Lane.Count; lane++)
            {
                var member = Math.Min(lane, members.Length - 1);
                lanes.Put(lane, members[member], starts.Slice((from + member) * size, size));
            }

            lanes.Solve(law);
            var unsettled = 0;
            for (var lane = 0; lane < members.Length; lane++)
            {
                converged[from + lane] = lanes.IsGood(lane);
                if (!converged[from + lane]) unsettled++;
                lanes.Estimates(lane, estimates.Slice((from + lane) * size, size));
                chiSquares[from + lane] = lanes.ChiSquareOf(lane);
            }

            for (var lane = 0; unsettled > 0 && lane < members.Length; lane++)
            {
                if (converged[from + lane]) continue;
                var at = (from + lane) * size;
                (converged[from + lane], chiSquares[from + lane]) = Settle(lanes, law, members[lane], starts.Slice(at, size), estimates.Slice(at, size));
            }
        }
    }

    /// <summary>A curve that its lane did not settle: at its bound, or by the long way.</summary>
    /// <param name="lanes">A group of lanes.</param>
    /// <param name="law">The law.</param>
    /// <param name="curve">The curve.</param>
    /// <param name="start">Where it started.</param>
    /// <param name="estimates">Where its lane ended; receives the estimates.</param>
    public static (bool Converged, double ChiSquare) Settle(LaneGroup lanes, FlowLaw law, CurveData curve, ReadOnlySpan<double> start, Span<double> estimates)
    {
        lanes.SolveAlone(law, curve, start);
        if (lanes.EndOf(0).AtWall && BoundaryCase.Solve(lanes, law, curve, estimates))
        {
            lanes.Estimates(0, estimates);
            return (true, lanes.ChiSquareOf(0));
        }

        double[] begin = [.. start];
        var solution = Rescue.Of(law, curve, begin, LaneGroup.Outcomes(law, [curve], [begin])[0]);
        solution.Scaled.CopyTo(estimates);
        return (solution.End.Converged, solution.ChiSquare);
    }
}
