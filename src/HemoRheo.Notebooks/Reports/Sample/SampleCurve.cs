namespace HemoRheo.Notebooks;

/// <summary>A sample's flow curve, its law, its residuals and the points set aside.</summary>
internal static class SampleCurve
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition, JudgedSample sample)
    {
        var loadings = sample.Result.Loadings;
        if (loadings.Count == 0) return Page.Section("curve", "Flow curve", Markup.Of($"<p>There is no recording of this sample that could be read.</p>"));
        var reported = edition.Rates.Select(rate => edition.Find(sample, rate, HematocritBasis.Native)).OfType<JudgedValue>().Where(value => value.Value.Decidable).Select(value => value.Value).ToArray();
        var kept = loadings.Sum(loading => loading.Curve.Points.Count);
        var aside = loadings.Sum(loading => loading.Curve.SetAside.Count);
        return Page.Section("curve", "Flow curve", Markup.Of($"""
            {Page.Figure(
                FlowCurveChart.Svg(loadings, edition.Law, reported, LowestStress(edition, loadings)),
                $"Apparent viscosity against shear rate of sample {sample.Sample}: {Figures.Count(loadings.Count, "loading")}, {Figures.Count(kept, "point")} kept, {aside} set aside, with the {edition.Law} law.",
                Markup.Of($"Apparent viscosity against shear rate, {Words.Of(edition.Study.Analysis.Ramp)} ramp, both axes logarithmic: {Figures.Count(kept, "point")} kept, {aside} set aside. The law is drawn between the kept shear rates only, with its 95 % band from the fit alone. Reported values are corrected by the instrument's checks and moved to 37 °C, the readings are not."))}
            {Residuals(edition, loadings)}
            {Fits(edition, loadings)}
            {Aside(loadings)}
            """));
    }

    private static double? LowestStress(Edition edition, Items<LoadingResult> loadings)
    {
        var instrument = edition.Study.Instruments.FirstOrDefault(instrument => instrument.Name == loadings[0].Recording.Instrument);
        return (loadings[0].Curve.Torque is { } torque ? torque.Floor() : instrument?.TorqueFloor) * loadings[0].Curve.StressPerTorque;
    }

    private static Markup Residuals(Edition edition, Items<LoadingResult> loadings) =>
        loadings.Any(loading => loading.Fits.Any(fit => fit.Law.Name == edition.Law && fit.Residuals.Count > 0))
            ? Page.Figure(
                ResidualChart.Svg(loadings, edition.Law),
                $"Standardized residuals of the {edition.Law} law against shear rate.",
                Markup.Of($"Residuals of the {edition.Law} law, reading less law over the standard deviation that the error model gives. A pattern that both loadings share speaks against the law, one that differs speaks of the filling."))
            : Markup.None;

    private static Markup Fits(Edition edition, Items<LoadingResult> loadings) => Markup.Of($"""
        <div class="wide"><table><caption>Fits of every law (standard errors from the fit alone)</caption>
        <thead><tr><th scope="col">law</th><th scope="col" class="n">loading</th><th scope="col">parameters</th><th scope="col">chi-square</th><th scope="col" class="n">p</th><th scope="col">usable<br/><small>numerically</small></th><th scope="col">does the law fit?</th></tr></thead>
        <tbody>{loadings.SelectMany(loading => loading.Fits.Select(fit => Fit(edition, loading, fit)))}</tbody></table></div>
        """);

    private static Markup Fit(Edition edition, LoadingResult loading, FittedLaw fit) => Markup.Of($"""
        <tr><th scope="row">{fit.Law.Name}{(fit.Law.Name == edition.Law ? Markup.Of($" <small>decides</small>") : Markup.None)}</th><td class="n">{loading.Recording.Loading}</td><td>{new Markup(string.Join("<br/>", fit.Parameters.Select(parameter => Parameter(parameter).Text)))}</td><td class="w">{(double.IsFinite(fit.Fit.ChiSquare) ? Figures.Fixed(fit.Fit.ChiSquare, 1) : Figures.Nothing)} for {fit.Fit.DegreesOfFreedom}</td><td class="n">{Figures.Probability(fit.Fit.Probability)}</td><td>{(fit.Usable ? Markup.Of($"yes") : Markup.Of($"<b>no</b>: {string.Join("; ", fit.Findings.Where(finding => finding.Severity == Severity.Fault).Select(finding => finding.Kind.Meaning).DefaultIfEmpty(fit.Convergence.Message))}"))}</td><td>{Judgment(FitJudgment.Of(edition, fit))}</td></tr>

        """);

    private static Markup Judgment(string words) => words switch
    {
        "" => Markup.Of($"{Figures.Nothing}"),
        ['n', 'o', ..] => Markup.Of($"<b>no</b>{words[2..]}"),
        _ => Markup.Of($"{words}"),
    };

    private static Markup Parameter(FittedParameter parameter)
    {
        var unit = parameter.Parameter.Shown;
        var estimate = unit.FromSi(parameter.Estimate);
        var number = parameter.StandardError is { } error && double.IsFinite(error)
            ? Rounding.WithUncertainty(estimate, unit.FromSi(error))
            : double.IsFinite(estimate) ? $"{Rounding.Digits(estimate, 4)} (no error: {parameter.WhyNoError})" : Figures.Nothing;
        return Markup.Of($"{parameter.Parameter.Name} {number}{(unit == ShownUnits.One ? "" : $" {unit.Symbol}")}{(parameter.AtBound ? ", at its bound" : "")}");
    }

    private static Markup Aside(Items<LoadingResult> loadings)
    {
        var rows = loadings.SelectMany(loading => loading.Curve.SetAside.Select(aside => Markup.Of($"""
            <tr><td class="n">{loading.Recording.Loading}</td><td class="n">{aside.Point.Number}</td><td class="n">{Rounding.Digits(aside.Point.Rate.ReciprocalSeconds, 4)}</td><td class="n">{Rounding.Digits(aside.Point.Stress.Millipascals, 4)}</td><td>{Place(aside.Point)}</td><td>{new Markup(string.Join("<br/>", aside.Findings.Select(finding => Markup.Of($"<code>{finding.Code}</code> {finding.Message}").Text)))}</td></tr>

            """))).ToArray();
        return rows.Length == 0 ? Markup.Of($"<p>No point is set aside.</p>") : Markup.Of($"""
            <div class="wide"><table><caption>Points set aside, which stay in the data and out of the fits</caption>
            <thead><tr><th scope="col" class="n">loading</th><th scope="col" class="n">point</th><th scope="col" class="n">shear rate, 1/s</th><th scope="col" class="n">shear stress, mPa</th><th scope="col">read at</th><th scope="col">why</th></tr></thead>
            <tbody>{rows}</tbody></table></div>
            """);
    }

    private static string Place(FlowPoint point) => point.Reading is { } reading ? new Where(reading.Where.File, reading.Where.Sheet, reading.Where.Line).ToString() : Figures.Nothing;
}
