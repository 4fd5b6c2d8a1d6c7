namespace HemoRheo;

/// <summary>A positive parameter of a law, reported as a quantity of its own.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Symbol">Its symbol.</param>
/// <param name="Shown">The unit it is shown in.</param>
/// <param name="Law">Name of the law.</param>
/// <param name="Index">Place of the parameter in the law's formula.</param>
public sealed record LawNumber(string Name, string Symbol, Unit Shown, string Law, int Index) : Measurand(Name, Symbol, Shown, true)
{
    internal override FitValue? From(FittedLaw fit)
    {
        if (fit.Law.Name != Law) return null;
        var gradient = new double[fit.Scaled.Count];
        gradient[Index] = 1;
        return new(fit.Scaled[Index], gradient);
    }

    internal override bool ReachesBeyond(FlowCurve curve) => this == CassonYieldStress;

    /// <inheritdoc/>
    public override string ToString() => Name;
}
