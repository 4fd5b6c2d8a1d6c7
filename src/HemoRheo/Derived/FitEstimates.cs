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
        if (!fit.Usable) throw new InvalidOperationException($"The {fit.Law.Name} fit of {fit.Curve.Label.Sample} is not usable: {fit.Convergence.Message}. Look at its findings.");
        var value = measurand.From(fit) ?? throw new ArgumentException($"{measurand.Name} does not come from a fit of {fit.Law.Name}.", nameof(measurand));
        return new(measurand, value.ToValue(fit), measurand is ViscosityAtRate at ? !fit.Curve.Covers(at.Rate) : measurand == Measurand.CassonYieldStress);
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
}
