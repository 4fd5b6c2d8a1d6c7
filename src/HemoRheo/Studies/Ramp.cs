namespace HemoRheo;

/// <summary>Direction of a ramp of shear rates.</summary>
public enum Ramp
{
    /// <summary>From high to low rates, after a pre-shear.</summary>
    Down,

    /// <summary>From low to high rates.</summary>
    Up,

    /// <summary>The export does not say, or the readings have no direction.</summary>
    Unstated,
}
