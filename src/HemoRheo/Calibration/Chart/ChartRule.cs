namespace HemoRheo;

/// <summary>A rule by which a control chart signals.</summary>
public enum ChartRule
{
    /// <summary>One check beyond three sigma.</summary>
    /// <remarks>Source: Shewhart 1931, Economic Control of Quality of Manufactured Product.</remarks>
    BeyondLimits,

    /// <summary>Two of three successive checks beyond two sigma on the same side.</summary>
    /// <remarks>Source: Western Electric 1956, Statistical Quality Control Handbook; run lengths: Champ and Woodall 1987, Technometrics 29:393-399.</remarks>
    TwoOfThree,

    /// <summary>The exponentially weighted average beyond its limits: for slow drift.</summary>
    /// <remarks>Source: Roberts 1959, Technometrics 1:239-250; designs: Lucas and Saccucci 1990, Technometrics 32:1-12.</remarks>
    WeightedAverage,
}
