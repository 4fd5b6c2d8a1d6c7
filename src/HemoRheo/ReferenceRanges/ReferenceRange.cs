namespace HemoRheo;

/// <summary>A reference range and the question it answers.</summary>
/// <param name="Measurand">The measurand.</param>
/// <param name="Law">Name of the law its values come from; null for declared limits.</param>
/// <param name="Basis">The hematocrit it speaks of.</param>
/// <param name="Limits">Limits on the measurand's working scale.</param>
/// <param name="LowerLimit">90 % interval of the lower limit, working scale; null for declared limits.</param>
/// <param name="UpperLimit">90 % interval of the upper limit, working scale; null for declared limits.</param>
/// <param name="Method">How it was obtained, percentiles included.</param>
/// <param name="Used">Controls it rests on; 0 for declared limits.</param>
/// <param name="Missing">Controls left out, with reasons counted by code.</param>
/// <param name="Shared">Mean of the controls' contributions of shared sources: what a value of this study shares with the limits.</param>
/// <param name="Source">Where the method or the limits were published.</param>
public sealed record ReferenceRange(
    Measurand Measurand,
    string? Law,
    HematocritBasis Basis,
    Interval Limits,
    Interval? LowerLimit,
    Interval? UpperLimit,
    string Method,
    int Used,
    Items<CountedReason> Missing,
    Items<Contribution> Shared,
    string Source);
