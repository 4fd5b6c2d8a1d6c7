namespace HemoRheo;

/// <summary>Where a law stands among the laws of a study on the evidence of all its curves.</summary>
public enum LawStanding
{
    /// <summary>It took no part: it is the only law, or too few curves have a usable fit of it.</summary>
    NotCompared,

    /// <summary>The one law that is left.</summary>
    Preferred,

    /// <summary>The curves together cannot part it from another law.</summary>
    NotParted,

    /// <summary>It runs to its boundary, where it is another law of the study, which describes the curves with fewer parameters.</summary>
    AtBoundary,

    /// <summary>Another law describes the same curves better beyond chance, by little a curve.</summary>
    Behind,

    /// <summary>The curves together contradict it.</summary>
    Contradicted,
}
