namespace HemoRheo;

/// <summary>What the trust in an instrument's torques rests on, best first.</summary>
public enum TorqueBasis
{
    /// <summary>A blank run of the same day.</summary>
    BlankOfDay,

    /// <summary>The last blank run before, of another day.</summary>
    EarlierBlank,

    /// <summary>What the study file declares.</summary>
    Declared,

    /// <summary>Nothing: no blank run and no declared floor, so every value is marked.</summary>
    None,
}
