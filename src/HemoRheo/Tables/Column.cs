namespace HemoRheo;

/// <summary>A column of a table. Columns are written once, in <see cref="Glossary"/>.</summary>
/// <param name="Name">Its name, in plain words.</param>
/// <param name="Meaning">What a cell of it says, in one sentence.</param>
/// <param name="Unit">The unit of its numbers; null for text, counts, and numbers whose unit another column names.</param>
public sealed record Column(string Name, string Meaning, Unit? Unit = null)
{
    /// <summary>Its heading: the name, with the unit in brackets where it has one.</summary>
    public string Header => Unit is null or { Symbol: "1" } ? Name : $"{Name} [{Unit.Symbol}]";

    /// <inheritdoc/>
    public override string ToString() => Header;
}
