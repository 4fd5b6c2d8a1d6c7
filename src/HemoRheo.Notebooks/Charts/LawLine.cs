namespace HemoRheo.Notebooks;

/// <summary>The line of a fitted law between the lowest and highest kept shear rate of its curve, never outside.</summary>
internal static class LawLine
{
    private const int Steps = 60;

    /// <summary>Points of the line, evenly spaced on the logarithmic scale.</summary>
    /// <param name="fit">The fit.</param>
    public static IEnumerable<LawPoint> Of(FittedLaw fit)
    {
        if (fit.Curve.KeptRates is not { } kept) yield break;
        var estimates = fit.Parameters.Select(parameter => parameter.Estimate).ToArray();
        for (var step = 0; step <= Steps; step++)
        {
            var rate = kept.Lower * Math.Pow(kept.Upper / kept.Lower, (double)step / Steps);
            var viscosity = fit.Law.Stress(new(rate), estimates) / new ShearRate(rate);
            yield return new(rate, viscosity.MillipascalSeconds, fit.Usable ? fit.ApparentViscosity(new(rate)).Interval() : null);
        }
    }
}
