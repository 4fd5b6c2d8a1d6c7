namespace HemoRheo;

/// <summary>A control chart between two adjustments of the instrument.</summary>
/// <param name="From">The adjustment that began it; null before the first.</param>
/// <param name="Points">Its checks in order of time.</param>
/// <param name="Baseline">What its limits rest on; null below two checks that did not fail.</param>
/// <param name="Signals">Rules broken, by time.</param>
/// <param name="Changes">When the instrument changed; null without a signal.</param>
/// <param name="Findings">Findings, those of the signals included.</param>
public sealed record ChartSegment(DateTimeOffset? From, Items<ChartPoint> Points, ChartBaseline? Baseline, Items<ChartSignal> Signals, ChartChanges? Changes, Items<Finding> Findings)
{
    /// <inheritdoc/>
    public override string ToString() => $"{Points.Count} checks, {(Baseline is { Established: true } ? $"limits from {Baseline.Checks} of them" : "limits provisional")}, {Signals.Count} signals";
}
