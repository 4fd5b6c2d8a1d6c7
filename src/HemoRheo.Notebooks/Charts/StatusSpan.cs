namespace HemoRheo.Notebooks;

/// <summary>A stretch of time in which an instrument keeps one status.</summary>
/// <param name="From">Its start.</param>
/// <param name="Until">Its end.</param>
/// <param name="Status">The status.</param>
internal readonly record struct StatusSpan(DateTimeOffset From, DateTimeOffset Until, InstrumentStatus Status);
