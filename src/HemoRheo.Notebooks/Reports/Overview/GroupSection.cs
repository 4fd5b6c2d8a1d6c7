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
            <tr><th scope="col"><small>n of measured</small></th><th scope="col">mean <small>95 % interval</small></th><th scope="col"><small>n of measured</small></th><th scope="col">mean <small>95 % interval</small></th></tr></thead>
            <tbody>{summary.Measurands.Select(one => Row(one, edition.Law))}</tbody></table></div>
            <div class="wide"><table><caption>Who is not counted, and why</caption>
            <thead><tr><th scope="col">quantity</th><th scope="col">group</th><th scope="col" class="n">measured</th><th scope="col" class="n">counted</th><th scope="col" class="n">marked</th><th scope="col">set aside, by code of the finding</th></tr></thead>
            <tbody>{Aside(summary)}</tbody></table></div>
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
        ? Markup.Of($"<td class=\"w\">{group.Used} of {group.Samples}</td><td class=\"w\">{Figures.Estimate(one.Measurand, mean)}<br/><small>{Figures.Interval(one.Measurand, mean)}</small></td>")
        : Markup.Of($"<td class=\"w\">{group.Used} of {group.Samples}</td><td><small>{group.WhyNoMean}</small></td>");

    private static Markup Ratio(MeasurandSummary one, GroupDifference? difference) => difference switch
    {
        null => Markup.Of($"<td>{Figures.Nothing}</td>"),
        { Difference: null } => Markup.Of($"<td><small>{difference.WhyNot}</small></td>"),
        { Difference: { } value } when one.Measurand.Logarithmic => Markup.Of($"<td class=\"w\">{Figures.Ratio(value)}<br/><small>{Figures.RatioInterval(value)}, p {Figures.Probability(difference.Probability)}</small></td>"),
        { Difference: { } value } => Markup.Of($"<td class=\"w\">difference {Figures.Estimate(one.Measurand, value)}<br/><small>{Figures.Interval(one.Measurand, value)}, p {Figures.Probability(difference.Probability)}</small></td>"),
    };

    private static IEnumerable<Markup> Aside(CohortSummary summary)
    {
        var groups = summary.Measurands.SelectMany(one => new[] { (one, group: one.First), (one, group: one.Second) })
            .GroupBy(pair => (pair.group.Label, pair.group.Samples, pair.group.Used, pair.group.Marked, pair.group.SetAside));
        foreach (var label in groups.GroupBy(alike => alike.Key.Label))
        {
            var byCount = label.OrderBy(alike => alike.Count()).ToArray();
            foreach (var alike in byCount)
            {
                var names = byCount.Length == 1 ? "every quantity" : alike == byCount[^1] ? "all other quantities" : string.Join("; ", alike.Select(pair => $"{pair.one.Measurand.Name}, {Words.Short(pair.one.Basis)}"));
                yield return Markup.Of($"""
                    <tr><th scope="row">{names}</th><td>{alike.Key.Label}</td><td class="n">{alike.Key.Samples}</td><td class="n">{alike.Key.Used}</td><td class="n">{alike.Key.Marked}</td><td>{Marks.Reasons(alike.Key.SetAside)}</td></tr>

                    """);
            }
        }
    }

    private static string Alt(CohortSummary summary, string first, string second) =>
        $"Ratios of {second} over {first}: {string.Join("; ", summary.Measurands.Where(one => one.Total.Difference is not null && one.Measurand.Logarithmic).Select(one => $"{one.Measurand.Name}, {Words.Short(one.Basis)}, {Figures.Ratio(one.Total.Difference!)} ({Figures.RatioInterval(one.Total.Difference!)})"))}.";
}
