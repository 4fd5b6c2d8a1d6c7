namespace HemoRheo;

/// <summary>A name and its text.</summary>
/// <param name="Name">The name.</param>
/// <param name="Text">The text.</param>
public sealed record NamedText(string Name, string Text);
