namespace HemoRheo.Notebooks;

/// <summary>The uncertainty budget of a sample's deciding values, line by line.</summary>
internal static class SampleBudget
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition, JudgedSample sample)
    {
        var values = edition.Deciding(sample).Select(value => value.Value).Where(value => value.Value.Parts.Count > 0).ToArray();
        if (values.Length == 0) return Page.Section("budget", "Uncertainty budget", Markup.Of($"<p>There is no value with a budget.</p>"));
        var standard = values.Where(value => value.Basis == edition.Basis).ToArray();
        var drawn = standard.Length > 0 ? standard : values;
        var kinds = values.SelectMany(value => value.Value.Parts).Select(part => part.Source.Kind).Distinct().Order();
        return Page.Section("budget", "Uncertainty budget", Markup.Of($"""
            <p>Each line is the change of the value, in per cent of it, when that input is raised by one standard uncertainty. Signs matter where values are compared: a shared line of one sign cancels in a difference, and never averages away in a mean. Lines of several inputs (±) are the root of their sum of squares.</p>
            <div class="wide"><table><caption>Contributions in per cent of the value, {edition.Law} law</caption>
            <thead><tr><th scope="col" rowspan="2">source</th><th scope="col" rowspan="2">shared</th><th scope="col" rowspan="2" class="n">degrees of<br/>freedom</th>{values.GroupBy(value => value.Basis).Select(basis => Markup.Of($"<th scope=\"colgroup\" colspan=\"{basis.Count()}\">{Words.Of(basis.Key)}</th>"))}</tr>
            <tr>{values.Select(value => Markup.Of($"<th scope=\"col\" class=\"n\">{Short(value.Measurand)}</th>"))}</tr></thead>
            <tbody>{kinds.Select(kind => Line(kind, values))}</tbody>
            <tfoot><tr><th scope="row">standard uncertainty, %</th><td></td><td></td>{values.Select(value => Markup.Of($"<td class=\"n\">{Figures.Fixed(100 * value.Value.StandardUncertainty, 2)}</td>"))}</tr>
            <tr><th scope="row">degrees of freedom</th><td></td><td></td>{values.Select(value => Markup.Of($"<td class=\"n\">{Figures.Freedom(value.Value.DegreesOfFreedom)}</td>"))}</tr>
            <tr><th scope="row">95 % interval, {ShownUnits.MillipascalSecond.Symbol}</th><td></td><td></td>{values.Select(value => Markup.Of($"<td class=\"n\">{Figures.Estimate(value)}<br/><small>{Figures.Interval(value)}</small></td>"))}</tr></tfoot></table></div>
            {Page.Figure(
                BudgetChart.Svg(drawn),
                $"Sizes of the contributions to {string.Join(", ", drawn.Take(BudgetChart.Most).Select(value => $"{value.Measurand.Name}: {Figures.Fixed(100 * value.Value.StandardUncertainty, 1)} % together"))}.",
                Markup.Of($"Sizes of the contributions, {Words.Of(drawn[0].Basis)}. They add as squares, so the longest bars rule the total."))}
            """));
    }

    private static Markup Line(SourceKind kind, SampleValue[] values) => Markup.Of($"""
        <tr><th scope="row">{Meaning(kind)}</th><td>{(new Source(kind, "").Shared ? "shared" : "")}</td><td class="n">{Freedom(kind, values)}</td>{values.Select(value => Markup.Of($"<td class=\"n\">{Amount(kind, value.Value)}</td>"))}</tr>

        """);

    private static string Amount(SourceKind kind, Value value) => value.Part(kind) switch
    {
        null => "",
        { } amount when value.Parts.Count(part => part.Source.Kind == kind) > 1 => $"±{Figures.Fixed(100 * amount, 2)}",
        { } amount => Figures.Signed(100 * amount),
    };

    private static string Freedom(SourceKind kind, SampleValue[] values)
    {
        var degrees = values.Where(value => value.Value.Part(kind) is not null).Select(value => Figures.Freedom(value.Value.Only(source => source.Kind == kind).DegreesOfFreedom)).Distinct().ToArray();
        return degrees.Length <= 2 ? string.Join(" / ", degrees) : $"{degrees[0]} to {degrees[^1]}";
    }

    private static string Short(Measurand measurand) => measurand is ViscosityAtRate at ? at.Rate.ToString() : measurand.Symbol;

    private static string Meaning(SourceKind kind) => kind switch
    {
        SourceKind.Fit => "fit of the readings",
        SourceKind.Loading => "between loadings",
        SourceKind.Calibration => "calibration of the period",
        SourceKind.Day => "instrument, day to day",
        SourceKind.Certificate => "certificate of the fluid",
        SourceKind.FluidBeta => "temperature coefficient of the fluid",
        SourceKind.Thermometer => "thermometer",
        SourceKind.BloodBeta => "temperature coefficient of blood",
        SourceKind.Hematocrit => "hematocrit of the sample",
        SourceKind.Counter => "bias of the hematocrit counter",
        SourceKind.Plasma => "plasma viscosity of the sample",
        SourceKind.TorqueZero => "torque zero of the day",
        SourceKind.Slope => "slope against hematocrit",
        SourceKind.Law => "laws that the study cannot part",
        SourceKind.Bias => "known bias, not corrected",
        _ => kind.Words(),
    };
}
