namespace HemoRheo;

/// <summary>
/// The one table of unit spellings. Case is kept (MPa.s is not mPa.s); only different signs for micro, multiplication, minus and powers are
/// made one before lookup. A spelling outside the table has no unit.
/// </summary>
public static class UnitTable
{
    private static readonly Dictionary<(string, Quantity), Unit> ByQuantity = UnitSpellings.All.ToDictionary(row => (row.Spelling, row.Unit.Quantity), row => row.Unit);
    private static readonly ILookup<string, Unit> BySpelling = UnitSpellings.All.ToLookup(row => row.Spelling, row => row.Unit);

    /// <summary>Every unit, each once.</summary>
    public static Items<Unit> All { get; } = UnitSpellings.All.Select(row => row.Unit).Distinct().ToItems();

    /// <summary>The unit of this spelling where it measures one quantity only; null where no unit is spelled so, or several of different quantities are.</summary>
    public static Unit? Find(string spelling)
    {
        var units = BySpelling[Spelling.Normalized(spelling)].ToArray();
        return units.Length == 1 ? units[0] : null;
    }

    /// <summary>The unit of this spelling that measures the wanted quantity; null where there is none.</summary>
    public static Unit? Find(string spelling, Quantity quantity) => ByQuantity.GetValueOrDefault((Spelling.Normalized(spelling), quantity));

    /// <summary>Every unit of this spelling, of whatever quantity.</summary>
    public static Items<Unit> FindAll(string spelling) => BySpelling[Spelling.Normalized(spelling)].ToItems();

    /// <summary>The spelling of the table nearest to this one; null where none is near.</summary>
    public static string? Nearest(string spelling) => Spelling.Nearest(Spelling.Normalized(spelling), UnitSpellings.All.Select(row => row.Spelling));

    /// <summary>The spelling nearest to this one among those of a quantity; null where none is near.</summary>
    public static string? Nearest(string spelling, Quantity quantity) => Spelling.Nearest(Spelling.Normalized(spelling), SpellingsOf(quantity));

    /// <summary>Every spelling of the units of a quantity, as they are after signs are made one.</summary>
    public static Items<string> SpellingsOf(Quantity quantity) => UnitSpellings.All.Where(row => row.Unit.Quantity == quantity).Select(row => row.Spelling).ToItems();
}
