namespace HemoRheo.Notebooks;

/// <summary>The weekly page of an instrument, one side of A4: is it right, did it drift, what does that touch; chart, last checks, samples in doubt, who must do what.</summary>
internal static class WeeklyPage
{
    private const int MostChecks = 6;
    private const int MostGroups = 4;

    /// <summary>The page.</summary>
    /// <param name="review">The instrument at a moment.</param>
    /// <param name="trail">Links to other pages; none where it stands alone.</param>
    public static string Write(InstrumentReview review, Markup trail) => Page.Write($"Instrument {review.Instrument.Name}, {Figures.Moment(review.At)}", trail, review.Study, Body(review), WeeklyStyle.Css);

    /// <summary>What the page says, which is shown in notebooks too.</summary>
    public static Markup Body(InstrumentReview review) => Markup.Of($"""
        <div class="answers">{ReviewWords.Of(review).Select(Answer)}</div>
        {Tasks(review)}
        {Chart(review)}
        {Checks(review)}
        {Samples(review)}
        {Digest(review)}
        """);

    private static Markup Answer(ReviewAnswer answer) => Markup.Of($"""
        <div><h3>{answer.Question}</h3><p class="short"><b>{answer.Short}</b></p>{answer.Lines.Select(line => Markup.Of($"<p>{Shown(line)}</p>"))}</div>

        """);

    private static Markup Tasks(InstrumentReview review) => Page.Section("tasks", "Who must do what", Markup.Of($"""
        <ul class="tasks">{ReviewTasks.Of(review).GroupBy(task => task.Who).Select(own => Markup.Of($"<li><b>{own.Key}</b><span>{Shown(string.Join(' ', own.Select(task => task.What)))}</span></li>"))}</ul>
        """));

    private static Markup Chart(InstrumentReview review)
    {
        if (review.Course.Checks.Count == 0) return Markup.None;
        var count = Math.Min(review.Course.Checks.Count, ControlChartPicture.Most);
        return Page.Section("chart", "Its checks over time", Page.Figure(
            ControlChartPicture.Svg(review.Chart, review.Instrument.CheckLimit),
            $"Control chart of instrument {review.Instrument.Name}, its last {Figures.Count(count, "check")}: {string.Join("; ", review.Course.Checks.TakeLast(count).Select(check => $"{Figures.Date(check.At)} {Figures.Signed(Percent(check.Error.X))} %"))}.",
            Markup.Of($"Each mark is a check with a fluid of known viscosity; its bar holds the true error in 95 of 100 cases. An instrument that does not change stays between the dashed lines by chance (drawn from the sixth check on); beyond the thick lines it reads too wrong to be used.")));
    }

    private static Markup Checks(InstrumentReview review)
    {
        var last = review.Course.Checks.TakeLast(MostChecks).Reverse().ToArray();
        if (last.Length == 0) return Markup.None;
        var decades = last.SelectMany(check => check.Bands).Select(band => band.Torque).Distinct().OrderBy(decade => decade.Lower).ToArray();
        var limit = Figures.Fixed(100 * review.Instrument.CheckLimit, 1);
        return Page.Section("checks", last.Length == review.Course.Checks.Count ? "All checks, the last first" : $"The last {last.Length} of {review.Course.Checks.Count} checks", Markup.Of($"""
            <div class="wide"><table><caption>Checks with a calibration fluid</caption>
            <thead><tr><th scope="col">check</th><th scope="col">when</th><th scope="col">fluid, lot</th><th scope="col" class="n">reads wrong by, %</th><th scope="col" class="n">sure to ±, %</th><th scope="col" class="n">E<sub>n</sub></th><th scope="col" class="n">chance it is within ±{limit} %</th><th scope="col">outcome</th>{decades.Select(decade => Markup.Of($"<th scope=\"col\">at {Figures.Digits(1e6 * decade.Lower)} to {Figures.Digits(1e6 * decade.Upper)} µN·m</th>"))}</tr></thead>
            <tbody>{last.Select(check => Check(check, decades))}</tbody></table></div>
            """));
    }

    private static Markup Check(LoggedCheck check, Interval[] decades)
    {
        return Markup.Of($"""
            <tr><th scope="row">{check.Name}</th><td class="w">{Figures.Date(check.At)}</td><td class="w">{check.Fluid}, {check.Lot}</td><td class="n">{Figures.Signed(Percent(check.Error.X))}</td><td class="n">{Figures.Fixed(100 * check.Error.ExpandedUncertainty(NormalizedError.Coverage), 2)}</td><td class="n">{Figures.Signed(NormalizedError.Of(check.Error))}</td><td class="n">{Figures.Probability(check.ProbabilityWithin)}</td><td class="w">{Outcome(check.Outcome)}</td>{decades.Select(decade => Markup.Of($"<td class=\"w\">{Outcome(check.BandAt(decade.Lower)?.Outcome)}</td>"))}</tr>

            """);
    }

    private static Markup Outcome(CheckOutcome? outcome) => outcome switch
    {
        null => Markup.Of($"{Figures.Nothing}"),
        CheckOutcome.Fails => Markup.Of($"<span class=\"loud\">{Words.Of(outcome.Value)}</span>"),
        _ => Markup.Of($"{Words.Of(outcome.Value)}"),
    };

    private static Markup Samples(InstrumentReview review)
    {
        if (review.InDoubt.Count == 0) return Markup.None;
        var groups = DoubtGroup.Of(review);
        var rest = groups.Skip(MostGroups).Sum(group => group.Samples.Count);
        return Page.Section("samples", $"Samples in doubt: {review.InDoubt.Count} of {review.Samples}", Markup.Of($"""
            <div class="wide"><table><caption>Samples in doubt by reason</caption>
            <thead><tr><th scope="col" class="n">count</th><th scope="col">samples</th><th scope="col">measured</th><th scope="col">instrument</th><th scope="col">why</th></tr></thead>
            <tbody>{groups.Take(MostGroups).Select(group => Markup.Of($"<tr><td class=\"n\">{group.Samples.Count}</td><th scope=\"row\">{group.Names}</th><td>{group.Days}</td><td class=\"w\">{Words.Of(group.Status)}</td><td>{Shown(group.Reason)}</td></tr>\n"))}</tbody></table></div>
            {(rest == 0 ? Markup.None : Markup.Of($"<p>And {rest} more for other reasons.</p>"))}
            """));
    }

    private static Markup Digest(InstrumentReview review) => Markup.Of($"""
        <p class="digest">{(review.Log is { } log ? $"By the instrument's log, {Figures.Count(log.Entries, "entry", "entries")}, {(log.Sound ? "all as they were written" : "changed after they were written")}; last digest {log.LastDigest}" : "By the study's own checks; no log was asked.")}</p>
        """);

    // The library writes units in plain letters.
    private static string Shown(string words) => words.Replace("uN.m", "µN·m", StringComparison.Ordinal);

    private static double Percent(double logError) => 100 * (Math.Exp(logError) - 1);
}
