namespace HemoRheo;

/// <summary>A row of the samples table, and what it says of recordings whose exports do not.</summary>
/// <param name="Record">The row. Its person is empty and its visit 1 where the table does not say them, until <see cref="SampleMetadata"/> completes them.</param>
/// <param name="Person">The person as the table has it.</param>
/// <param name="PersonColumn">Number of the column of persons.</param>
/// <param name="Visit">The visit as the table has it.</param>
/// <param name="Instrument">The instrument as the table has it.</param>
/// <param name="Geometry">The geometry as the table has it.</param>
/// <param name="StartedAt">The start as the table has it.</param>
internal sealed record SampleRow(SampleRecord Record, string? Person, int? PersonColumn, int? Visit, string? Instrument, string? Geometry, DateTimeOffset? StartedAt);
