namespace HemoRheo;

/// <summary>A key of the study file with its place and its value.</summary>
internal sealed record TomlEntry(string Key, int Line, int Column, TomlNode Node);
