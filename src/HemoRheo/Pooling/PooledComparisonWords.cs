namespace HemoRheo;

/// <summary>The comparison of a study's laws as sentences.</summary>
internal static class PooledComparisonWords
{
    /// <summary>The sentences.</summary>
    /// <param name="laws">The laws with their standings.</param>
    /// <param name="best">The law with the lowest criterion among those that fit.</param>
    /// <param name="curves">Curves compared.</param>
    public static string Of(Items<PooledLaw> laws, string best, int curves) => string.Join(" ", Sentences(laws, best, curves));

    private static IEnumerable<string> Sentences(Items<PooledLaw> laws, string best, int curves)
    {
        PooledLaw[] Standing(LawStanding standing) => [.. laws.Where(law => law.Standing == standing)];
        var (alike, boundary) = (Standing(LawStanding.NotParted), Standing(LawStanding.AtBoundary));
        var on = curves == 1 ? "1 curve" : $"{curves} curves";
        if (alike.Length > 0)
        {
            yield return $"These {on} cannot tell {Listed(alike.Select(law => law.Law))} apart ({string.Join(", ", alike.Where(law => law.Law != best).Select(law => $"{law.Law}: {Above(law)}"))}); half the range of their values over √3 stands in the budget as the part of the law.";
        }
        else if (Standing(LawStanding.Preferred) is [var preferred])
        {
            yield return boundary.Length > 0 ? $"{preferred.Law} describes the {on}." : $"{preferred.Law} is preferred on {on}.";
        }
        else
        {
            yield return $"No law of the study describes the {on}.";
        }

        foreach (var law in boundary) yield return $"{law.Law} runs to its boundary, where it is a simpler law, on {law.AtBound} of them and says nothing more.";
        foreach (var law in Standing(LawStanding.Behind)) yield return $"{law.Law} is behind ({Above(law)}).";
        foreach (var law in Standing(LawStanding.Contradicted)) yield return law.Difference > 0 ? $"{law.Law} is contradicted ({Above(law)})." : $"{law.Law} is contradicted by its residuals.";
        foreach (var law in Standing(LawStanding.NotCompared)) yield return $"{law.Law} took no part: too few usable fits.";
    }

    private static string Above(PooledLaw law) => $"AIC higher by {Shown(law.Difference!.Value)}{(law.DifferenceError is { } error ? $" ± {Shown(error)}" : "")}";

    private static string Shown(double number) => number.ToString(number < 100 ? "F1" : "F0", System.Globalization.CultureInfo.InvariantCulture);

    private static string Listed(IEnumerable<string> names)
    {
        string[] all = [.. names];
        return $"{string.Join(", ", all[..^1])} and {all[^1]}";
    }
}
