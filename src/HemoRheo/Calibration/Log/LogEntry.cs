namespace HemoRheo;

/// <summary>An entry of an instrument's log.</summary>
/// <param name="Number">Its number, from 1 without gaps.</param>
/// <param name="RecordedAt">When it was written, by the clock of whoever wrote it.</param>
/// <param name="By">Who wrote it.</param>
/// <param name="What">What it says.</param>
/// <param name="Digest">SHA-256 over it and the digest of the entry before, lower-case hexadecimal.</param>
/// <param name="Findings">Findings about it.</param>
public sealed record LogEntry(long Number, DateTimeOffset RecordedAt, string By, LoggedEvent What, string Digest, Items<Finding> Findings)
{
    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"{Number}, {RecordedAt:yyyy-MM-dd HH:mm zzz}, {By}: {What}");
}
