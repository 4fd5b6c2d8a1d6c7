namespace HemoRheo.Notebooks;

/// <summary>A sample's verdicts with their three probabilities and ranges.</summary>
internal static class SampleVerdicts
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition, JudgedSample sample)
    {
        var values = edition.Deciding(sample).Where(value => value.Range is not null || value.Value.Basis == edition.Basis).ToArray();
        if (values.Length == 0) return Page.Section("verdicts", "Verdicts", Markup.Of($"<p>There is no value to judge.</p>"));
        return Page.Section("verdicts", "Verdicts", Markup.Of($"""
            {Strip(sample, values)}
            <div class="wide"><table><caption>Values against their reference range, {edition.Law} law. An outcome of at least {Figures.Fixed(edition.Study.Analysis.Level, 2)} decides.</caption>
            <thead><tr><th scope="col">quantity</th><th scope="col">value<br/><small>95 % interval</small></th><th scope="col">reference range</th><th scope="col">verdict</th><th scope="col" class="n">p below</th><th scope="col" class="n">p within</th><th scope="col" class="n">p above</th><th scope="col">would it change within<br/>the limits' own intervals?</th></tr></thead>
            <tbody>{values.Select(Row)}</tbody></table></div>
            """));
    }

    private static Markup Strip(JudgedSample sample, JudgedValue[] values)
    {
        var rows = values.Where(value => value.Value.Measurand.Logarithmic && double.IsFinite(value.Value.Value.X))
            .Select(value => new StripRow($"{value.Value.Measurand.Symbol}, {Words.Short(value.Value.Basis)}", value.Range, [value], [])).ToArray();
        return rows.All(row => row.Range is null) ? Markup.None : Page.Figure(
            RangeStripChart.Svg(rows, $"viscosity, {ShownUnits.MillipascalSecond.Symbol}", whiskers: true),
            $"Sample {sample.Sample} against its reference ranges: {string.Join("; ", values.Select(value => $"{value.Value.Measurand.Name}, {Words.Short(value.Value.Basis)}, {(value.Verdict is { } verdict ? Words.Of(verdict.Outcome) : "not judged")}"))}.",
            Markup.Of($"Each value with its 95 % interval against its reference range (band) with the limits' own 90 % intervals (darker)."));
    }

    private static Markup Row(JudgedValue value)
    {
        var quantity = Markup.Of($"<th scope=\"row\"><span class=\"w\">{Words.WithUnit(value.Value.Measurand)}</span><br/><small>{Words.Of(value.Value.Basis)}</small></th><td class=\"w\">{Figures.Estimate(value.Value)}<br/><small>{Figures.Interval(value.Value)}</small></td><td class=\"w\">{Figures.Limits(value.Value.Measurand, value.Range?.Limits)}</td>");
        return value.Verdict is { } verdict
            ? Markup.Of($"""
                <tr>{quantity}<td>{Marks.Word(verdict)}{(value.Marked ? Markup.Of($"<br/><small>marked: instrument not in order</small>") : Markup.None)}</td><td class="n">{Figures.Probability(verdict.Below)}</td><td class="n">{Figures.Probability(verdict.Within)}</td><td class="n">{Figures.Probability(verdict.Above)}</td><td>{(value.ChangesWithLimits ? Markup.Of($"<b>yes</b>") : Markup.Of($"no"))}</td></tr>

                """)
            : Markup.Of($"<tr>{quantity}<td colspan=\"5\">not judged: {value.WhyNotJudged}</td></tr>\n");
    }
}
