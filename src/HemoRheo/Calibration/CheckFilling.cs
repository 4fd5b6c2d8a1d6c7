namespace HemoRheo;

/// <summary>One filling of the gap with a calibration fluid. A filling read again is no independent check.</summary>
/// <param name="Recording">Its recording; where it was recorded several times, the first one with the readings of all.</param>
/// <param name="Recordings">How many recordings it has.</param>
internal sealed record CheckFilling(Recording Recording, int Recordings)
{
    /// <summary>The fillings of an instrument's check recordings, by time.</summary>
    internal static Items<CheckFilling> Of(IEnumerable<Recording> checks) => checks
        .OrderBy(recording => recording.StartedAt)
        .ThenBy(recording => recording.Sample, StringComparer.Ordinal)
        .ThenBy(recording => recording.Loading)
        .GroupBy(recording => (recording.Sample, recording.Loading, recording.Fluid, recording.Geometry, recording.Day))
        .Select(filling => new CheckFilling(Together([.. filling]), filling.Count()))
        .ToItems();

    private static Recording Together(Recording[] recordings) => recordings.Length == 1
        ? recordings[0]
        : recordings[0] with { Readings = recordings.SelectMany(recording => recording.Readings).Select((reading, i) => reading with { Number = i + 1 }).ToItems(), Findings = recordings.SelectMany(recording => recording.Findings).ToItems() };
}
