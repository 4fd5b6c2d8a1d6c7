namespace HemoRheo.App;

/// <summary>Text from files, made harmless for a terminal.</summary>
internal static class Plain
{
    /// <summary>The text with every control character shown as a question mark, so that nothing in a file can steer the terminal.</summary>
    public static string Text(string text) => string.Create(text.Length, text, static (letters, source) =>
    {
        for (var i = 0; i < letters.Length; i++) letters[i] = char.IsControl(source[i]) ? '?' : source[i];
    });
}
