using static System.FormattableString;

namespace HemoRheo;

/// <summary>Holds the rows of a log against their digests.</summary>
internal static class LogChain
{
    /// <summary>The verification, where each row was tried to be read and gave null where it cannot be.</summary>
    internal static LogVerification Verify(IReadOnlyList<LogRow> rows, IReadOnlyList<LoggedEvent?> read, string? noted = null)
    {
        var last = rows.Count == 0 ? "" : rows[^1].Digest;
        var broken = FirstBreak(rows, read);
        if (broken is null && noted is not null && rows.All(row => row.Digest != noted))
        {
            broken = new(rows.Count, Invariant($"no entry has the digest noted earlier ({Short(noted)}): entries were cut off at the end, or the log was written anew."));
        }

        return new(rows.Count, last, broken);
    }

    private static LogBreak? FirstBreak(IReadOnlyList<LogRow> rows, IReadOnlyList<LoggedEvent?> read)
    {
        if (rows.Count == 0) return new(1, "there is no entry at all, not even the opening one.");
        var before = "";
        for (var i = 0; i < rows.Count; i++)
        {
            var row = rows[i];
            if (row.Number != i + 1) return new(i + 1, Invariant($"it is missing; number {row.Number} comes next."));
            var computed = row.DigestAfter(before);
            if (computed != row.Digest) return new(row.Number, What(row, computed, i + 1 < rows.Count ? rows[i + 1] : null));
            if (read[i] is null) return new(row.Number, $"its content cannot be read as a {row.Kind}.");
            before = row.Digest;
        }

        return null;
    }

    // The next entry was written over the digest as it was, so it tells which of the two was changed.
    private static string What(LogRow row, string computed, LogRow? next)
    {
        var digests = $"digest {Short(row.Digest)} stands there, {Short(computed)} is computed";
        if (next is null) return $"its kind, moment, name, content or digest was changed after it was written ({digests}).";
        if (next.DigestAfter(computed) == next.Digest) return $"its digest was changed after it was written; what it says was not ({digests}).";
        return next.DigestAfter(row.Digest) == next.Digest
            ? $"its kind, moment, name or content was changed after it was written ({digests})."
            : $"it does not follow from the entry before, which was replaced together with its digest, or it and the next were changed ({digests}).";
    }

    private static string Short(string digest) => digest.Length > 12 ? digest[..12] : digest;
}
