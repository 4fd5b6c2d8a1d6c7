using System.Text;

namespace HemoRheo;

/// <summary>The text of a study file or certificate file.</summary>
internal static class StudyText
{
    /// <summary>The text; empty, with a fault, where the bytes are not UTF-8.</summary>
    public static string Decoded(byte[] bytes, StudyFileFaults faults)
    {
        ReadOnlySpan<byte> body = bytes;
        if (body.StartsWith(Encoding.UTF8.Preamble)) body = body[Encoding.UTF8.Preamble.Length..];
        try
        {
            return new UTF8Encoding(false, throwOnInvalidBytes: true).GetString(body);
        }
        catch (DecoderFallbackException wrong)
        {
            var before = body[..Math.Max(0, wrong.Index)];
            var line = before.Count((byte)'\n') + 1;
            var column = Encoding.UTF8.GetCharCount(before[(before.LastIndexOf((byte)'\n') + 1)..]) + 1;
            faults.Add(line, column, "bytes that are not UTF-8", "a text file in UTF-8", "save the file as UTF-8");
            return "";
        }
    }
}
