namespace HemoRheo;

/// <summary>The range of a question, or why there is none, with what was found on the way.</summary>
internal sealed record RangeAnswer(Question Question, ReferenceRange? Range, string? WhyNot, Items<Finding> Findings);
