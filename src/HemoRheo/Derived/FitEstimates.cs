namespace HemoRheo;

/// <summary>Values derived from one fit.</summary>
public static class FitEstimates
{
    /// <summary>Apparent viscosity at a rate, with the fit's uncertainty.</summary>
    /// <param name="fit">A usable fit.</param>
    /// <param name="at">Shear rate above zero.</param>
    /// <exception cref="InvalidOperationException">The fit is not usable.</exception>
    public static Estimate ApparentViscosity(this FittedLaw fit, ShearRate at) => fit.Estimate(Measurand.Viscosity(at));

    /// <summary>A measurand of this fit, with the fit's uncertainty.</summary>
    /// <param name="fit">A usable fit.</param>
    /// <param name="measurand">The measurand.</param>
    /// <exception cref="InvalidOperationException">The fit is not usable.</exception>
    /// <exception cref="ArgumentException">The measurand does not come from this law.</exception>
    public static Estimate Estimate(this FittedLaw fit, Measurand measurand)
    {
        Check(fit);
        var value = measurand.From(fit) ?? throw new ArgumentException($"{measurand.Name} does not come from a fit of {fit.Law.Name}.", nameof(measurand));
        return new(measurand, value.ToValue(fit), measurand.ReachesBeyond(fit.Curve));
    }

    /// <summary>Structure parameters of Quemada's law from its fit: <c>fit.Structure(Hematocrit.FromPercent(45), 0.006, Viscosity.FromMillipascalSeconds(1.2), 0.01)</c>.</summary>
    /// <param name="fit">A usable fit of Quemada's law.</param>
    /// <param name="hematocrit">Hematocrit of the sample, between 0 and 1 L/L.</param>
    /// <param name="hematocritUncertainty">Its standard uncertainty, L/L.</param>
    /// <param name="plasma">Plasma viscosity of the sample, at the temperature of the curve.</param>
    /// <param name="plasmaRelativeUncertainty">Its relative standard uncertainty.</param>
    /// <exception cref="InvalidOperationException">The fit is not usable.</exception>
    /// <exception cref="ArgumentException">The fit is of another law, or a number lies outside its range.</exception>
    public static QuemadaStructure Structure(this FittedLaw fit, Hematocrit hematocrit, double hematocritUncertainty, Viscosity plasma, double plasmaRelativeUncertainty)
    {
        if (!(hematocritUncertainty >= 0 && double.IsFinite(hematocritUncertainty))) throw new ArgumentException(FormattableString.Invariant($"A standard uncertainty is zero or above; that of the hematocrit is {hematocritUncertainty}."), nameof(hematocritUncertainty));
        if (!(plasmaRelativeUncertainty >= 0 && double.IsFinite(plasmaRelativeUncertainty))) throw new ArgumentException(FormattableString.Invariant($"A standard uncertainty is zero or above; that of the plasma viscosity is {plasmaRelativeUncertainty}."), nameof(plasmaRelativeUncertainty));
        if (!(plasma.PascalSeconds > 0 && double.IsFinite(plasma.PascalSeconds))) throw new ArgumentException($"A plasma viscosity is above zero; this one is {plasma}.", nameof(plasma));
        var sample = fit.Curve.Label.Sample;
        return fit.Structure(
            new Value(hematocrit.LiterPerLiter, [new(new(SourceKind.Hematocrit, sample), hematocritUncertainty)]),
            new Value(Math.Log(plasma.PascalSeconds), [new(new(SourceKind.Plasma, sample), plasmaRelativeUncertainty)]));
    }

    /// <summary>Structure parameters of Quemada's law from its fit, with hematocrit and plasma viscosity as values that carry their sources.</summary>
    /// <param name="fit">A usable fit of Quemada's law.</param>
    /// <param name="hematocrit">Hematocrit of the sample, L/L.</param>
    /// <param name="logPlasma">Natural logarithm of its plasma viscosity in Pa.s, at the temperature of the curve.</param>
    /// <exception cref="InvalidOperationException">The fit is not usable.</exception>
    /// <exception cref="ArgumentException">The fit is of another law, or the hematocrit lies outside 0 to 1 L/L.</exception>
    public static QuemadaStructure Structure(this FittedLaw fit, Value hematocrit, Value logPlasma)
    {
        Check(fit);
        if (fit.Law != FlowLaw.Quemada) throw new ArgumentException($"Structure parameters come from a fit of Quemada's law, not of {fit.Law.Name}: fit FlowLaw.Quemada.", nameof(fit));
        if (!(hematocrit.X > 0 && hematocrit.X < 1)) throw new ArgumentException(FormattableString.Invariant($"A hematocrit lies between 0 and 1 L/L; this one is {hematocrit.X}."), nameof(hematocrit));
        if (!double.IsFinite(logPlasma.X)) throw new ArgumentException("The logarithm of the plasma viscosity is not finite.", nameof(logPlasma));
        return QuemadaStructure.Of(fit, hematocrit, logPlasma);
    }

    /// <summary>Whether a rate lies within the kept shear rates.</summary>
    public static bool Covers(this FlowCurve curve, ShearRate rate) =>
        curve.KeptRates is { } kept && rate.ReciprocalSeconds >= kept.Lower * (1 - 1e-9) && rate.ReciprocalSeconds <= kept.Upper * (1 + 1e-9);

    /// <summary>Natural logarithm of the viscosity (Pa.s) read off between the two kept readings around a rate, linear in log rate; null where they do not enclose it.</summary>
    public static double? LogViscosityBetweenReadings(this FlowCurve curve, ShearRate at)
    {
        if (!curve.Covers(at)) return null;
        var rate = Math.Log(at.ReciprocalSeconds);
        var points = curve.Points.Select(point => (Rate: Math.Log(point.Rate.ReciprocalSeconds), Viscosity: Math.Log(point.ApparentViscosity.PascalSeconds))).OrderBy(point => point.Rate).ToArray();
        var above = Array.FindIndex(points, point => point.Rate >= rate);
        if (above <= 0) return points[above < 0 ? ^1 : 0].Viscosity;
        var (low, high) = (points[above - 1], points[above]);
        var share = high.Rate > low.Rate ? (rate - low.Rate) / (high.Rate - low.Rate) : 1;
        return low.Viscosity + share * (high.Viscosity - low.Viscosity);
    }

    private static void Check(FittedLaw fit)
    {
        if (!fit.Usable) throw new InvalidOperationException($"The {fit.Law.Name} fit of {fit.Curve.Label.Sample} is not usable: {fit.Convergence.Message}. Look at its findings.");
    }
}
