namespace HemoRheo;

/// <summary>A row of the samples table, and what it says of recordings whose exports do not.</summary>
internal sealed record SampleRow(SampleRecord Record, string? Instrument, string? Geometry, DateTimeOffset? StartedAt);
