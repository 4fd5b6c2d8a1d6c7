namespace HemoRheo;

/// <summary>Which rules one check breaks.</summary>
internal readonly record struct ChartSigns(bool BeyondLimits, bool TwoOfThree, bool WeightedAverage)
{
    internal bool Any => BeyondLimits || TwoOfThree || WeightedAverage;

    internal bool Breaks(ChartRule rule) => rule switch
    {
        ChartRule.BeyondLimits => BeyondLimits,
        ChartRule.TwoOfThree => TwoOfThree,
        _ => WeightedAverage,
    };
}
