using static System.FormattableString;

namespace HemoRheo;

/// <summary>What a chart between two adjustments says beside its points.</summary>
internal static class ChartSegmentFindings
{
    internal static IEnumerable<Finding> Of(ChartedCheck[] checks, ChartBaseline? baseline, int asked, Items<ChartSignal> signals, ChartChanges? changes)
    {
        if (baseline is not { Established: true })
        {
            var gathered = baseline?.Checks ?? checks.Count(check => check.Outcome != CheckOutcome.Fails);
            yield return CalibrationFindings.ChartProvisional.At(Where.Nowhere, Invariant($"{gathered} of {asked} checks for the baseline are there; until then a check is held against those before it, and neither the weighted average nor two of three are judged."), gathered, asked);
        }
        else if (baseline.SuccessiveRatio < baseline.LeastRatio)
        {
            yield return CalibrationFindings.ChartBaselineUnsteady.At(
                checks[0].Where,
                Invariant($"In the baseline of {baseline.Checks} checks neighbors are too alike: successive ratio {baseline.SuccessiveRatio:F2}, which 1 steady baseline in 100 falls below {baseline.LeastRatio:F2}; sigma is {100 * baseline.Scatter:G2} % by the scatter, {100 * baseline.MovingRangeScatter:G2} % by the moving range."),
                baseline.SuccessiveRatio,
                baseline.LeastRatio);
        }

        foreach (var (one, next) in checks.Zip(checks.Skip(1)).Where(pair => pair.First.Fluid != pair.Second.Fluid))
        {
            yield return CalibrationFindings.ChartFluidChanged.At(next.Where, $"From {next} on the fluid is {next.Fluid}, before it was {one.Fluid}; a step there may be the certificates'.");
        }

        foreach (var signal in signals) yield return signal.Finding;
        if (changes is not null) yield return CalibrationFindings.ChartChanged.At(signals[0].First.Where, $"The instrument changed: {changes}.");
    }
}
