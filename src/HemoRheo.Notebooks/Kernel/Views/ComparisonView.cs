namespace HemoRheo.Notebooks;

/// <summary>Laws compared on one curve: the verdict first, then the numbers it rests on.</summary>
internal static class ComparisonView
{
    public static Markup Of(LawComparison comparison) => Markup.Of($"""
        <p><b>{comparison.Verdict}</b></p>
        {TableMarkup.Of(comparison.ToTable())}{TableMarkup.Folded(comparison.NestedToTable(), "laws that are special cases of others")}{TableMarkup.Folded(comparison.ResidualsToTable(), "how residuals follow each other along the curve")}
        """);
}
