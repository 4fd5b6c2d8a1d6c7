namespace HemoRheo.Notebooks;

/// <summary>Reference ranges, and where the samples lie against them.</summary>
internal static class RangeSection
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition)
    {
        var ranges = edition.Results.Ranges.OrderBy(range => range.Basis == edition.Basis ? 0 : 1).ToArray();
        var methods = ranges.Select(Method).Distinct().ToList();
        if (ranges.Length == 0) return Page.Section("ranges", "Reference ranges", Markup.Of($"<p>There is no reference range: too few controls, and none declared. Nothing is judged.</p>"));
        return Page.Section("ranges", "Reference ranges", Markup.Of($"""
            <p>Limits from this study's controls hold for this study's instruments, handling and people. Each limit has an interval of its own; where a verdict would change within it, the sample's page says so.</p>
            <div class="wide"><table><caption>Reference ranges</caption>
            <thead><tr><th scope="col">quantity</th><th scope="col" class="n">limits</th><th scope="col" class="n">lower limit<br/><small>90 % interval</small></th><th scope="col" class="n">upper limit<br/><small>90 % interval</small></th><th scope="col" class="n">controls<br/>used</th><th scope="col">left out</th><th scope="col">method</th></tr></thead>
            <tbody>{ranges.Select(range => Row(range, methods.IndexOf(Method(range)) + 1))}</tbody></table></div>
            <ol class="quiet">{methods.Select(method => Markup.Of($"<li>{method}</li>"))}</ol>
            {Strips(edition)}
            """));
    }

    private static string Method(ReferenceRange range) => $"{range.Method}. {range.Source}";

    private static Markup Row(ReferenceRange range, int method) => Markup.Of($"""
        <tr><th scope="row"><span class="w">{Words.WithUnit(range.Measurand)}</span><br/><small>{Words.Of(range.Basis)}{(range.Law is null ? "" : $", {range.Law}")}</small></th><td class="n">{Figures.Limits(range.Measurand, range.Limits)}</td><td class="n">{Figures.Limits(range.Measurand, range.LowerLimit)}</td><td class="n">{Figures.Limits(range.Measurand, range.UpperLimit)}</td><td class="n">{(range.Used == 0 ? Markup.Of($"declared") : Markup.Of($"{range.Used}"))}</td><td>{Marks.Reasons(range.Missing)}</td><td>{method}</td></tr>

        """);

    private static IEnumerable<Markup> Strips(Edition edition)
    {
        foreach (var rate in edition.Rates)
        {
            var range = edition.Results.Ranges.FirstOrDefault(range => range.Measurand == rate && range.Basis == edition.Basis && (range.Law is null || range.Law == edition.Law));
            if (range is null) continue;
            var rows = Rows(edition, rate, range);
            if (rows.Length == 0) continue;
            yield return Page.Figure(
                RangeStripChart.Svg(rows, $"{rate.Name}, {rate.Shown.Symbol}, at hematocrit {edition.Study.Standard.Hematocrit}", whiskers: false),
                $"{rate.Name}: {string.Join("; ", rows.Select(row => $"{row.Name}, {Figures.Count(row.Values.Count, "sample")}, {row.Values.Count(value => value.Verdict?.Outcome == Outcome.Above)} above and {row.Values.Count(value => value.Verdict?.Outcome == Outcome.Below)} below the range"))}.",
                Markup.Of($"{rate.Name}, {Words.Of(edition.Basis)}: each sample against the reference range (band) with the limits' own intervals (darker). The height within a row has no meaning."));
        }
    }

    /// <summary>Rows of a strip, one a group: each sample's value of the deciding law at the standard hematocrit.</summary>
    public static StripRow[] Rows(Edition edition, Measurand measurand, ReferenceRange? range) =>
    [
        .. edition.Results.Samples.GroupBy(edition.GroupOf).OrderBy(group => Place(edition, group.Key))
            .Select(group => Row(group.Key.Length == 0 ? "no group" : group.Key, range, [.. group.Select(sample => (sample.Sample, edition.Find(sample, measurand, edition.Basis)))]))
            .Where(row => row.Values.Count > 0),
    ];

    private static StripRow Row(string name, ReferenceRange? range, (string Sample, JudgedValue? Value)[] samples)
    {
        var drawn = samples.Where(one => one.Value is { } value && double.IsFinite(value.Value.Value.X)).ToArray();
        return new(name, range, drawn.Select(one => one.Value!).ToItems(), drawn.Select(one => one.Sample).ToItems());
    }

    private static int Place(Edition edition, string label)
    {
        var place = edition.Study.Groups.ToList().FindIndex(group => group.Label == label);
        return place < 0 ? int.MaxValue : place;
    }
}
