namespace HemoRheo;

/// <summary>The hematocrit a value speaks of.</summary>
public enum HematocritBasis
{
    /// <summary>The sample's own.</summary>
    Native,

    /// <summary>The study's standard, by the plasma power rule.</summary>
    StandardByPlasma,

    /// <summary>The study's standard, by the study's slope.</summary>
    StandardBySlope,
}
