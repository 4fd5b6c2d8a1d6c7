namespace HemoRheo;

/// <summary>A value with its verdict.</summary>
/// <param name="Value">The value.</param>
/// <param name="Range">The range it was held against; null where there is none.</param>
/// <param name="Verdict">The verdict; null where it was not judged.</param>
/// <param name="WhyNotJudged">Why there is no verdict; null where there is one.</param>
/// <param name="ChangesWithLimits">Whether the outcome would change if the limits moved within their own intervals.</param>
/// <param name="Marked">Whether it is marked because the instrument was not in order; a marked value is never counted silently.</param>
public sealed record JudgedValue(SampleValue Value, ReferenceRange? Range, Verdict? Verdict, string? WhyNotJudged, bool ChangesWithLimits, bool Marked);
