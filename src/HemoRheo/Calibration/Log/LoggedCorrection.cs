namespace HemoRheo;

/// <summary>A correction of an earlier entry, which itself stays as it is. The last correction of an entry counts.</summary>
/// <param name="Of">Number of the entry; not that of another correction.</param>
/// <param name="Why">Why.</param>
/// <param name="Instead">What holds instead, of the same kind; null where the entry holds no longer.</param>
public sealed record LoggedCorrection(long Of, string Why, LoggedEvent? Instead) : LoggedEvent
{
    internal override string Kind => "correction";

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"entry {Of} {(Instead is null ? "withdrawn" : "corrected")}: {Why}");
}
