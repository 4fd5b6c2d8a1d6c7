namespace HemoRheo;

/// <summary>A shear rate, kept in 1/s.</summary>
/// <param name="ReciprocalSeconds">The shear rate in 1/s.</param>
public readonly record struct ShearRate(double ReciprocalSeconds)
{
    /// <summary>A shear rate from its number in 1/s.</summary>
    public static ShearRate FromReciprocalSeconds(double value) => new(value);

    /// <inheritdoc/>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{ReciprocalSeconds:G6} 1/s");
}
