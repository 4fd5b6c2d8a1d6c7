namespace HemoRheo.Notebooks;

/// <summary>One instrument: is it right, since when not, and which samples does that touch.</summary>
internal static class InstrumentPage
{
    /// <summary>The page.</summary>
    public static string Write(Edition edition, InstrumentHistory history)
    {
        var touched = TouchedSamples.Of(edition, history.Instrument.Name);
        return Page.Write($"Instrument {history.Instrument.Name}", Trail(edition, history), edition.Study.Name, Markup.Of($"""
            {Answers(edition, history, touched)}
            {Over(history)}
            {Checks(history)}
            {Periods(edition, history)}
            {Touched(edition, touched)}
            {Page.Section("findings", "Findings", Marks.Findings($"Findings about instrument {history.Instrument.Name} and its checks", history.Findings.Concat(history.Checks.SelectMany(check => check.Findings))))}
            """));
    }

    private static Markup Trail(Edition edition, InstrumentHistory history) => Markup.Of($"""
        <ul><li><a href="../index.html">Cohort overview</a></li>{edition.Results.Analyzed.Histories.Where(other => other.Instrument.Name != history.Instrument.Name).Select(other => Markup.Of($"<li>{edition.InstrumentLink(other.Instrument.Name, "../")}</li>"))}{(history.Checks.Count == 0 ? Markup.None : Markup.Of($"<li><a href=\"{edition.InstrumentPages[Edition.Week(history.Instrument.Name)]}\">Weekly page</a></li>"))}<li><a href="#over">Over time</a></li><li><a href="#checks">Checks</a></li><li><a href="#periods">Periods</a></li><li><a href="#touched">Samples touched</a></li><li><a href="#findings">Findings</a></li></ul>
        """);

    private static Markup Answers(Edition edition, InstrumentHistory history, Items<TouchedSample> touched)
    {
        var samples = edition.Results.Samples.Count(sample => sample.Result.Loadings.Any(loading => loading.Recording.Instrument == history.Instrument.Name));
        return Markup.Of($"""
            <div class="answers">
            <div><h3>Is the instrument right?</h3>{StatusStory.Now(history)}</div>
            <div><h3>Since when not?</h3>{StatusStory.Troubles(history)}</div>
            <div><h3>Which samples does that touch?</h3><p>{(touched.Count == 0 ? Markup.Of($"None of {Figures.Count(samples, "sample")} measured on it.") : Markup.Of($"<b>{touched.Count} of {samples}</b> measured on it, listed <a href=\"#touched\">below</a> with the reason."))}</p></div>
            </div>
            """);
    }

    private static Markup Over(InstrumentHistory history)
    {
        if (history.Checks.Count == 0) return Page.Section("over", "Over time", Markup.Of($"<p>There is no check of this instrument.</p>"));
        var instrument = history.Instrument;
        return Page.Section("over", "Over time", Page.Figure(
            CheckChart.Svg(history, StatusSpans.Of(history)),
            $"Error of each check of instrument {instrument.Name} over time: {string.Join("; ", history.Checks.Select(check => $"{Figures.Date(check.At)} {Figures.Signed(Percent(check.Error.X))} %, {Words.Of(check.Outcome)}"))}.",
            Markup.Of($"Each check with its 95 % interval, the limit of ±{Figures.Fixed(100 * instrument.CheckLimit, 1)} % (dashed), and the stretches of time in which the instrument is not in order (shaded). A passed check vouches for {Figures.Fixed(instrument.CheckEvery.TotalDays, 0)} days. A failed check puts in doubt what was measured since the last passed one.")));
    }

    private static Markup Checks(InstrumentHistory history) => Page.Section("checks", "Checks", Markup.Of($"""
        <div class="wide"><table><caption>Checks with a calibration fluid</caption>
        <thead><tr><th scope="col">check</th><th scope="col">outcome</th><th scope="col">when</th><th scope="col">fluid<br/><small>lot</small></th><th scope="col" class="n">tempera-<br/>ture, °C</th><th scope="col" class="n">measured,<br/>mPa·s</th><th scope="col" class="n">certified<br/><small>at that temperature</small></th><th scope="col" class="n">error,<br/>%</th><th scope="col" class="w">95 % interval,<br/>%</th><th scope="col" class="n">probability<br/>within ±{Figures.Fixed(100 * history.Instrument.CheckLimit, 1)} %</th></tr></thead>
        <tbody>{history.Checks.Select(Check)}</tbody></table></div>
        """));

    private static Markup Check(InstrumentCheck check)
    {
        var interval = check.Error.Interval().Select(Percent);
        var outcome = Markup.Of($"{Words.Of(check.Outcome)}");
        return Markup.Of($"""
            <tr><th scope="row">{check.Name}</th><td class="w">{(check.Outcome == CheckOutcome.Passes ? outcome : Markup.Of($"<span class=\"loud\">{outcome}</span>"))}</td><td class="w">{Figures.Moment(check.At)}</td><td class="w">{check.Fluid.Name}<br/><small>{check.Fluid.Lot}</small></td><td class="n">{Figures.Fixed(check.Temperature.DegreesCelsius, 2)}</td><td class="n">{Viscosity(check.Measured, check.Error.StandardUncertainty)}</td><td class="n">{Viscosity(check.Expected, check.Fluid.RelativeExpandedUncertainty / check.Fluid.CoverageFactor)}</td><td class="n">{Figures.Signed(Percent(check.Error.X))}</td><td class="w">{Figures.Signed(interval.Lower)} to {Figures.Signed(interval.Upper)}</td><td class="n">{Figures.Probability(check.ProbabilityWithin)}</td></tr>

            """);
    }

    private static Markup Periods(Edition edition, InstrumentHistory history) => Page.Section("periods", "Periods between calibrations", history.Periods.Count == 0
        ? Markup.Of($"<p>No check passed, so there is no period and no correction.</p>")
        : Markup.Of($"""
            <p>{(edition.Study.Analysis.CorrectBias ? "Values are divided by the mean of the period's passed checks." : "This study does not correct: the mean of the period's passed checks is a contribution of its own to every value.")} A failed check ends a period and is never averaged into it.</p>
            <div class="wide"><table><caption>Periods and their correction</caption>
            <thead><tr><th scope="col" class="n">period</th><th scope="col">from</th><th scope="col">until</th><th scope="col" class="n">checks</th><th scope="col" class="n">mean error, %</th><th scope="col">95 % interval, %</th><th scope="col" class="n">scatter of one check, %</th><th scope="col" class="n">its degrees of freedom</th></tr></thead>
            <tbody>{history.Periods.Select(Period)}</tbody></table></div>
            """));

    private static Markup Period(InstrumentPeriod period)
    {
        var interval = period.Correction.Interval().Select(Percent);
        return Markup.Of($"""
            <tr><th scope="row" class="n">{period.Number}</th><td>{Figures.Date(period.From)}</td><td>{(period.Until is { } until ? Figures.Date(until) : "lasts")}</td><td class="n">{period.Checks.Count}</td><td class="n">{Figures.Signed(Percent(period.Correction.X))}</td><td class="w">{Figures.Signed(interval.Lower)} to {Figures.Signed(interval.Upper)}</td><td class="n">{Figures.Fixed(100 * period.Scatter, 2)}</td><td class="n">{Figures.Freedom(period.ScatterDegreesOfFreedom)}</td></tr>

            """);
    }

    private static Markup Touched(Edition edition, Items<TouchedSample> touched) => Page.Section("touched", "Samples touched", touched.Count == 0
        ? Markup.Of($"<p>No sample was measured while this instrument was not in order.</p>")
        : Markup.Of($"""
            <div class="wide"><table><caption>Samples measured while the instrument was not in order: judged, marked, and not counted among the others</caption>
            <thead><tr><th scope="col">sample</th><th scope="col" class="n">loading</th><th scope="col">measured</th><th scope="col">status</th><th scope="col">why</th></tr></thead>
            <tbody>{touched.Select(one => Markup.Of($"<tr><th scope=\"row\">{edition.SampleLink(one.Sample, "../")}</th><td class=\"n\">{one.Loading}</td><td class=\"w\">{Figures.Moment(one.At)}</td><td>{Marks.Status(one.Standing.Status)}</td><td>{one.Standing.Reason}</td></tr>\n"))}</tbody></table></div>
            """));

    private static string Viscosity(Viscosity viscosity, double relative) => Rounding.Number(viscosity.MillipascalSeconds, relative * viscosity.MillipascalSeconds);

    private static double Percent(double logError) => 100 * (Math.Exp(logError) - 1);
}
