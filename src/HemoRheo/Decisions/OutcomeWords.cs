namespace HemoRheo;

/// <summary>Outcomes as reports print them.</summary>
public static class OutcomeWords
{
    /// <summary>The outcome in lower case, e.g. <c>undecided</c>.</summary>
    public static string Words(this Outcome outcome) => outcome switch
    {
        Outcome.Below => "below",
        Outcome.Within => "within",
        Outcome.Above => "above",
        Outcome.Undecided => "undecided",
        _ => throw new ArgumentOutOfRangeException(nameof(outcome)),
    };
}
