namespace HemoRheo;

/// <summary>A limiting case of a law: one parameter at its lower bound, where another law takes over.</summary>
/// <param name="Parameter">Number of the parameter.</param>
/// <param name="Law">Name of the law that takes over.</param>
/// <param name="Wall">A value so near the bound that the bound itself is tried.</param>
/// <param name="Inside">A value to start again from.</param>
/// <param name="OfLowestStress">Whether both values are multiples of the lowest stress of the curve.</param>
internal sealed record LawBoundary(int Parameter, string Law, double Wall, double Inside, bool OfLowestStress)
{
    /// <summary>The value at which a curve's parameter has run to its bound.</summary>
    public Lane WallAt(Lane lowestStress) => OfLowestStress ? Wall * lowestStress : new(Wall);

    /// <summary>The value to start again from.</summary>
    public double InsideAt(double lowestStress) => OfLowestStress ? Inside * lowestStress : Inside;
}
