namespace HemoRheo;

/// <summary>Where a parameter on the fitting scale has run to a bound of its range, and what then describes the curves.</summary>
/// <param name="at">Beyond this value the bound itself is tried.</param>
/// <param name="bound">The bound: minus or plus infinity.</param>
/// <param name="inside">A value to start again from.</param>
/// <param name="law">What takes over at the bound.</param>
internal sealed class JointWall(double at, double bound, double inside, string law)
{
    /// <summary>Beyond this value the bound itself is tried.</summary>
    public double At => at;

    /// <summary>The bound: minus or plus infinity.</summary>
    public double Bound => bound;

    /// <summary>A value to start again from.</summary>
    public double Inside => inside;

    /// <summary>What takes over at the bound.</summary>
    public string Law => law;

    /// <summary>1 where the range lies above the bound, -1 where it lies below.</summary>
    public int Inward => double.IsNegative(bound) ? 1 : -1;

    /// <summary>The wall of a law's limiting case; null where it has none.</summary>
    /// <param name="law">The law.</param>
    /// <param name="lowestStress">Lowest stress of the curves that have the parameter, Pa.</param>
    public static JointWall? Of(FlowLaw law, double lowestStress)
    {
        if (law.Boundary is not { } boundary) return null;
        var parameter = law.Parameters[boundary.Parameter];
        return new(parameter.ToScaled(boundary.WallAt(new(lowestStress))[0]), double.NegativeInfinity, parameter.ToScaled(boundary.InsideAt(lowestStress)), boundary.Law);
    }

    /// <summary>Whether a value lies beyond the wall.</summary>
    public bool IsPassedBy(double scaled) => Inward * (scaled - at) < 0;
}
