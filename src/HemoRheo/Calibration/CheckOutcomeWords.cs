namespace HemoRheo;

/// <summary>Outcomes of checks as reports print them.</summary>
public static class CheckOutcomeWords
{
    /// <summary>The outcome in lower case, e.g. <c>cannot tell</c>.</summary>
    /// <param name="outcome">The outcome.</param>
    public static string Words(this CheckOutcome outcome) => outcome switch
    {
        CheckOutcome.Passes => "passes",
        CheckOutcome.Fails => "fails",
        CheckOutcome.CannotTell => "cannot tell",
        _ => throw new ArgumentOutOfRangeException(nameof(outcome)),
    };
}
