namespace HemoRheo;

/// <summary>What numbers a key of the study file allows, in SI.</summary>
internal enum KeyBounds
{
    Any,
    Positive,
    NotNegative,
    BetweenZeroAndOne,
    BodyOrRoom,
    Level,
    Correlation,
}
