namespace HemoRheo;

/// <summary>A value of the study file with its place, from 1.</summary>
internal abstract record TomlNode(int Line, int Column)
{
    /// <summary>What it is, in words, for a message.</summary>
    public abstract string InWords { get; }
}
