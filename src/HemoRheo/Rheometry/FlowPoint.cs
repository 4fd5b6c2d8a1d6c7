namespace HemoRheo;

/// <summary>One point of a flow curve.</summary>
/// <param name="Number">Number of its reading in the recording, from 1.</param>
/// <param name="Rate">Shear rate.</param>
/// <param name="Stress">Shear stress.</param>
/// <param name="Ramp">Ramp it belongs to.</param>
/// <param name="Reading">The reading it was made from; null for a curve made from numbers.</param>
public sealed record FlowPoint(int Number, ShearRate Rate, ShearStress Stress, Ramp Ramp, Reading? Reading)
{
    /// <summary>Apparent viscosity at this point.</summary>
    public Viscosity ApparentViscosity => Stress / Rate;
}
