namespace HemoRheo;

/// <summary>One group of a cohort summary, for one measurand.</summary>
/// <param name="Label">Label of the group.</param>
/// <param name="Samples">Samples measured.</param>
/// <param name="Used">People counted.</param>
/// <param name="SetAside">Samples left out, with reasons counted by code.</param>
/// <param name="Marked">Samples measured while the instrument was not in order; never among the used.</param>
/// <param name="Mean">Mean of the people's values on the working scale, shared parts kept; its scatter among people is the variance estimate "people".</param>
/// <param name="StandardDeviation">Standard deviation among people on the working scale.</param>
public sealed record GroupSummary(string Label, int Samples, int Used, Items<CountedReason> SetAside, int Marked, Value Mean, double StandardDeviation);
