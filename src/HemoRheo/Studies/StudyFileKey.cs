namespace HemoRheo;

/// <summary>A key that a study file may have.</summary>
/// <param name="Section">The section it stands in, as the file writes it: <c>[files]</c>, <c>[[layouts]]</c>; empty for the top of the file.</param>
/// <param name="Name">Name of the key.</param>
/// <param name="Kind">What its value is.</param>
/// <param name="Meaning">What it says.</param>
/// <param name="Example">A value as the file writes it.</param>
public sealed record StudyFileKey(string Section, string Name, StudyFileKeyKind Kind, string Meaning, string Example)
{
    /// <summary>Whether the file must have it.</summary>
    public bool Required { get; init; } = true;

    /// <summary>The value used where the file has none, as the file would write it; null where the key is required, or where leaving it out says "none".</summary>
    public string? Default { get; init; }

    /// <summary>The quantity of its value; <see cref="Quantity.Number"/> where it has no unit.</summary>
    public Quantity Quantity { get; init; } = Quantity.Number;

    /// <summary>The words it allows, where it allows only some.</summary>
    public Items<string> Allowed { get; init; } = Items<string>.None;

    /// <summary>What numbers it allows, in words; empty where it holds none.</summary>
    public string Range => Kind is StudyFileKeyKind.Number or StudyFileKeyKind.Quantity or StudyFileKeyKind.Quantities ? Bounds.InWords() : "";

    internal KeyBounds Bounds { get; init; } = KeyBounds.Any;

    /// <inheritdoc/>
    public override string ToString() => Section.Length == 0 ? Name : $"{Section} {Name}";
}
