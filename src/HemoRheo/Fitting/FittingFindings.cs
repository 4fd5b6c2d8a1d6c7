namespace HemoRheo;

/// <summary>What can be found about a fit.</summary>
public static partial class FittingFindings
{
    /// <summary>There are fewer points, or fewer different rates, than parameters.</summary>
    public static FindingKind TooFewPoints { get; } = new(
        "too-few-points",
        Severity.Fault,
        "The curve has fewer kept points, or fewer different shear rates, than the law has parameters.",
        "Points were set aside, or the program of rates was short.",
        "Measure at more shear rates, or use a law with fewer parameters.",
        "arithmetic");

    /// <summary>A rate or stress is not a finite number above zero.</summary>
    public static FindingKind NotPositive { get; } = new(
        "point-not-positive",
        Severity.Fault,
        "A kept point has a rate or a stress that is not a finite number above zero.",
        "Torque below its zero, a missing value written as a number, or a wrong column.",
        "Look at the reading; correct the torque zero or the layout, or set the point aside.",
        "arithmetic");

    /// <summary>The fit found no minimum.</summary>
    public static FindingKind NotConverged { get; } = new(
        "not-converged",
        Severity.Fault,
        "The fit found no minimum, also from other starts.",
        "The curve has not the shape of the law.",
        "Look at the curve; use another law.",
        "arithmetic");

    /// <summary>The shear rates of the curve cannot tell the parameters apart.</summary>
    public static FindingKind NotIdentifiable { get; } = new(
        "not-identifiable",
        Severity.Fault,
        "The curve cannot tell the parameters of the law apart.",
        "The rates cover too narrow a range, or the curve is of a simpler law.",
        "Measure over a wider range of rates, or use a law with fewer parameters.",
        "arithmetic");

    /// <summary>A parameter ended at its bound, where a simpler law takes over.</summary>
    public static FindingKind Boundary { get; } = new(
        "law-at-boundary",
        Severity.Note,
        "A parameter ended at its bound and is held there: a simpler law describes the curve.",
        "The low shear rates that would show the difference are missing or noisy, or the simpler law holds.",
        "Report the simpler law; do not interpret the parameter that is held.",
        "arithmetic");

    /// <summary>Numbers typed in by hand lie outside what blood can show.</summary>
    public static FindingKind NotLikeBlood { get; } = new(
        "numbers-not-like-blood",
        Severity.Warning,
        "Most points of a curve made from numbers have viscosities that neither blood nor plasma can show.",
        "Millipascals given as pascals, revolutions per minute as a shear rate, or another liquid.",
        "Check the units: rates in 1/s, stresses in Pa. Nothing was rescaled.",
        "common practice, no source: 0.5 mPa.s to 50 mPa.s and a yield stress of 1 Pa");

    /// <summary>The sizes of the errors cannot be estimated: no degrees of freedom.</summary>
    public static FindingKind NoScale { get; } = new(
        "no-error-scale",
        Severity.Fault,
        "There are as many parameters as points, so the size of the errors cannot be estimated and no value has an uncertainty.",
        "The error model is known up to a scale only, and the curve is short.",
        "Declare the sizes of the errors as known, or measure more points.",
        "arithmetic");

    /// <summary>The residuals are larger than the known errors allow.</summary>
    public static FindingKind LackOfFit { get; } = new(
        "lack-of-fit",
        Severity.Warning,
        "The residuals are larger than the known errors allow.",
        "The curve has not the shape of the law, a point is off, or the error model is too small.",
        "Look at the residuals along the curve; the judgment of the law rests on all curves of the study together.",
        "Pearson 1900, chi-square; level 0.001 by choice, so that one good curve in a thousand is named");
}
