namespace HemoRheo;

/// <summary>A run with an empty gap: the torque zero and its noise by speed.</summary>
/// <param name="At">When, with offset.</param>
/// <param name="Geometry">Name of the geometry; null where none is named.</param>
/// <param name="Readings">By speed.</param>
public sealed record LoggedBlankRun(DateTimeOffset At, string? Geometry, Items<LoggedBlankReading> Readings) : LoggedEvent
{
    internal override string Kind => "blank run";

    internal override DateTimeOffset? Happened => At;

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"blank run of {At:yyyy-MM-dd} at {Readings.Count} speeds");
}
