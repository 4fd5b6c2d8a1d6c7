namespace HemoRheo;

/// <summary>One line of a text file.</summary>
/// <param name="Text">The line without its end.</param>
/// <param name="Number">Its number, from 1.</param>
/// <param name="Ended">Whether a line end follows it.</param>
internal readonly record struct TextLine(string Text, int Number, bool Ended);
