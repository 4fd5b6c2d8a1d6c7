namespace HemoRheo;

/// <summary>
/// A structure parameter of Quemada's law (an intrinsic viscosity) at a hematocrit and a plasma viscosity that are taken as exact:
/// k0 = (2/H)(1 - r sqrt(plasma viscosity / high-shear viscosity)) at rest, kinf = (2/H)(1 - sqrt(plasma viscosity / high-shear viscosity)) at high shear.
/// </summary>
/// <param name="AtRest">Whether it is k0; else it is kinf.</param>
/// <param name="Hematocrit">Hematocrit H.</param>
/// <param name="Plasma">Plasma viscosity at the temperature of the curve.</param>
/// <remarks>Its uncertainty is that of the fit alone; <see cref="QuemadaStructure"/> adds those of hematocrit and plasma. Source: Quemada 1978, Rheologica Acta 17:632-642.</remarks>
public sealed record StructureParameter(bool AtRest, Hematocrit Hematocrit, Viscosity Plasma)
    : Measurand(AtRest ? "structure parameter at rest" : "structure parameter at high shear", AtRest ? "k_0" : "k_∞", ShownUnits.One, false)
{
    internal override FitValue? From(FittedLaw fit)
    {
        if (fit.Law != FlowLaw.Quemada) return null;
        var ratio = AtRest ? fit.Law.Parameters[2].ToNatural(fit.Scaled[2]) : 1;
        var part = 2 / Hematocrit.LiterPerLiter * ratio * Math.Sqrt(Plasma.PascalSeconds) * Math.Exp(-fit.Scaled[0] / 2);
        return new(2 / Hematocrit.LiterPerLiter - part, [part / 2, 0, AtRest ? -part * (1 - ratio) : 0]);
    }

    internal override bool ReachesBeyond(FlowCurve curve) => AtRest;

    /// <inheritdoc/>
    public override string ToString() => Name;
}
