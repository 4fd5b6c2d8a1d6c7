using static System.FormattableString;

namespace HemoRheo;

/// <summary>Finds the samples that an instrument puts in doubt: by the checks around them, as a whole and at the torques of their readings, then by the dated change of its control chart.</summary>
internal static class SamplesInDoubt
{
    /// <summary>Each sample once, by its first loading in doubt, in order of time.</summary>
    internal static Items<SampleInDoubt> Of(StudyReadings readings, InstrumentCourse course, ControlChart chart, IEnumerable<Recording> blood) => blood
        .OrderBy(recording => recording.StartedAt)
        .Select(recording => Doubt(readings, course, chart, recording))
        .OfType<SampleInDoubt>()
        .DistinctBy(doubt => doubt.Sample)
        .ToItems();

    private static SampleInDoubt? Doubt(StudyReadings readings, InstrumentCourse course, ControlChart chart, Recording recording)
    {
        var standing = course.At(recording.StartedAt);
        if (standing.Status != InstrumentStatus.InOrder) return Of(recording, standing.Status, standing.Reason);
        if (Torques(readings, course, recording) is { } torques) return Of(recording, InstrumentStatus.InDoubt, torques);
        return Change(chart, recording.StartedAt) is { } change ? Of(recording, InstrumentStatus.InDoubt, change) : null;
    }

    private static SampleInDoubt Of(Recording recording, InstrumentStatus status, string reason) =>
        new(recording.Sample, recording.Loading, recording.StartedAt, status, reason);

    private static string? Torques(StudyReadings readings, InstrumentCourse course, Recording recording)
    {
        if (!TorqueDoubts.HasFailedBand(course)) return null;
        var study = readings.Study;
        var curve = recording.ToCurve(study, study.Analysis.Ramp).Screened(study, readings.Samples.FirstOrDefault(sample => sample.Sample == recording.Sample));
        return TorqueDoubts.Of(course, curve, recording.StartedAt).FirstOrDefault()?.Message;
    }

    private static string? Change(ControlChart chart, DateTimeOffset moment)
    {
        var segment = chart.Segments.LastOrDefault(segment => segment.From is null || segment.From <= moment);
        return segment?.Changes is { } changes && moment >= changes.Earliest
            ? Invariant($"The control chart dates a change of the instrument to {changes.Better.MostLikely:yyyy-MM-dd}, at the earliest to {changes.Earliest:yyyy-MM-dd}.")
            : null;
    }
}
