using System.Collections.Concurrent;

namespace HemoRheo;

/// <summary>Fits of one law to many curves: four a group, each with the same bits as alone, on any number of threads.</summary>
internal static class Fits
{
    public static FittedLaw[] OfAll(IReadOnlyList<FlowCurve> curves, FlowLaw law, ErrorModel errors)
    {
        ArgumentNullException.ThrowIfNull(curves);
        return InParallel(curves, law, [.. Enumerable.Repeat(errors, curves.Count)], 1, CancellationToken.None);
    }

    /// <summary>One fit a curve, in the order of the curves; the same bits on any number of threads.</summary>
    /// <param name="curves">The curves.</param>
    /// <param name="law">The law.</param>
    /// <param name="errors">One error model a curve.</param>
    /// <param name="threads">Threads at most; -1 for as many as there are.</param>
    /// <param name="cancel">Ends the work between two groups.</param>
    public static FittedLaw[] InParallel(IReadOnlyList<FlowCurve> curves, FlowLaw law, IReadOnlyList<ErrorModel> errors, int threads, CancellationToken cancel)
    {
        ArgumentNullException.ThrowIfNull(curves);
        ArgumentNullException.ThrowIfNull(law);
        foreach (var model in errors) Check(model);
        var fits = new FittedLaw[curves.Count];
        var data = new CurveData[curves.Count];
        var sound = new List<int>(curves.Count);
        for (var i = 0; i < fits.Length; i++)
        {
            data[i] = CurveData.Of(curves[i], law, errors[i]);
            if (data[i].Fault is { } fault) fits[i] = FitReport.Unfitted(law, curves[i], errors[i], fault);
            else sound.Add(i);
        }

        int[][] groups = [.. sound.Chunk(Lane.Count)];
        Parallel.ForEach(Partitioner.Create(groups, loadBalance: true), new ParallelOptions { MaxDegreeOfParallelism = threads, CancellationToken = cancel }, Fit);
        return fits;

        void Fit(int[] group)
        {
            var fitted = OfGroup(law, [.. group.Select(i => curves[i])], [.. group.Select(i => data[i])]);
            for (var lane = 0; lane < group.Length; lane++) fits[group[lane]] = fitted[lane];
        }
    }

    /// <summary>Where a curve's fit starts, on the fitting scale.</summary>
    internal static double[] StartOf(FlowLaw law, CurveData curve)
    {
        var guess = new double[law.Parameters.Count];
        law.FirstGuess(curve.Rates, curve.Stresses, guess);
        return law.ToScaled(guess);
    }

    /// <summary>Up to four curves. A user's law that throws ends the fit of the curve that made it throw, and no other.</summary>
    private static FittedLaw[] OfGroup(FlowLaw law, FlowCurve[] curves, CurveData[] data)
    {
        try
        {
            double[][] starts = [.. data.Select(curve => StartOf(law, curve))];
            var outcomes = LaneGroup.Outcomes(law, data, starts);
            return [.. curves.Select((curve, lane) => Report(law, curve, data[lane], Rescue.Settled(law, data[lane], starts[lane], outcomes[lane])))];
        }
        catch (Exception) when (law is UserLaw && curves.Length > 1)
        {
            return [.. curves.Select((curve, lane) => OfGroup(law, [curve], [data[lane]])[0])];
        }
        catch (Exception thrown) when (law is UserLaw)
        {
            return [Failed(law, curves[0], data[0], $"throws: {thrown.Message}")];
        }
    }

    private static FittedLaw Report(FlowLaw law, FlowCurve curve, CurveData data, CurveSolution solution)
    {
        if (solution.End.Reason is StopReason.BadData) return Failed(law, curve, data, "gives a stress or a slope that is not finite at a rate of the curve, where the fit starts");
        var fit = FitReport.Of(law, curve, data.Errors, solution);
        return FittingFindings.OfOther(law, curve.Label.Where, solution) is { } other ? fit with { Findings = [.. fit.Findings, other] } : fit;
    }

    private static FittedLaw Failed(FlowLaw law, FlowCurve curve, CurveData data, string words) =>
        FitReport.Unfitted(law, curve, data.Errors, FittingFindings.LawFailed.At(curve.Label.Where, $"{law.Name} {words}."));

    private static void Check(ErrorModel errors)
    {
        ArgumentNullException.ThrowIfNull(errors);
        if (!(errors.Relative >= 0 && errors.Floor.Pascals >= 0 && errors.Relative + errors.Floor.Pascals > 0) || !double.IsFinite(errors.Relative + errors.Floor.Pascals))
        {
            throw new ArgumentException($"An error model needs a relative part and a floor, neither below zero and one above it; this one is {errors}.", nameof(errors));
        }
    }
}
