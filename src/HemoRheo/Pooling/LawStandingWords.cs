namespace HemoRheo;

/// <summary>Standings of laws as reports print them.</summary>
public static class LawStandingWords
{
    /// <summary>The standing in plain words.</summary>
    public static string Words(this LawStanding standing) => standing switch
    {
        LawStanding.NotCompared => "not compared",
        LawStanding.Preferred => "preferred",
        LawStanding.NotParted => "not parted from another",
        LawStanding.AtBoundary => "at its boundary",
        LawStanding.Behind => "behind another",
        LawStanding.Contradicted => "contradicted",
        _ => throw new ArgumentOutOfRangeException(nameof(standing)),
    };
}
