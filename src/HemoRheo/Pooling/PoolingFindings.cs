namespace HemoRheo;

/// <summary>Findings about what the whole study tells.</summary>
public static class PoolingFindings
{
    /// <summary>No sample has two loadings, so the declared scatter is used.</summary>
    public static FindingKind LoadingDeclared { get; } = new(
        "loading-scatter-declared", Severity.Warning,
        "No replicate loadings show how loadings scatter; the scatter between loadings is the one the study file declares.",
        "Every sample was measured once.",
        "Load a tenth of the samples twice, at least ten of them.");

    /// <summary>No sample has two loadings and nothing is declared.</summary>
    public static FindingKind LoadingUnknown { get; } = new(
        "loading-scatter-unknown", Severity.Fault,
        "No replicate loadings show how loadings scatter and the study file declares no scatter between them, so the largest part of most budgets is missing.",
        "Every sample was measured once.",
        "Load some samples twice, or declare the scatter in the study file with its basis.");

    /// <summary>Replicate loadings that do not tell a measurand take no part in its scatter.</summary>
    public static FindingKind LoadingsNotIdentified { get; } = new(
        "loadings-not-identified", Severity.Note,
        "Replicate loadings whose readings do not tell a measurand take no part in its scatter between loadings.",
        "Blood without a yield stress that these shear rates could show.",
        "Look at the value's own finding; measure to lower rates.");

    /// <summary>The loading scatter rests on very few replicates.</summary>
    public static FindingKind LoadingFew { get; } = new(
        "loading-replicates-few", Severity.Warning,
        "The scatter between loadings is pooled from fewer than three degrees of freedom; intervals are honest and very wide.",
        "One or two samples were loaded twice.",
        "Load a tenth of the samples twice, at least ten of them.",
        "Simulated with the budget, this project");

    /// <summary>The estimate of loading scatter is held at its floor.</summary>
    public static FindingKind LoadingFloor { get; } = new(
        "loading-scatter-at-floor", Severity.Note,
        "In some pattern across the measurands replicate loadings differ by no more than their fits' own errors; that pattern's part is held at a tenth of the replicate variance, so that it is not taken for nothing.",
        "Few replicates, or loadings that repeat very well.",
        "Nothing, or load more samples twice.",
        "Simulated with the budget, this project");

    /// <summary>Replicate loadings have the same values.</summary>
    public static FindingKind LoadingsAlike { get; } = new(
        "loadings-alike", Severity.Warning,
        "Replicate loadings have one and the same value to nine digits, which no two fillings have; they show no scatter between loadings.",
        "One recording copied under the number of a second loading.",
        "See the export files of the replicates.");

    /// <summary>Readings of a ramp are correlated.</summary>
    public static FindingKind ReadingsCorrelated { get; } = new(
        "readings-correlated", Severity.Note,
        "Neighboring readings of a ramp are correlated beyond chance; standard errors and tests of fit know it.",
        "Slow drift of torque or temperature within a ramp, or smoothing inside the instrument.",
        "Nothing; or wait longer at each rate. A correlation that is known may be declared in the study file.",
        "Pooled products of neighboring residuals, this project; used below a probability of 0.01");

    /// <summary>The declared correlation is not that of the residuals.</summary>
    public static FindingKind CorrelationOffDeclared { get; } = new(
        "correlation-not-as-declared", Severity.Warning,
        "The residuals of the study contradict the declared correlation of neighboring readings by more than three standard errors, and the declared one is used.",
        "A correlation taken from other measurements, or a law that misses each curve in a way of its own.",
        "Look at the residuals; correct point_correlation in the study file, or leave it out to have it estimated.",
        "Pooled products of neighboring residuals, this project");

    /// <summary>The study's curves together contradict a law.</summary>
    public static FindingKind LawDoesNotFit { get; } = new(
        "law-does-not-fit", Severity.Fault,
        "The study's curves together contradict this law.",
        "Blood does not follow the law over these shear rates, or the declared error of readings is far too small.",
        "Decide by a law that the evidence allows; compare the fitted values with those interpolated from the readings.",
        "Pooled chi-square and mean residual pattern over the study");

    /// <summary>The study's curves cannot tell the deciding law from another one.</summary>
    public static FindingKind LawsNotParted { get; } = new(
        "laws-not-parted", Severity.Warning,
        "The study's curves together cannot tell the law that decides from another one; the spread of their values stands in every budget.",
        "Few or noisy curves, or a range of shear rates in which the laws agree.",
        "Measure more curves, or to lower shear rates; do not speak of what only one of the laws says.",
        "AIC pooled over the study; Burnham and Anderson 2002, page 70; GUM 4.3.7 for the spread");

    /// <summary>Another law describes the curves better than the deciding one.</summary>
    public static FindingKind LawBehind { get; } = new(
        "law-behind", Severity.Warning,
        "Another law of the study describes the curves better than the one that decides, beyond chance but by little a curve.",
        "A misfit that only many curves together can show.",
        "Decide by the law that is preferred; look how far its values lie from those decided on.",
        "AIC pooled over the study");

    /// <summary>No curve could be used to judge a law.</summary>
    public static FindingKind LawNotJudged { get; } = new(
        "law-not-judged", Severity.Fault,
        "No curve without a fault could be used to judge this law, so nothing is decided by it.",
        "Exports or the samples table could not be read, or every loading has a fault.",
        "Mend what the other findings name, then run again.");

    /// <summary>Residuals are larger than declared, without a pattern.</summary>
    public static FindingKind ScatterLargerThanDeclared { get; } = new(
        "scatter-larger-than-declared", Severity.Warning,
        "Residuals over the whole study are larger than the declared error of readings, without a common pattern.",
        "The relative error or the floor in the study file is too small.",
        "Measure the repeatability of readings and correct the study file.",
        "Pooled chi-square over the study");
}
