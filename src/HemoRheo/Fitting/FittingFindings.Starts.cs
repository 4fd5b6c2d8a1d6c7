using System.Globalization;

namespace HemoRheo;

public static partial class FittingFindings
{
    /// <summary>Two starts reach the same sum of squares with different estimates.</summary>
    public static FindingKind StartDecides { get; } = new(
        "start-decides",
        Severity.Fault,
        "Another start of the fit reaches the same sum of squares with other estimates: only the start decides between them.",
        "The rates cannot tell the parameters of the law apart, or two of them can change places.",
        "Measure over a wider range of rates, or use a law with fewer parameters.",
        "arithmetic");

    /// <summary>Another start ends in a higher minimum.</summary>
    public static FindingKind SeveralMinima { get; } = new(
        "several-minima",
        Severity.Warning,
        "Another start of the fit ends in another minimum; the lowest found is given.",
        "The curve has not the shape of the law, or a point is off.",
        "Look at the curve and its residuals; a law with fewer parameters has one minimum.",
        "arithmetic");

    /// <summary>What there is to say of another minimum; null where there is none.</summary>
    internal static Finding? OfOther(FlowLaw law, Where where, CurveSolution solution) => solution.Other is not { } other ? null
        : other.IsEqual ? StartDecides.At(where, string.Create(CultureInfo.InvariantCulture, $"{law.Name}: another start reaches the same sum of squares, {other.Distance:G6}, with other estimates."))
        : SeveralMinima.At(where, string.Create(CultureInfo.InvariantCulture, $"{law.Name}: another start ends at a sum of squares of {other.Distance:G6}, higher than the {other.Given:G6} given."), other.Distance, other.Given);
}
