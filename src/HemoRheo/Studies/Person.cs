namespace HemoRheo;

/// <summary>A person of the people table.</summary>
/// <param name="Id">Pseudonym.</param>
/// <param name="GroupCode">Code of the group, which ranges and slopes need as a stratum; the label is joined only in Cohorts.</param>
/// <param name="Where">Line of the people table.</param>
public sealed record Person(string Id, string GroupCode, Where Where);
