namespace HemoRheo;

/// <summary>Findings of a cohort summary.</summary>
public static class CohortFindings
{
    /// <summary>There is no people table, or it is empty.</summary>
    public static FindingKind PeopleMissing { get; } = new(
        "people-missing", Severity.Warning,
        "Nobody's group is known, so groups cannot be compared.",
        "The study file names no people table, or the table could not be read.",
        "Name the people table in the study file; see the findings of the files.");

    /// <summary>There are not two groups.</summary>
    public static FindingKind OneGroup { get; } = new(
        "one-group", Severity.Warning,
        "There are fewer than two groups, so nothing can be compared.",
        "The study file declares one group or none.",
        "Declare the groups in the study file.");

    /// <summary>No group is marked as the controls.</summary>
    public static FindingKind NoControlGroup { get; } = new(
        "no-control-group", Severity.Note,
        "No group is marked as the controls; the first one stands in their place.",
        "The study file marks none.",
        "Mark the control group in the study file.");

    /// <summary>A sample belongs to nobody whose group is known.</summary>
    public static FindingKind SampleWithoutGroup { get; } = new(
        "sample-without-group", Severity.Warning,
        "The sample is in no group and is counted nowhere.",
        "Its person is missing from the people table, or the sample from the samples table.",
        "Complete the tables.");

    /// <summary>A group has fewer than two people that can be used.</summary>
    public static FindingKind GroupTooSmall { get; } = new(
        "group-too-small", Severity.Warning,
        "A mean with its scatter needs two people; the group has fewer that can be used.",
        "A small study, or many samples set aside.",
        "Measure more people, or see why their samples were set aside.");

    /// <summary>The difference could not be adjusted for hematocrit.</summary>
    public static FindingKind NotAdjusted { get; } = new(
        "not-adjusted", Severity.Warning,
        "The difference could not be adjusted for hematocrit.",
        "Hematocrit differs too little between people beside its measurement error, or is missing.",
        "Measure hematocrit more finely; report the total difference only.",
        "Fuller 1987, Measurement Error Models");

    /// <summary>The groups' slopes against hematocrit differ.</summary>
    public static FindingKind UnequalSlopes { get; } = new(
        "unequal-slopes", Severity.Warning,
        "The groups' slopes against hematocrit differ by more than three standard errors, so no one number holds at every hematocrit.",
        "The groups' blood depends on hematocrit differently.",
        "Do not report the adjusted difference without the hematocrit it speaks of.");
}
