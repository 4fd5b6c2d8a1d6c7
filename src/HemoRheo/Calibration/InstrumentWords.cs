namespace HemoRheo;

/// <summary>What the moments of adjustment say.</summary>
internal static class InstrumentWords
{
    /// <summary>The first adjustment after a moment; null where there is none.</summary>
    internal static DateTimeOffset? AdjustedAfter(this Instrument instrument, DateTimeOffset moment) =>
        instrument.Adjusted.Where(adjusted => adjusted > moment).Cast<DateTimeOffset?>().Min();
}
