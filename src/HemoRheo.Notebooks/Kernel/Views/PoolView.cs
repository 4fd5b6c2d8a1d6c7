namespace HemoRheo.Notebooks;

/// <summary>What only the whole study tells: evidence for the laws, scatter between loadings, slopes against hematocrit.</summary>
internal static class PoolView
{
    public static Table Laws(IEnumerable<LawEvidence> laws) => Table.Of("law", "curves", "chi-square", "degrees of freedom", "probability", "pattern probability", "fits", "reason").WithRows(
        laws,
        law => [law.Law, law.Curves, law.ChiSquare, law.DegreesOfFreedom, Probability(law.Probability), Probability(law.PatternProbability), law.Fits, law.Words]);

    public static Table Scatter(IEnumerable<LoadingScatter> scatter) => Table.Of("law", "measurand", "relative uncertainty", "degrees of freedom").WithRows(
        scatter.SelectMany(one => one.Measurands.Select((measurand, i) => (one, measurand, i))),
        row => [row.one.Law, row.measurand.Name, 100 * Math.Sqrt(row.one.Columns.Sum(column => column.Amounts[row.i] * column.Amounts[row.i])), row.one.DegreesOfFreedom]);

    public static Table Slopes(IEnumerable<HematocritSlope> slopes) => Table.Of("law", "measurand", "estimate", "standard error", "unit", "degrees of freedom", "n", "reason").WithRows(
        slopes,
        slope => slope.WhyNot is null
            ? [slope.Law, slope.Measurand.Name, Cell.Rounded(slope.Slope, slope.StandardUncertainty), Cell.Rounded(slope.StandardUncertainty, Rounding.Uncertainty(slope.StandardUncertainty)), "1 per L/L", slope.DegreesOfFreedom, slope.People, Cell.Empty]
            : [slope.Law, slope.Measurand.Name, Cell.Empty, Cell.Empty, "1 per L/L", Cell.Empty, slope.People, slope.WhyNot]);

    public static Table Compared(PooledComparison comparison) => Table.Of("law", "standing", "curves", "AIC", "difference", "difference error", "weight").WithRows(
        comparison.Laws,
        law => [law.Law, law.Standing.Words(), law.Curves, Places(law.Criterion), Places(law.Difference), Places(law.DifferenceError), law.Weight is { } weight ? Probability(weight) : Cell.Empty]);

    public static Markup Of(StudyPool pool) => Markup.Of($"""
        <p>{pool.Comparison.Words}</p><p>{pool.Correlation.Words}</p>
        {TableMarkup.Of(Laws(pool.Laws), "Evidence of all curves for each law")}{TableMarkup.Of(Compared(pool.Comparison), "Laws compared on all curves together")}{TableMarkup.Of(Scatter(pool.Scatter), "Scatter between loadings of one sample, beyond their fits")}{TableMarkup.Of(Slopes(pool.Slopes), "Slope of the logarithm against hematocrit")}{FindingsView.Folded(pool.Findings)}
        """);

    private static Cell Places(double? number) => number is { } known ? Cell.Rounded(known, known.ToString("F1", System.Globalization.CultureInfo.InvariantCulture)) : Cell.Empty;

    private static Cell Probability(double probability) => double.IsFinite(probability) ? Cell.Rounded(probability, Rounding.Digits(probability, 2)) : Cell.Empty;
}
