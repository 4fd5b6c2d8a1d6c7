namespace HemoRheo;

public static partial class FittingFindings
{
    /// <summary>A curve took no part in a joint fit.</summary>
    public static FindingKind CurveLeftOut { get; } = new(
        "curve-left-out",
        Severity.Warning,
        "A curve took no part in the joint fit: its numbers cannot be fitted, or it has fewer different rates than parameters of its own.",
        "A reading below the torque zero, a wrong column, or points that were set aside.",
        "Look at the curve's own fit; correct the reading or set the point aside.",
        "arithmetic");

    /// <summary>Fewer than two curves are left for a joint fit.</summary>
    public static FindingKind TooFewCurves { get; } = new(
        "too-few-curves",
        Severity.Fault,
        "Fewer than two curves are left to be fitted together.",
        "Curves were left out, each with a finding of its own.",
        "Correct the curves that were left out, or fit the one that is left alone.",
        "arithmetic");

    /// <summary>The curves do not share the parameters that they were fitted with.</summary>
    public static FindingKind SharedContradicted { get; } = new(
        "sharing-contradicted",
        Severity.Warning,
        "The curves fitted together lie farther from their law than each fitted alone, more than chance allows: they do not share the parameters.",
        "The blood changed between the curves, a loading is bad beyond a factor, or the parameter does depend on hematocrit.",
        "Look at the curves' own fits and residuals; share fewer parameters, or leave the odd curve out with its reason.",
        "likelihood ratio and F test of nested models (Seber and Wild 1989, Nonlinear Regression, section 5.9); level 0.001 by choice");

    /// <summary>Whether the curves share their parameters could not be tested.</summary>
    public static FindingKind SharingNotTested { get; } = new(
        "sharing-not-tested",
        Severity.Note,
        "Whether the curves share the parameters could not be tested.",
        "A curve alone cannot tell the parameters of the law, so there is nothing to hold the joint fit against.",
        "Take the sharing as an assumption, and say so.",
        "arithmetic");

    /// <summary>The loading factors scatter by no more than the readings explain.</summary>
    public static FindingKind LoadingScatterHidden { get; } = new(
        "loading-scatter-hidden",
        Severity.Note,
        "The factors of the loadings scatter by little more, or by less, than the errors of the readings explain: a tenth of their variance is kept as the scatter between loadings.",
        "Few loadings, noisy readings, or one recording entered twice.",
        "Look whether the loadings are different fillings of the gap; the study's pooled scatter is the better estimate.",
        "as for the scatter pooled over a study");
}
