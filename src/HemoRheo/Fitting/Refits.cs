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
        Array.Fill(estimates, double.NaN);
        foreach (var group in Enumerable.Range(0, replicates).Chunk(Lane.Count))
        {
            CurveData[] drawn = [.. group.Select(i => Drawn(rates, i, fit.Errors, draw))];
            int[] sound = [.. Enumerable.Range(0, drawn.Length).Where(i => drawn[i].LowestStress > 0)];
            if (sound.Length == 0) continue;
            CurveData[] curves = [.. sound.Select(i => drawn[i])];
            var outcomes = LaneGroup.Outcomes(fit.Law, curves, [.. curves.Select(_ => start)]);
            for (var lane = 0; lane < curves.Length; lane++)
            {
                var solution = outcomes[lane].Good ? outcomes[lane].Solution : Rescue.Of(fit.Law, curves[lane], start, outcomes[lane]);
                if (solution.End.Converged) solution.Scaled.CopyTo(estimates, group[sound[lane]] * size);
            }
        }

        return estimates;
    }

    private static CurveData Drawn(double[] rates, int replicate, ErrorModel errors, Action<int, Span<double>> draw)
    {
        var stresses = new double[rates.Length];
        draw(replicate, stresses);
        return new(rates, stresses, errors);
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
