namespace HemoRheo;

/// <summary>Two runs held side by side.</summary>
/// <param name="Changes">What differs; empty when the runs are identical.</param>
public sealed record RunComparison(Items<RunChange> Changes)
{
    /// <summary>Whether every input, setting, version and number is the same.</summary>
    public bool Identical => Changes.Count == 0;

    /// <inheritdoc/>
    public override string ToString() => Identical ? "identical" : $"{Changes.Count} changes";
}
