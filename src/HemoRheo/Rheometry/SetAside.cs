namespace HemoRheo;

/// <summary>A point that is kept out of fits, with the reasons. It stays in the data.</summary>
/// <param name="Point">The point.</param>
/// <param name="Findings">Why.</param>
public sealed record SetAside(FlowPoint Point, Items<Finding> Findings)
{
    /// <inheritdoc/>
    public override string ToString() => $"point {Point.Number}: {string.Join("; ", Findings.Select(finding => finding.Message))}";
}
