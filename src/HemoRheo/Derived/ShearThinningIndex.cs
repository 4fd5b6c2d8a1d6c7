namespace HemoRheo;

/// <summary>Apparent viscosity at a low shear rate over that at a high one. Whatever multiplies all stresses alike, such as a calibration, leaves it.</summary>
/// <param name="Low">The low rate.</param>
/// <param name="High">The high rate.</param>
public sealed record ShearThinningIndex(ShearRate Low, ShearRate High) : Measurand(
    string.Create(System.Globalization.CultureInfo.InvariantCulture, $"shear-thinning index, {Low.ReciprocalSeconds:G6} over {High.ReciprocalSeconds:G6} 1/s"),
    string.Create(System.Globalization.CultureInfo.InvariantCulture, $"η({Low.ReciprocalSeconds:G6})/η({High.ReciprocalSeconds:G6})"),
    ShownUnits.One,
    true)
{
    internal override FitValue? From(FittedLaw fit)
    {
        var (low, high) = (new ViscosityAtRate(Low).From(fit)!, new ViscosityAtRate(High).From(fit)!);
        return new(low.X - high.X, [.. low.Gradient.Zip(high.Gradient, (a, b) => a - b)]);
    }

    internal override bool ReachesBeyond(FlowCurve curve) => !curve.Covers(Low) || !curve.Covers(High);

    /// <inheritdoc/>
    public override string ToString() => Name;
}
