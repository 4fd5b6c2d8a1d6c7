namespace HemoRheo;

/// <summary>A check on its chart.</summary>
/// <param name="Check">The check.</param>
/// <param name="InBaseline">Whether the limits were made of it.</param>
/// <param name="Limits">The limits it was held against, ln error: those of the baseline; while that is gathered, those the checks before it give; null for the first five.</param>
/// <param name="Average">The exponentially weighted average after it, ln error; null before the baseline is complete.</param>
/// <param name="AverageLimits">Limits of the average; null before the baseline is complete.</param>
/// <param name="Breaks">The rules it breaks.</param>
public sealed record ChartPoint(ChartedCheck Check, bool InBaseline, Interval? Limits, double? Average, Interval? AverageLimits, Items<ChartRule> Breaks);
