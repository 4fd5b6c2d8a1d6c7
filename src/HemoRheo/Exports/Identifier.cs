namespace HemoRheo;

/// <summary>Identifiers of samples, persons and checks.</summary>
internal static class Identifier
{
    /// <summary>What is expected of an identifier. The identifier itself is never repeated: it may be a name.</summary>
    public const string Expected = "Found an identifier with other characters, expected a letter or digit and then letters, digits, - _ and . only, at most 64; it is kept as data.";

    /// <summary>Whether an identifier has nothing but letters, digits, - _ and ., begins with a letter or digit, and is no longer than 64.</summary>
    public static bool IsPlain(string text) =>
        text.Length is > 0 and <= 64 && char.IsLetterOrDigit(text[0]) && text.All(sign => char.IsLetterOrDigit(sign) || sign is '-' or '_' or '.');
}
