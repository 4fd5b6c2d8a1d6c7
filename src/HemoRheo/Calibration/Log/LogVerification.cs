using static System.FormattableString;

namespace HemoRheo;

/// <summary>Whether a log is as it was written.</summary>
/// <param name="Entries">Number of entries there are.</param>
/// <param name="LastDigest">Digest of the last one: noted elsewhere, it shows later that nothing up to it was changed, replaced or cut off.</param>
/// <param name="FirstBreak">The first entry that is not as it was written; null where all are.</param>
/// <remarks>The digests show a change by whoever does not make all later digests anew. Against that only a digest noted outside the file helps.</remarks>
public sealed record LogVerification(int Entries, string LastDigest, LogBreak? FirstBreak)
{
    /// <summary>Whether every entry is as it was written.</summary>
    public bool Sound => FirstBreak is null;

    /// <inheritdoc/>
    public override string ToString() => Sound ? Invariant($"{Entries} entries, all as written; last digest {LastDigest}") : Invariant($"broken at {FirstBreak}");
}
