namespace HemoRheo;

/// <summary>One difference between two runs.</summary>
/// <param name="What">What changed: an input, a setting, a version, a result.</param>
/// <param name="Name">Its name.</param>
/// <param name="Before">Before; null where it was not there.</param>
/// <param name="After">After; null where it is not there.</param>
/// <param name="NearestCause">For a result, the nearest input, setting or version that changed.</param>
public sealed record RunChange(string What, string Name, string? Before, string? After, string? NearestCause);
