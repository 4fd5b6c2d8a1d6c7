namespace HemoRheo;

/// <summary>A group of people. Rooms before Cohorts see its code and whether it is the control group, never its label.</summary>
/// <param name="Code">Code that the people table uses.</param>
/// <param name="Label">Label shown in the cohort summary.</param>
/// <param name="Controls">Whether reference ranges come from it.</param>
public sealed record Group(string Code, string Label, bool Controls);
