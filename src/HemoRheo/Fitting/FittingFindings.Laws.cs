namespace HemoRheo;

public static partial class FittingFindings
{
    /// <summary>The law itself failed while it was fitted.</summary>
    public static FindingKind LawFailed { get; } = new(
        "law-failed",
        Severity.Fault,
        "The law throws, or gives no finite stress, at a rate of the curve.",
        "A law of one's own takes a root or a logarithm of a number below zero, or divides by zero, at rates where it was not tried; or a curve's numbers are so large or small that they overflow.",
        "Read the message; correct the formula or its starts, or leave these rates out.",
        "arithmetic");
}
