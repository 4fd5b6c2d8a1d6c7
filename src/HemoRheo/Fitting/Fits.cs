namespace HemoRheo;

/// <summary>Fits of one law to many curves: four a group, each with the same bits as alone.</summary>
internal static class Fits
{
    public static FittedLaw[] OfAll(IReadOnlyList<FlowCurve> curves, FlowLaw law, ErrorModel errors)
    {
        ArgumentNullException.ThrowIfNull(curves);
        ArgumentNullException.ThrowIfNull(law);
        Check(errors);
        var fits = new FittedLaw[curves.Count];
        var data = new CurveData[curves.Count];
        var sound = new List<int>(curves.Count);
        for (var i = 0; i < fits.Length; i++)
        {
            data[i] = CurveData.Of(curves[i], law);
            if (data[i].Fault is { } fault) fits[i] = FitReport.Unfitted(law, curves[i], errors, fault);
            else sound.Add(i);
        }

        foreach (var group in sound.Chunk(Lane.Count))
        {
            CurveData[] members = [.. group.Select(i => data[i])];
            double[][] starts = [.. members.Select(curve => StartOf(law, curve))];
            var outcomes = LaneGroup.Solve(law, members, starts, errors);
            for (var lane = 0; lane < group.Length; lane++)
            {
                var solution = outcomes[lane].Good ? outcomes[lane].Solution : Rescue.Of(law, members[lane], starts[lane], errors, outcomes[lane]);
                fits[group[lane]] = FitReport.Of(law, curves[group[lane]], errors, solution);
            }
        }

        return fits;
    }

    /// <summary>Where a curve's fit starts, on the fitting scale.</summary>
    internal static double[] StartOf(FlowLaw law, CurveData curve)
    {
        var guess = new double[law.Parameters.Count];
        law.FirstGuess(curve.Rates, curve.Stresses, guess);
        return law.ToScaled(guess);
    }

    private static void Check(ErrorModel errors)
    {
        ArgumentNullException.ThrowIfNull(errors);
        if (!(errors.Relative >= 0 && errors.Floor.Pascals >= 0 && errors.Relative + errors.Floor.Pascals > 0) || !double.IsFinite(errors.Relative + errors.Floor.Pascals))
        {
            throw new ArgumentException($"An error model needs a relative part and a floor, neither below zero and one above it; this one is {errors}.", nameof(errors));
        }
    }
}
