using System.Security.Cryptography;
using System.Text;
using static System.FormattableString;

namespace HemoRheo;

/// <summary>An entry as the file keeps it.</summary>
internal sealed record LogRow(long Number, string Kind, string RecordedAt, string By, string Content, string Digest)
{
    /// <summary>
    /// SHA-256 of six lines parted by line feeds, UTF-8: digest of the entry before (empty for the first), number, kind, moment of recording, who, content.
    /// None of them holds a line feed.
    /// </summary>
    internal string DigestAfter(string before) => Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(Invariant($"{before}\n{Number}\n{Kind}\n{RecordedAt}\n{By}\n{Content}"))));
}
