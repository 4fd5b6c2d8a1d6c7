using static System.FormattableString;

namespace HemoRheo;

/// <summary>Finds the samples that an instrument puts in doubt: by the checks around them, then by the dated change of its control chart.</summary>
internal static class SamplesInDoubt
{
    /// <summary>Each sample once, by its first loading in doubt, in order of time.</summary>
    internal static Items<SampleInDoubt> Of(InstrumentCourse course, ControlChart chart, IEnumerable<Recording> blood) => blood
        .OrderBy(recording => recording.StartedAt)
        .Select(recording => Doubt(course, chart, recording))
        .OfType<SampleInDoubt>()
        .DistinctBy(doubt => doubt.Sample)
        .ToItems();

    private static SampleInDoubt? Doubt(InstrumentCourse course, ControlChart chart, Recording recording)
    {
        var standing = course.At(recording.StartedAt);
        if (standing.Status != InstrumentStatus.InOrder) return Of(recording, standing.Status, standing.Reason);
        return Change(chart, recording.StartedAt) is { } change ? Of(recording, InstrumentStatus.InDoubt, change) : null;
    }

    private static SampleInDoubt Of(Recording recording, InstrumentStatus status, string reason) =>
        new(recording.Sample, recording.Loading, recording.StartedAt, status, reason);

    private static string? Change(ControlChart chart, DateTimeOffset moment)
    {
        var segment = chart.Segments.LastOrDefault(segment => segment.From is null || segment.From <= moment);
        return segment?.Changes is { } changes && moment >= changes.Earliest
            ? Invariant($"The control chart dates a change of the instrument to {changes.Better.MostLikely:yyyy-MM-dd}, at the earliest to {changes.Earliest:yyyy-MM-dd}.")
            : null;
    }
}
