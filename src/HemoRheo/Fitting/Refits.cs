namespace HemoRheo;

/// <summary>One law fitted again and again to redrawn stresses of one curve.</summary>
internal static class Refits
{
    /// <summary>Fits every replicate with the law, rates and error model of a fit, starting from its estimates.</summary>
    /// <param name="fit">A converged fit.</param>
    /// <param name="replicates">How many.</param>
    /// <param name="draw">Fills in the stresses of a replicate, Pa, in the order of the curve's kept points; replicates are asked for one after the other.</param>
    /// <returns>Estimates on the fitting scale, replicate after replicate: minus infinity for a parameter held at its bound, NaN for all parameters of a replicate that did not converge or has a stress that is not above zero.</returns>
    public static double[] Of(FittedLaw fit, int replicates, Action<int, Span<double>> draw)
    {
        var size = fit.Law.Parameters.Count;
        double[] rates = [.. fit.Curve.Points.Select(point => point.Rate.ReciprocalSeconds)];
        var start = StartOf(fit);
        var estimates = new double[replicates * size];
        var drawn = new double[Lane.Count * rates.Length];
        var lanes = LaneGroup.OfThisThread;
        var good = new bool[Lane.Count];
        for (var from = 0; from < replicates; from += Lane.Count)
        {
            var members = Math.Min(Lane.Count, replicates - from);
            for (var lane = 0; lane < members; lane++) draw(from + lane, Stresses(lane));
            lanes.Begin(fit.Law, rates.Length, deviationsAreGiven: false);
            for (var lane = 0; lane < Lane.Count; lane++) lanes.Put(lane, rates, Stresses(Math.Min(lane, members - 1)), fit.Errors, start);
            lanes.Solve(fit.Law);
            for (var lane = 0; lane < members; lane++)
            {
                good[lane] = lanes.IsGood(lane);
                lanes.Estimates(lane, EstimatesOf(from + lane));
            }

            for (var lane = 0; lane < members; lane++)
            {
                var sound = AreSound(Stresses(lane));
                var settled = sound && (good[lane] || BareFits.Settle(lanes, fit.Law, new(rates, Stresses(lane).ToArray(), fit.Errors), start, EstimatesOf(from + lane)).Converged);
                if (!settled) EstimatesOf(from + lane).Fill(double.NaN);
            }
        }

        return estimates;

        Span<double> Stresses(int lane) => drawn.AsSpan(lane * rates.Length, rates.Length);
        Span<double> EstimatesOf(int replicate) => estimates.AsSpan(replicate * size, size);
    }

    private static bool AreSound(ReadOnlySpan<double> stresses)
    {
        foreach (var stress in stresses)
        {
            if (!(stress > 0 && double.IsFinite(stress))) return false;
        }

        return true;
    }

    /// <summary>The estimates; a parameter that is held starts inside its range.</summary>
    private static double[] StartOf(FittedLaw fit)
    {
        var start = fit.Scaled.ToArray();
        if (fit.Law.Boundary is not { } boundary || !double.IsNegativeInfinity(start[boundary.Parameter])) return start;
        var lowest = fit.Curve.Points.Min(point => point.Stress.Pascals);
        start[boundary.Parameter] = fit.Law.Parameters[boundary.Parameter].ToScaled(boundary.InsideAt(lowest));
        return start;
    }
}
