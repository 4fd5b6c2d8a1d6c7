namespace HemoRheo;

/// <summary>Rules of control charts as reports print them.</summary>
public static class ChartRuleWords
{
    /// <summary>The rule in lower case, e.g. <c>two of three</c>.</summary>
    /// <param name="rule">The rule.</param>
    public static string Words(this ChartRule rule) => rule switch
    {
        ChartRule.BeyondLimits => "beyond limits",
        ChartRule.TwoOfThree => "two of three",
        ChartRule.WeightedAverage => "weighted average",
        _ => throw new ArgumentOutOfRangeException(nameof(rule)),
    };
}
