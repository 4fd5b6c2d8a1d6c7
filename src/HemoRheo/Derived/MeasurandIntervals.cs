namespace HemoRheo;

/// <summary>Intervals of measurands from one fit: <c>fit.Interval(Measurand.Viscosity(1.PerSecond()))</c>.</summary>
public static class MeasurandIntervals
{
    /// <summary>The interval of a measurand, from this curve alone. What these shear rates cannot tell is left open: an interval may have one side, or none.</summary>
    /// <param name="fit">The fit.</param>
    /// <param name="measurand">The measurand.</param>
    /// <param name="level">Coverage, between 0 and 1.</param>
    /// <param name="method">How.</param>
    /// <param name="draws">Seed and replicates of a bootstrap; null for the defaults.</param>
    /// <exception cref="ArgumentException">The measurand does not come from this law.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The level is not between 0 and 1, or there are too few replicates.</exception>
    public static FitInterval Interval(this FittedLaw fit, Measurand measurand, double level = 0.95, IntervalMethod method = IntervalMethod.ProfileLikelihood, BootstrapDraws? draws = null) =>
        Beyond(fit, measurand, Intervals.Of(fit, FunctionOf(fit, measurand), level, method, draws));

    /// <summary>The profile of a measurand, and the interval in it.</summary>
    /// <param name="fit">The fit.</param>
    /// <param name="measurand">The measurand.</param>
    /// <param name="level">Coverage, between 0 and 1.</param>
    /// <exception cref="ArgumentException">The measurand does not come from this law.</exception>
    /// <exception cref="ArgumentOutOfRangeException">The level is not between 0 and 1.</exception>
    public static Profile Profile(this FittedLaw fit, Measurand measurand, double level = 0.95)
    {
        var profile = Intervals.ProfileOf(fit, FunctionOf(fit, measurand), level);
        return profile with { Interval = Beyond(fit, measurand, profile.Interval) };
    }

    private static FitInterval Beyond(FittedLaw fit, Measurand measurand, FitInterval interval) => measurand is not LawNumber && measurand.ReachesBeyond(fit.Curve)
        ? interval with { Findings = interval.Findings.With([FittingFindings.IntervalExtrapolated.At(fit.Curve.Label.Where, $"Right only if the form of {fit.Law.Name} is: {measurand.Name} lies outside the kept shear rates.")]) }
        : interval;

    /// <summary>A measurand as a function of the parameters of a fit's law.</summary>
    internal static FitFunction FunctionOf(FittedLaw fit, Measurand measurand)
    {
        ArgumentNullException.ThrowIfNull(fit);
        ArgumentNullException.ThrowIfNull(measurand);
        if (fit.Scaled.Count > 0 && measurand.From(fit) is null) throw new ArgumentException($"{measurand.Name} does not come from a fit of {fit.Law.Name}.", nameof(measurand));
        if (measurand is LawNumber number) return FitFunction.Of(fit.Law.Parameters[number.Index], number.Index).Named(measurand.Name, measurand.Shown);
        return new(measurand.Name, measurand.Shown, new(double.NegativeInfinity, double.PositiveInfinity), measurand.ToSi, At, null, !measurand.Logarithmic);

        double At(ReadOnlySpan<double> scaled, Span<double> gradient)
        {
            var value = measurand.From(Moved(fit, scaled))!;
            value.Gradient.CopyTo(gradient);
            return value.X;
        }
    }

    /// <summary>The fit with other numbers in its place.</summary>
    private static FittedLaw Moved(FittedLaw fit, ReadOnlySpan<double> scaled)
    {
        var natural = fit.Law.ToNatural(scaled);
        return fit with { Scaled = Items.Create(scaled), Parameters = fit.Parameters.Select((parameter, k) => parameter with { Estimate = natural[k] }).ToItems() };
    }
}
