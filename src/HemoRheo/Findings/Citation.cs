namespace HemoRheo;

/// <summary>Where a law, relation, fluid or limit was published.</summary>
/// <param name="Author">Author or authors.</param>
/// <param name="Year">Year.</param>
/// <param name="Text">The rest: journal and pages, table or equation.</param>
public sealed record Citation(string Author, int Year, string Text)
{
    /// <inheritdoc/>
    public override string ToString() => $"{Author} {Year}, {Text}";
}
