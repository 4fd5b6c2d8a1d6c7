namespace HemoRheo;

/// <summary>What a value is, held against two limits.</summary>
public enum Outcome
{
    /// <summary>No outcome reaches the level.</summary>
    Undecided,

    /// <summary>Below the lower limit.</summary>
    Below,

    /// <summary>Between the limits.</summary>
    Within,

    /// <summary>Above the upper limit.</summary>
    Above,
}
