using System.Text;

namespace HemoRheo;

/// <summary>Byte order marks.</summary>
internal static class TextMark
{
    /// <summary>The encoding that a mark at the start of these bytes says, strict, and the mark's length; null where there is no mark.</summary>
    public static (Encoding Encoding, int Length)? Of(ReadOnlySpan<byte> bytes)
    {
        foreach (var name in new[] { "utf-8", "utf-32", "utf-16", "utf-16BE" })
        {
            var encoding = TextEncodings.Find(name)!;
            if (bytes.StartsWith(encoding.GetPreamble())) return (encoding, encoding.GetPreamble().Length);
        }

        return null;
    }

    /// <summary>Whether a mark's encoding is the declared one; utf-16 stands for either byte order.</summary>
    public static bool Agrees(Encoding mark, Encoding declared) => mark.CodePage == declared.CodePage || (mark.CodePage == 1201 && declared.CodePage == 1200);
}
