namespace HemoRheo;

/// <summary>What the bounds of keys allow, and their words.</summary>
internal static class KeyBoundsWords
{
    public static bool Allow(this KeyBounds bounds, double number) => bounds switch
    {
        KeyBounds.Positive => number > 0,
        KeyBounds.NotNegative => number >= 0,
        KeyBounds.BetweenZeroAndOne => number is > 0 and < 1,
        KeyBounds.BodyOrRoom => number is >= 0 and <= 100,
        KeyBounds.Level => number is > 0.5 and < 1,
        KeyBounds.Correlation => number is >= 0 and < 1,
        _ => true,
    };

    public static string InWords(this KeyBounds bounds) => bounds switch
    {
        KeyBounds.Positive => "greater than 0",
        KeyBounds.NotNegative => "0 or greater",
        KeyBounds.BetweenZeroAndOne => "between 0 and 1 L/L (0 and 100 %)",
        KeyBounds.BodyOrRoom => "between 0 and 100 °C",
        KeyBounds.Level => "greater than 0.5 and less than 1",
        KeyBounds.Correlation => "0 or greater and less than 1",
        _ => "any number",
    };
}
