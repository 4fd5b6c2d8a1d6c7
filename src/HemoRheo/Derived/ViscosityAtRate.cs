namespace HemoRheo;

/// <summary>Apparent viscosity at a shear rate.</summary>
/// <param name="Rate">The shear rate.</param>
public sealed record ViscosityAtRate(ShearRate Rate) : Measurand(
    string.Create(System.Globalization.CultureInfo.InvariantCulture, $"viscosity at {Rate.ReciprocalSeconds:G6} 1/s"),
    string.Create(System.Globalization.CultureInfo.InvariantCulture, $"η({Rate.ReciprocalSeconds:G6})"),
    ShownUnits.MillipascalSecond,
    true)
{
    /// <inheritdoc/>
    public override string ToString() => Name;
}
