namespace HemoRheo.Tests;

/// <summary>A measurand that only one law has, on its own scale.</summary>
internal sealed record InventedIndex() : Measurand("invented index", "I", ShownUnits.One, false)
{
    public override string ToString() => Name;

    internal override FitValue? From(FittedLaw fit) => null;
}
