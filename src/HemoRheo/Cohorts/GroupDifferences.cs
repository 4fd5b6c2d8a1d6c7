namespace HemoRheo;

/// <summary>Differences of two groups.</summary>
internal static class GroupDifferences
{
    internal const string TotalQuestion = "total";
    internal const string AdjustedQuestion = "adjusted for hematocrit";

    private const string TotalMethod =
        "Welch on person means, shared parts of the difference added; source: Welch 1947, Biometrika 34:28-35, and JCGM 100:2008, G.4";

    /// <summary>Second mean less first: people's scatter and shared parts, source by source, with the degrees of freedom of them all.</summary>
    internal static GroupDifference Total(GroupSummary first, GroupSummary second)
    {
        if (first.Mean is null || second.Mean is null)
        {
            return new(TotalQuestion, null, null, TotalMethod, string.Join(" ", new[] { first.WhyNoMean, second.WhyNoMean }.OfType<string>()));
        }

        var difference = second.Mean - first.Mean;
        return new(TotalQuestion, difference, TwoSided(difference), TotalMethod, null);
    }

    /// <summary>Two-sided probability of a difference at least as large where there is none; null where nothing scatters.</summary>
    internal static double? TwoSided(Value difference) =>
        difference.Variance > 0 ? Math.Min(1, 2 * Math.Min(difference.ProbabilityBelow(0), difference.ProbabilityAbove(0))) : null;
}
