namespace HemoRheo;

/// <summary>A row of the check table: what it says of a check whose export does not.</summary>
internal sealed record CheckRow(string Check, string? Fluid, string? Instrument, string? Geometry, DateTimeOffset? StartedAt, Where Where);
