using System.Text;

namespace HemoRheo;

/// <summary>Text encodings by their web names, strict: bytes that are no text are never replaced.</summary>
internal static class TextEncodings
{
    static TextEncodings() => Encoding.RegisterProvider(CodePagesEncodingProvider.Instance);

    /// <summary>The encoding of this name; null where none is named so.</summary>
    public static Encoding? Find(string name)
    {
        try
        {
            return Encoding.GetEncoding(name, EncoderFallback.ExceptionFallback, DecoderFallback.ExceptionFallback);
        }
        catch (ArgumentException)
        {
            return null;
        }
    }
}
