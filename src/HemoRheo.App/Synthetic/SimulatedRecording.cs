namespace HemoRheo.App.Synthetic;

/// <summary>One simulated filling of the gap.</summary>
/// <param name="Sample">Pseudonym of the sample, or name of the check.</param>
/// <param name="Loading">Number of the loading.</param>
/// <param name="Fluid">Calibration fluid; null for blood.</param>
/// <param name="StartedAt">Start.</param>
/// <param name="Readings">Readings, the downward ramp first.</param>
internal sealed record SimulatedRecording(string Sample, int Loading, string? Fluid, DateTimeOffset StartedAt, IReadOnlyList<SimulatedReading> Readings);
