namespace HemoRheo;

/// <summary>What the checks around a moment say of an instrument, from best to worst.</summary>
public enum InstrumentStatus
{
    /// <summary>The last check passed, it is not overdue, and no later failure reaches back.</summary>
    InOrder,

    /// <summary>Between the last passed check and the first failed one, or a check is overdue, or the last could not tell.</summary>
    InDoubt,

    /// <summary>After a failed check and before the next passed one.</summary>
    Failed,

    /// <summary>No check before this moment.</summary>
    Unknown,
}
