namespace HemoRheo;

/// <content>Findings of control charts.</content>
public static partial class CalibrationFindings
{
    /// <summary>The baseline of a control chart is not complete.</summary>
    public static FindingKind ChartProvisional { get; } = new(
        "chart-provisional",
        Severity.Note,
        "The control chart has fewer checks than its baseline needs, so its limits are provisional.",
        "A new instrument, or one adjusted lately.",
        "Go on checking; until then rely on the verdict of each check.",
        "Montgomery, Introduction to Statistical Quality Control: 20 to 25 observations; Hawkins 1987 for the limits until then");

    /// <summary>The baseline of a control chart wanders.</summary>
    public static FindingKind ChartBaselineUnsteady { get; } = new(
        "chart-baseline-unsteady",
        Severity.Warning,
        "Neighboring checks of the baseline are more alike than chance explains, so the limits may be too wide or too narrow for what follows.",
        "The instrument drifted while the baseline was gathered, or checks of one day or one filling stand for independent ones.",
        "Look at the baseline; have the instrument adjusted and gather another, or check with independent fillings on different days.",
        "von Neumann 1941");

    /// <summary>The fluid of the checks changed.</summary>
    public static FindingKind ChartFluidChanged { get; } = new(
        "chart-fluid-changed",
        Severity.Note,
        "From one check to the next the calibration fluid or its lot changed; a step there may come from the certificates and not from the instrument.",
        "A new bottle.",
        "Check with the old and the new lot on one day.");

    /// <summary>A check beyond three sigma.</summary>
    public static FindingKind ChartBeyondLimits { get; } = new(
        "chart-beyond-limits",
        Severity.Warning,
        "A check lies beyond the three-sigma limits of the control chart: the instrument, the fluid or the filling is not as it was.",
        "A sudden change of the instrument, a bubble, a wrong temperature, an old fluid.",
        "Check again with a new filling; if it repeats, look for the cause and for what was measured since the change.",
        "Shewhart 1931");

    /// <summary>Two of three checks beyond two sigma on one side.</summary>
    public static FindingKind ChartTwoOfThree { get; } = new(
        "chart-two-of-three",
        Severity.Warning,
        "Two of three successive checks lie beyond two sigma on the same side of the center.",
        "A change of about two sigma.",
        "Check again with a new filling; if it repeats, look for the cause and for what was measured since the change.",
        "Western Electric 1956; Champ and Woodall 1987");

    /// <summary>The weighted average beyond its limits.</summary>
    public static FindingKind ChartWeightedAverage { get; } = new(
        "chart-weighted-average",
        Severity.Warning,
        "The exponentially weighted average of the checks lies beyond its limits: the instrument drifts, or changed a little.",
        "Wear, a slowly ageing fluid, a drifting torque or temperature sensor.",
        "Compare with a fresh bottle; have the instrument adjusted before its checks fail.",
        "Roberts 1959; Lucas and Saccucci 1990");

    /// <summary>The change behind the signals is dated.</summary>
    public static FindingKind ChartChanged { get; } = new(
        "chart-changed",
        Severity.Warning,
        "The signals of the control chart are dated: the most likely moment of the change, with its interval, as a step or as a drift.",
        "What the signals' own findings name.",
        "Look up what was done to the instrument around that moment, and what was measured since.",
        "Hinkley 1970; Smith 1975");
}
