namespace HemoRheo;

/// <summary>The first entry of a log that is not as it was written.</summary>
/// <param name="Number">Its number.</param>
/// <param name="What">What differs, in one sentence.</param>
public sealed record LogBreak(long Number, string What)
{
    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"entry {Number}: {What}");
}
