namespace HemoRheo;

/// <summary>A shear stress, kept in Pa.</summary>
/// <param name="Pascals">The shear stress in Pa.</param>
public readonly record struct ShearStress(double Pascals)
{
    /// <summary>The shear stress in mPa.</summary>
    public double Millipascals => 1000 * Pascals;

    /// <summary>A shear stress from its number in Pa.</summary>
    public static ShearStress FromPascals(double value) => new(value);

    /// <summary>A shear stress from its number in mPa.</summary>
    public static ShearStress FromMillipascals(double value) => new(value / 1000);

    /// <summary>Apparent viscosity: stress over rate.</summary>
    public static Viscosity operator /(ShearStress stress, ShearRate rate) => Viscosity.FromPascalSeconds(stress.Pascals / rate.ReciprocalSeconds);

    /// <inheritdoc/>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{Millipascals:G6} mPa");
}
