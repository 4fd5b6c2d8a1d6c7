namespace HemoRheo;

/// <summary>Difference of two groups on the working scale (the logarithm of a ratio).</summary>
/// <param name="Question">Which question it answers: total, or adjusted for hematocrit.</param>
/// <param name="Difference">Second group less first, with its shared contributions.</param>
/// <param name="Probability">Two-sided probability under no difference; null where it could not be had.</param>
/// <param name="Method">Method and source.</param>
/// <param name="WhyNot">Why it could not be had; null where it could.</param>
public sealed record GroupDifference(string Question, Value? Difference, double? Probability, string Method, string? WhyNot);
