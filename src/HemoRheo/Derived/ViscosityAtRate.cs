namespace HemoRheo;

/// <summary>Apparent viscosity at a shear rate.</summary>
/// <param name="Rate">The shear rate.</param>
public sealed record ViscosityAtRate(ShearRate Rate) : Measurand(
    string.Create(System.Globalization.CultureInfo.InvariantCulture, $"viscosity at {Rate.ReciprocalSeconds:G6} 1/s"),
    string.Create(System.Globalization.CultureInfo.InvariantCulture, $"η({Rate.ReciprocalSeconds:G6})"),
    ShownUnits.MillipascalSecond,
    true)
{
    internal override FitValue? From(FittedLaw fit)
    {
        Span<double> slopes = stackalloc double[fit.Scaled.Count];
        var rate = Rate.ReciprocalSeconds;
        var stress = fit.Law.StressAt(rate, fit.Scaled.Span, slopes);
        var gradient = new double[slopes.Length];
        for (var i = 0; i < gradient.Length; i++) gradient[i] = slopes[i] / stress;
        return new(Math.Log(stress / rate), gradient);
    }

    internal override bool ReachesBeyond(FlowCurve curve) => !curve.Covers(Rate);

    /// <inheritdoc/>
    public override string ToString() => Name;
}
