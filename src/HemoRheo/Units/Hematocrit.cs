namespace HemoRheo;

/// <summary>A hematocrit: the volume of red cells in a volume of blood, kept in L/L.</summary>
/// <param name="LiterPerLiter">The hematocrit in L/L, between 0 and 1.</param>
public readonly record struct Hematocrit(double LiterPerLiter)
{
    /// <summary>The hematocrit in per cent.</summary>
    public double Percent => 100 * LiterPerLiter;

    /// <summary>A hematocrit from its number in L/L.</summary>
    public static Hematocrit FromLiterPerLiter(double value) => new(value);

    /// <summary>A hematocrit from its number in per cent.</summary>
    public static Hematocrit FromPercent(double value) => new(value / 100);

    /// <inheritdoc/>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{LiterPerLiter:G4} L/L");
}
