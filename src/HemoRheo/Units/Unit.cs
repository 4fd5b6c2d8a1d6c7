namespace HemoRheo;

/// <summary>A unit of the exact table of spellings.</summary>
/// <param name="Quantity">The quantity it measures.</param>
/// <param name="Symbol">Its symbol as shown.</param>
/// <param name="Ucum">Its UCUM code.</param>
/// <param name="Factor">SI value of one such unit (for temperatures: of one step, in K).</param>
/// <param name="Offset">SI value at zero, in degC for temperatures (inside, temperatures are degC); 0 for all else.</param>
public sealed record Unit(Quantity Quantity, string Symbol, string Ucum, double Factor, double Offset = 0)
{
    /// <summary>A number in this unit, in SI (temperatures in degC).</summary>
    public double ToSi(double number) => Factor * number + Offset;

    /// <summary>An SI number (temperatures in degC) in this unit.</summary>
    public double FromSi(double si) => (si - Offset) / Factor;

    /// <inheritdoc/>
    public override string ToString() => Symbol;
}
