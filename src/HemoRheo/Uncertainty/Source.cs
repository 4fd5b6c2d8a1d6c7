namespace HemoRheo;

/// <summary>Where a contribution comes from: its kind and what it belongs to. Two values with the same source share that error.</summary>
/// <param name="Kind">The kind.</param>
/// <param name="Of">What it belongs to, e.g. <c>R1/period 2</c>, <c>S-0042/1/0</c>; empty when all values share one.</param>
public readonly record struct Source(SourceKind Kind, string Of)
{
    /// <summary>Whether many samples share this source, so that a mean does not average it away.</summary>
    public bool Shared => Kind is not (SourceKind.Fit or SourceKind.Loading or SourceKind.Hematocrit or SourceKind.Plasma or SourceKind.People);

    /// <inheritdoc/>
    public override string ToString() => Of.Length == 0 ? Kind.Words() : $"{Kind.Words()} of {Of}";
}
