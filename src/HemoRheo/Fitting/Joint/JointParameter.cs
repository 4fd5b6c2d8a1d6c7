namespace HemoRheo;

/// <summary>A parameter of a joint fit.</summary>
/// <param name="Number">The parameter, its estimate and standard error on the natural scale.</param>
/// <param name="Curve">Number of the curve it belongs to, from 0, in the order of <see cref="JointFit.Curves"/>; null where all curves share it.</param>
public sealed record JointParameter(FittedParameter Number, int? Curve)
{
    /// <summary>Whether all curves share it.</summary>
    public bool Shared => Curve is null;
}
