namespace HemoRheo;

/// <summary>A cohort summary.</summary>
/// <param name="Study">Name of the study.</param>
/// <param name="By">What the groups are by.</param>
/// <param name="Measurands">One summary a measurand.</param>
/// <param name="Outcomes">How many verdicts of each kind in each group, marked ones apart.</param>
/// <param name="Cautions">Cautions a reader needs, many comparisons included.</param>
/// <param name="Findings">Findings.</param>
public sealed record CohortSummary(string Study, string By, Items<MeasurandSummary> Measurands, Items<OutcomeCount> Outcomes, Items<string> Cautions, Items<Finding> Findings);
