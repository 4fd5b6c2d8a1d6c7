namespace HemoRheo;

/// <summary>An entry as it stands after corrections.</summary>
/// <param name="Entry">The entry as it was written.</param>
/// <param name="What">What holds now.</param>
/// <param name="Corrections">Its corrections, in the order in which they were written; none for most.</param>
public sealed record StandingEntry(LogEntry Entry, LoggedEvent What, Items<LogEntry> Corrections)
{
    /// <inheritdoc/>
    public override string ToString() => Corrections.Count == 0 ? $"{What}" : FormattableString.Invariant($"{What} (corrected by entry {Corrections[^1].Number})");
}
