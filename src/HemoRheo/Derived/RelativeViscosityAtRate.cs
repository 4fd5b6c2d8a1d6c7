namespace HemoRheo;

/// <summary>Apparent viscosity at a shear rate over the plasma viscosity of the same sample.</summary>
/// <param name="Rate">The shear rate.</param>
public sealed record RelativeViscosityAtRate(ShearRate Rate) : Measurand(
    string.Create(System.Globalization.CultureInfo.InvariantCulture, $"relative viscosity at {Rate.ReciprocalSeconds:G6} 1/s"),
    string.Create(System.Globalization.CultureInfo.InvariantCulture, $"η_r({Rate.ReciprocalSeconds:G6})"),
    ShownUnits.One,
    true)
{
    internal override FitValue? From(FittedLaw fit) => null;

    /// <inheritdoc/>
    public override string ToString() => Name;
}
