namespace HemoRheo.Notebooks;

/// <summary>What all curves of the study together say of the laws, of the loadings and of hematocrit.</summary>
internal static class EvidenceSection
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition)
    {
        var pool = edition.Results.Analyzed.Pool;
        return Page.Section("laws", "What only the whole study can tell", Markup.Of($"""
            <h3>Laws</h3>
            <ul class="look">{pool.Laws.OrderBy(law => law.Law == edition.Law ? 0 : 1).Select(law => Markup.Of($"<li>{law.Words}{(law.Law == edition.Law ? Markup.Of($" <b>This law decides.</b>") : Markup.None)}</li>\n"))}
            <li>{pool.Comparison.Words}{Spread(edition, pool)}</li></ul>
            <h3>Readings of a ramp</h3>
            <ul class="look"><li>{pool.Correlation.Words}</li></ul>
            <h3>Between loadings</h3>
            <ul class="look">{pool.Scatter.Where(scatter => scatter.Law == edition.Law).Select(Scatter)}</ul>
            <h3>Slope of the logarithm of viscosity against hematocrit</h3>
            <div class="wide"><table><caption>Slopes within groups, knowing that hematocrit is measured with error</caption>
            <thead><tr><th scope="col">quantity</th><th scope="col">law</th><th scope="col" class="n">slope, per L/L</th><th scope="col" class="n">standard uncertainty</th><th scope="col" class="n">plain slope</th><th scope="col" class="n">people</th><th scope="col">usable</th></tr></thead>
            <tbody>{pool.Slopes.Where(slope => slope.Law == edition.Law).Select(Slope)}</tbody></table></div>
            """));
    }

    private static string Spread(Edition edition, StudyPool pool)
    {
        string[] parts = [.. pool.Spreads.Where(spread => spread.Law == edition.Law).Select(spread => $"{spread.Measurand.Name} {Figures.Signed(100 * spread.Amount)} %")];
        return parts.Length == 0 ? "" : $" Part of the law: {string.Join(", ", parts)}.";
    }

    private static Markup Scatter(LoadingScatter scatter)
    {
        var sizes = scatter.Measurands.Select((measurand, i) => $"{measurand.Name} {Figures.Fixed(100 * Math.Sqrt(scatter.Columns.Sum(column => column.Amounts[i] * column.Amounts[i])), 1)} %");
        return scatter.Measurands.All(measurand => measurand.Logarithmic)
            ? Markup.Of($"<li>One loading scatters by {string.Join(", ", sizes)} (one standard deviation beyond its fit), {(scatter.DegreesOfFreedom == 0 ? "as the study file declares" : $"from {Figures.Count(scatter.DegreesOfFreedom, "degree")} of freedom of replicate loadings")}.</li>\n")
            : Markup.None;
    }

    private static Markup Slope(HematocritSlope slope) => Markup.Of($"""
        <tr><th scope="row">{slope.Measurand.Name}</th><td>{slope.Law}</td><td class="n">{(double.IsFinite(slope.Slope) ? Rounding.Digits(slope.Slope, 3) : Figures.Nothing)}</td><td class="n">{(double.IsFinite(slope.StandardUncertainty) ? Rounding.Digits(slope.StandardUncertainty, 2) : Figures.Nothing)}</td><td class="n">{(double.IsFinite(slope.Plain) ? Rounding.Digits(slope.Plain, 3) : Figures.Nothing)}</td><td class="n">{slope.People}</td><td>{slope.WhyNot ?? "yes"}</td></tr>

        """);
}
