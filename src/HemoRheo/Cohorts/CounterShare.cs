namespace HemoRheo;

/// <summary>The share of a group's mean hematocrit that one counter measured.</summary>
internal sealed record CounterShare(Counter Counter, double Share);
