namespace HemoRheo;

/// <summary>How many were left out for one reason.</summary>
/// <param name="Code">Code of the finding.</param>
/// <param name="Count">How many.</param>
public sealed record CountedReason(string Code, int Count);
