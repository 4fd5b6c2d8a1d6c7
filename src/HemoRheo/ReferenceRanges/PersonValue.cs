namespace HemoRheo;

/// <summary>One value of a person: the mean over the visits that can be used, which are not independent people.</summary>
internal sealed record PersonValue(string Person, Value Value, Items<SampleResult> Samples);
