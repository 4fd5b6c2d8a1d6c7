namespace HemoRheo;

/// <summary>One group of a cohort summary, for one measurand.</summary>
/// <param name="Label">Label of the group.</param>
/// <param name="Samples">Samples measured.</param>
/// <param name="Used">People counted.</param>
/// <param name="SetAside">Samples left out, with reasons counted by code.</param>
/// <param name="Marked">Samples measured while the instrument was not in order; never among the used.</param>
/// <param name="Mean">Mean of the people's values on the working scale, shared parts kept; the scatter among people is its part "people". Null with fewer than two people.</param>
/// <param name="StandardDeviation">Standard deviation among people on the working scale; null with fewer than two people.</param>
/// <param name="WhyNoMean">Why there is no mean; null where there is one.</param>
/// <param name="People">People of the group in the people table: the counted ones and those left out.</param>
/// <param name="SamplesUsed">Samples used; several of one person are averaged and count as one person. With the set aside and the marked ones these are all samples measured.</param>
/// <param name="PeopleLeftOut">People without a sample that can be used, by the code of their first sample's reason; null is none.</param>
public sealed record GroupSummary(
    string Label,
    int Samples,
    int Used,
    Items<CountedReason> SetAside,
    int Marked,
    Value? Mean,
    double? StandardDeviation,
    string? WhyNoMean = null,
    int People = 0,
    int SamplesUsed = 0,
    Items<CountedReason>? PeopleLeftOut = null);
