namespace HemoRheo;

/// <summary>What can be found about intervals of a fit.</summary>
public static partial class FittingFindings
{
    /// <summary>A profile came below the sum of squares of the fit.</summary>
    public static FindingKind BelowTheFit { get; } = new(
        "profile-below-fit",
        Severity.Warning,
        "With one quantity held, the sum of squares falls below that of the fit: the fit was not at the lowest minimum.",
        "The sum of squares has several minima: the curve has not the shape of the law, or a point is off.",
        "Look at the curve; take neither the estimate nor the interval at its word.",
        "arithmetic");

    /// <summary>More than one refit in a hundred of a bootstrap failed.</summary>
    public static FindingKind FailedRefits { get; } = new(
        "bootstrap-refits-failed",
        Severity.Warning,
        "More than 1 % of the refits of a bootstrap failed and are left out of its percentiles.",
        "The curve hardly tells the parameters apart, or its lowest stresses are near the floor of the errors.",
        "Use profile likelihood, or a law with fewer parameters.",
        "limit 1 % by choice: fewer move a 95 % limit by less than its own sampling error");

    /// <summary>An interval of a quantity outside the kept shear rates.</summary>
    public static FindingKind IntervalExtrapolated { get; } = new(
        "interval-extrapolated",
        Severity.Warning,
        "The quantity lies outside the kept shear rates, so the form of the law gives it: the interval holds only if that form is right there.",
        "The rate asked for is not among those measured.",
        "Measure at that rate; report no value there, or as extrapolated.",
        "arithmetic");

    /// <summary>A yield stress far below the stresses that were read.</summary>
    public static FindingKind YieldStressByForm { get; } = new(
        "yield-stress-by-form",
        Severity.Warning,
        "The limits of a yield stress lie far below every stress that was read, so the form of the law gives them: another law that describes the readings as well may have another yield stress, or none.",
        "The program of shear rates ends above the rates at which a yield stress shows.",
        "Measure at lower rates; ask curve.FlowBehavior() whether the curve shows a yield stress; do not compare such yield stresses between laws.",
        "Barnes and Walters 1985, Rheologica Acta 24:323-326; limit 2 by choice: at least half of the lowest stress would be yield stress");
}
