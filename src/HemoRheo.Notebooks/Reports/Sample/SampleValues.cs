namespace HemoRheo.Notebooks;

/// <summary>A sample's values: native and at the standard hematocrit by both rules, the fitted one beside the one read off between the readings.</summary>
internal static class SampleValues
{
    private static readonly HematocritBasis[] Bases = [HematocritBasis.Native, HematocritBasis.StandardByPlasma, HematocritBasis.StandardBySlope];

    /// <summary>The section.</summary>
    public static Markup Write(Edition edition, JudgedSample sample)
    {
        if (sample.Values.Count == 0) return Page.Section("values", "Values", Markup.Of($"<p>There is no value of this sample.</p>"));
        var laws = sample.Values.Select(value => value.Value.Law).Distinct().OrderBy(law => law == edition.Law ? 0 : 1);
        return Page.Section("values", "Values", Markup.Of($"""
            <p>Standard hematocrit {edition.Study.Standard.Hematocrit.ToString()}. The value in each cell is the fitted one with its 95 % interval; below it the one read off between the readings, without a law, where there is one. Values in brackets are shown, not decided on.</p>
            {laws.Select(law => Law(edition, sample, law))}
            """));
    }

    private static Markup Law(Edition edition, JudgedSample sample, string law)
    {
        var values = sample.Values.Where(value => value.Value.Law == law).Select(value => value.Value).ToArray();
        var rows = values.Select(value => value.Measurand).Distinct();
        return Markup.Of($"""
            <div class="wide"><table><caption>Values by the {law} law{(law == edition.Law ? ", which decides" : "")}</caption>
            <thead><tr><th scope="col">quantity</th>{Bases.Select(basis => Markup.Of($"<th scope=\"col\">{Words.Of(basis)}{(law == edition.Law && basis == edition.Basis ? Markup.Of($"<br/><small>decides</small>") : Markup.None)}</th>"))}<th scope="col">why not decided on</th></tr></thead>
            <tbody>{rows.Select(measurand => Markup.Of($"<tr><th scope=\"row\">{Words.WithUnit(measurand)}</th>{Bases.Select(basis => Cell(values.FirstOrDefault(value => value.Measurand == measurand && value.Basis == basis)))}<td>{Why(values.Where(value => value.Measurand == measurand))}</td></tr>\n"))}</tbody></table></div>
            """);
    }

    private static Markup Cell(SampleValue? value)
    {
        if (value is null) return Markup.Of($"<td>{Figures.Nothing}</td>");
        var estimate = value.Decidable ? Figures.Estimate(value) : $"({Figures.Estimate(value)})";
        var between = value.Interpolated is { } working && double.IsFinite(working)
            ? Markup.Of($"<br/><small>between readings {Rounding.Number(value.Measurand.ToShown(working), Figures.Uncertainty(value.Measurand, value.Value))}</small>")
            : Markup.None;
        return Markup.Of($"<td class=\"w\">{estimate} <small>{Figures.Interval(value)}</small>{between}</td>");
    }

    private static Markup Why(IEnumerable<SampleValue> values) => new(string.Join("<br/>", values.Where(value => !value.Decidable).SelectMany(WhyNot.Codes).Distinct().Select(code => Markup.Of($"<code>{code}</code>").Text)));
}
