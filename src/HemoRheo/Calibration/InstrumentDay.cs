using static System.FormattableString;

namespace HemoRheo;

/// <summary>An instrument's day as sources name it. Checks, blood and plasma of one day must name it alike, or what they share would not cancel.</summary>
internal static class InstrumentDay
{
    /// <summary>The key, e.g. <c>R1/2026-03-02</c>.</summary>
    internal static string Key(string instrument, DateOnly day) => Invariant($"{instrument}/{day:yyyy-MM-dd}");
}
