namespace HemoRheo.Notebooks;

/// <summary>A sample with a loading measured while an instrument was not in order.</summary>
/// <param name="Sample">Pseudonym.</param>
/// <param name="Loading">Number of the loading.</param>
/// <param name="At">When it was measured.</param>
/// <param name="Standing">What the checks said then.</param>
internal sealed record TouchedSample(string Sample, int Loading, DateTimeOffset At, InstrumentStanding Standing);
