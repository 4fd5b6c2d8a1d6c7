namespace HemoRheo.Notebooks;

/// <summary>Two groups side by side.</summary>
internal static class GroupSection
{
    /// <summary>The section; one line where there is no summary.</summary>
    public static Markup Write(Edition edition)
    {
        if (edition.Summary is not { Measurands.Count: > 0 } given) return Page.Section("groups", "Groups side by side", Markup.Of($"<p>The study compares no groups.</p>"));
        var summary = given with { Measurands = given.Measurands.OrderBy(one => one.Law == edition.Law ? 0 : 1).ThenBy(one => one.Basis == edition.Basis ? 0 : 1).ToItems() };
        var first = summary.Measurands[0].First.Label;
        var second = summary.Measurands[0].Second.Label;
        return Page.Section("groups", summary.By == "group" ? "Groups side by side" : $"Groups side by side, by {summary.By}", Markup.Of($"""
            <p>Ratios are {second} over {first}. The ratio as it is asks how the groups differ as they are; the ratio adjusted for hematocrit asks how they would differ at one hematocrit, knowing that hematocrit is measured with error. Intervals hold the scatter among people and the uncertainty that samples share.</p>
            {Picture(summary, first, second)}
            <div class="wide"><table><caption>Means by group and their ratio</caption>
            <thead><tr><th scope="col" rowspan="2">quantity</th><th scope="colgroup" colspan="2">{first}</th><th scope="colgroup" colspan="2">{second}</th><th scope="col" rowspan="2">ratio as it is<br/><small>95 % interval, p</small></th><th scope="col" rowspan="2">ratio adjusted<br/><small>95 % interval, p</small></th></tr>
            <tr><th scope="col">people counted<br/><small>samples used</small></th><th scope="col">mean <small>95 % interval</small></th><th scope="col">people counted<br/><small>samples used</small></th><th scope="col">mean <small>95 % interval</small></th></tr></thead>
            <tbody>{summary.Measurands.Select(one => Row(one, edition.Law))}</tbody></table></div>
            {CountSection.Write(summary)}
            <ul class="look quiet">{Methods(summary).Select(method => Markup.Of($"<li>{method}</li>"))}</ul>
            """));
    }

    private static Markup Picture(CohortSummary summary, string first, string second) =>
        summary.Measurands.Any(one => one.Measurand.Logarithmic && one.Total.Difference is not null)
            ? Page.Figure(RatioChart.Svg(summary), Alt(summary, first, second), Markup.Of($"Ratios of means with 95 % intervals, {second} over {first}. Squares: as it is. Circles: adjusted for hematocrit (native values only, since a standardised value already contains the hematocrit)."))
            : Markup.None;

    private static IEnumerable<string> Methods(CohortSummary summary)
    {
        var total = summary.Measurands.Select(one => one.Total).FirstOrDefault(difference => difference.Difference is not null)?.Method;
        var adjusted = summary.Measurands.FirstOrDefault(one => one.Adjusted?.Difference is not null);
        if (total is not null) yield return $"As it is: {total}.";
        if (adjusted is not null) yield return $"Adjusted, here for {adjusted.Measurand.Name}, the others alike in comparisons.csv: {adjusted.Adjusted!.Method}.";
    }

    private static Markup Row(MeasurandSummary one, string law)
    {
        var quantity = Markup.Of($"<th scope=\"row\">{Quantity(one.Measurand, one.Basis)}{(one.Law == law ? Markup.None : Markup.Of($"<br/><small>{one.Law} law</small>"))}</th>");
        return one.First.Mean is null && one.Second.Mean is null
            ? Markup.Of($"<tr>{quantity}<td colspan=\"6\"><small>No mean in either group. {one.Total.WhyNot}</small></td></tr>\n")
            : Markup.Of($"<tr>{quantity}{Mean(one, one.First)}{Mean(one, one.Second)}{Ratio(one, one.Total)}{Ratio(one, one.Adjusted)}</tr>\n");
    }

    private static Markup Quantity(Measurand measurand, HematocritBasis basis) => Markup.Of($"<span class=\"w\">{Words.WithUnit(measurand)}</span><br/><small>{Words.Of(basis)}</small>");

    private static Markup Mean(MeasurandSummary one, GroupSummary group) => group.Mean is { } mean
        ? Markup.Of($"{Count(group)}<td class=\"w\">{Figures.Estimate(one.Measurand, mean)}<br/><small>{Figures.Interval(one.Measurand, mean)}</small></td>")
        : Markup.Of($"{Count(group)}<td><small>{group.WhyNoMean}</small></td>");

    private static Markup Count(GroupSummary group) => Markup.Of($"<td class=\"w\">{group.Used} of {group.People}<br/><small>{group.SamplesUsed} of {group.Samples}</small></td>");

    private static Markup Ratio(MeasurandSummary one, GroupDifference? difference) => difference switch
    {
        null => Markup.Of($"<td>{Figures.Nothing}</td>"),
        { Difference: null } => Markup.Of($"<td><small>{difference.WhyNot}</small></td>"),
        { Difference: { } value } when one.Measurand.Logarithmic => Markup.Of($"<td class=\"w\">{Figures.Ratio(value)}<br/><small>{Figures.RatioInterval(value)}, p {Figures.Probability(difference.Probability)}</small></td>"),
        { Difference: { } value } => Markup.Of($"<td class=\"w\">difference {Figures.Estimate(one.Measurand, value)}<br/><small>{Figures.Interval(one.Measurand, value)}, p {Figures.Probability(difference.Probability)}</small></td>"),
    };

    private static string Alt(CohortSummary summary, string first, string second) =>
        $"Ratios of {second} over {first}: {string.Join("; ", summary.Measurands.Where(one => one.Total.Difference is not null && one.Measurand.Logarithmic).Select(one => $"{one.Measurand.Name}, {Words.Short(one.Basis)}, {Figures.Ratio(one.Total.Difference!)} ({Figures.RatioInterval(one.Total.Difference!)})"))}.";
}
