namespace HemoRheo;

/// <summary>A dynamic viscosity, kept in Pa.s.</summary>
/// <param name="PascalSeconds">The viscosity in Pa.s.</param>
public readonly record struct Viscosity(double PascalSeconds)
{
    /// <summary>The viscosity in mPa.s.</summary>
    public double MillipascalSeconds => 1000 * PascalSeconds;

    /// <summary>A viscosity from its number in Pa.s.</summary>
    public static Viscosity FromPascalSeconds(double value) => new(value);

    /// <summary>A viscosity from its number in mPa.s.</summary>
    public static Viscosity FromMillipascalSeconds(double value) => new(value / 1000);

    /// <inheritdoc/>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{MillipascalSeconds:G6} mPa.s");
}
