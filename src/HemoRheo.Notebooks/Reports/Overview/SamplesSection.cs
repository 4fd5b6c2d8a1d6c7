namespace HemoRheo.Notebooks;

/// <summary>Every sample with its key values, its verdicts, and a link to its page.</summary>
internal static class SamplesSection
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition) => Page.Section("samples", "All samples", Markup.Of($"""
        <div class="wide"><table class="samples"><caption>Viscosity at hematocrit {edition.Study.Standard.Hematocrit.ToString()} in {ShownUnits.MillipascalSecond.Symbol}, {edition.Law} law, with its 95 % interval and verdict</caption>
        <thead><tr><th scope="col">sample<br/><small>instrument, if not in order</small></th><th scope="col">group<br/><small>visit, loadings</small></th><th scope="col" class="n">hematocrit<br/><small>L/L</small></th>{edition.Rates.Select(rate => Markup.Of($"<th scope=\"col\">at {rate.Rate.ToString()}</th>"))}<th scope="col" class="n">findings</th></tr></thead>
        <tbody>{edition.Results.Samples.Select(sample => Row(edition, sample))}</tbody></table></div>
        """));

    private static Markup Row(Edition edition, JudgedSample sample)
    {
        var record = sample.Result.Record;
        return Markup.Of($"""
            <tr><th scope="row" class="w">{edition.SampleLink(sample.Sample)}{Standing(sample)}</th><td>{edition.GroupOf(sample)}{(record is null ? Markup.Of($"<small>not in the samples table</small>") : Markup.Of($"<br/><small class=\"w\">visit {record.Visit}, {Figures.Count(sample.Result.Loadings.Count, "loading")}</small>"))}</td><td class="n">{(record?.Hematocrit is { } hematocrit ? Figures.Fixed(hematocrit.LiterPerLiter, 3) : Figures.Nothing)}</td>{edition.Rates.Select(rate => Cell(edition.Find(sample, rate, edition.Basis)))}<td class="n">{sample.Result.Findings.Count}</td></tr>

            """);
    }

    private static Markup Standing(JudgedSample sample) => sample.Result.Status == InstrumentStatus.InOrder ? Markup.None : Markup.Of($"<br/><small>{Marks.Status(sample.Result.Status)}</small>");

    private static Markup Cell(JudgedValue? value) => value switch
    {
        null => Markup.Of($"<td>{Figures.Nothing}</td>"),
        { Value.Decidable: false } => Markup.Of($"<td class=\"w\">({Figures.Estimate(value.Value)})<br/><small>not decided on</small></td>"),
        _ => Markup.Of($"<td class=\"w\">{Figures.Estimate(value.Value)} {Marks.Verdict(value)}<br/><small>{Figures.Interval(value.Value)}</small></td>"),
    };
}
