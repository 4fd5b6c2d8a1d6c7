namespace HemoRheo;

/// <summary>Statuses of instruments as reports print them.</summary>
public static class InstrumentStatusWords
{
    /// <summary>The status in lower case, e.g. <c>in doubt</c>.</summary>
    /// <param name="status">The status.</param>
    public static string Words(this InstrumentStatus status) => status switch
    {
        InstrumentStatus.InOrder => "in order",
        InstrumentStatus.InDoubt => "in doubt",
        InstrumentStatus.Failed => "failed",
        InstrumentStatus.Unknown => "unknown",
        _ => throw new ArgumentOutOfRangeException(nameof(status)),
    };
}
