namespace HemoRheo;

/// <summary>Directions of ramps as reports print them.</summary>
public static class RampWords
{
    /// <summary>The direction in lower case, e.g. <c>downward</c>.</summary>
    /// <param name="ramp">The direction.</param>
    public static string Words(this Ramp ramp) => ramp switch
    {
        Ramp.Down => "downward",
        Ramp.Up => "upward",
        Ramp.Unstated => "unstated",
        _ => throw new ArgumentOutOfRangeException(nameof(ramp)),
    };
}
