namespace HemoRheo;

/// <summary>What a check says of the instrument.</summary>
public enum CheckOutcome
{
    /// <summary>The uncertainty is too large to decide.</summary>
    CannotTell,

    /// <summary>Within the limit.</summary>
    Passes,

    /// <summary>Beyond the limit.</summary>
    Fails,
}
