namespace HemoRheo.Notebooks;

/// <summary>What a person should look at first, the weightiest first.</summary>
internal static class AttentionSection
{
    private const int MostNames = 12;

    /// <summary>The section.</summary>
    public static Markup Write(Edition edition)
    {
        var points = Points(edition).ToArray();
        return Page.Section("attention", "What needs attention first", points.Length == 0
            ? Markup.Of($"<p>Nothing here needs a person: every file was read, every check passed, no sample is set aside.</p>")
            : Markup.Of($"<ol class=\"look\">{points.Select(point => Markup.Of($"<li>{point}</li>\n"))}</ol>"));
    }

    private static IEnumerable<Markup> Points(Edition edition) =>
        Law(edition).Concat(Ranges(edition)).Concat(Instruments(edition)).Concat(Files(edition)).Concat(Samples(edition)).Concat(Study(edition));

    private static IEnumerable<Markup> Law(Edition edition) => edition.Results.Analyzed.Pool.Laws
        .Where(law => law.Law == edition.Law && !law.Fits)
        .Select(law => Markup.Of($"<b>The law that decides does not fit this study.</b> {law.Words} Its values are shown, not judged and not compared. <span class=\"quiet\">{PoolingFindings.LawDoesNotFit.WhatToDo}</span>"));

    private static IEnumerable<Markup> Ranges(Edition edition)
    {
        if (edition.Results.Ranges.Any(range => range.Basis == edition.Basis) || Law(edition).Any()) yield break;
        var why = edition.Results.Samples.SelectMany(edition.Deciding).Where(value => value.Value.Basis == edition.Basis).Select(value => value.WhyNotJudged).OfType<string>().GroupBy(text => text).MaxBy(same => same.Count())?.Key;
        yield return Markup.Of($"<b>No value at the standard hematocrit is judged: there is no reference range.</b> {why}");
    }

    private static IEnumerable<Markup> Instruments(Edition edition)
    {
        foreach (var history in edition.Results.Analyzed.Histories)
        {
            var name = edition.InstrumentLink(history.Instrument.Name);
            var failed = history.Checks.Where(check => check.Outcome == CheckOutcome.Fails).ToArray();
            var unsure = history.Checks.Count(check => check.Outcome == CheckOutcome.CannotTell);
            var touched = TouchedSamples.Of(edition, history.Instrument.Name);
            if (failed.Length > 0) yield return Markup.Of($"<b>Instrument {name} failed {Figures.Count(failed.Length, "check")}</b> ({string.Join(", ", failed.Select(check => $"{Figures.Date(check.At)}: {Figures.Signed(100 * (Math.Exp(check.Error.X) - 1))} %"))}; limit {Figures.Fixed(100 * history.Instrument.CheckLimit, 1)} %). {Touched(edition, touched)}");
            else if (touched.Count > 0) yield return Markup.Of($"<b>Instrument {name} was not in order all the time.</b> {Touched(edition, touched)}");
            if (unsure > 0) yield return Markup.Of($"Instrument {name}: {Figures.Count(unsure, "check")} could not tell, the uncertainty being too large for the limit.");
            if (history.Checks.Count == 0) yield return Markup.Of($"<b>Instrument {name} has no check</b>: its status is unknown.");
        }
    }

    private static Markup Touched(Edition edition, Items<TouchedSample> touched) => touched.Count == 0
        ? Markup.Of($"No sample of the study was measured in that time.")
        : Markup.Of($"{Figures.Count(touched.Count, "sample")} measured while it was not in order: {Names(edition, [.. touched.Select(one => one.Sample)])}.");

    private static IEnumerable<Markup> Files(Edition edition) => edition.Results.Analyzed.Readings.Files
        .Where(file => file.Findings.Any(finding => finding.Severity == Severity.Fault))
        .Select(file => Markup.Of($"<b>File {file.Path} could not be read whole.</b> {file.Findings.First(finding => finding.Severity == Severity.Fault).Message} <span class=\"quiet\">{file.Findings.First(finding => finding.Severity == Severity.Fault).Kind.WhatToDo}</span>"));

    private static IEnumerable<Markup> Samples(Edition edition)
    {
        var aside = edition.Results.Samples.Where(edition.IsSetAside).ToArray();
        foreach (var reason in aside.GroupBy(sample => edition.Reasons(sample).FirstOrDefault()?.Kind).Where(group => group.Key != PoolingFindings.LawDoesNotFit).OrderByDescending(group => group.Count()))
        {
            var why = reason.Key is { } kind ? Markup.Of($"{kind.Meaning} (<code>{kind.Code}</code>) {kind.WhatToDo}") : Markup.Of($"Their pages say why.");
            yield return Markup.Of($"<b>{Figures.Count(reason.Count(), "sample")} set aside</b>: {Names(edition, [.. reason.Select(sample => sample.Sample)])}. {why}");
        }
    }

    private static IEnumerable<Markup> Study(Edition edition) => edition.Results.Analyzed.Pool.Findings
        .Concat(edition.Results.Analyzed.Pool.Scatter.SelectMany(scatter => scatter.Findings))
        .Concat(edition.Results.Findings.Where(finding => finding.Kind == RangeFindings.LawContradicted))
        .Concat(edition.Summary?.Findings ?? [])
        .Where(finding => finding.Severity != Severity.Note && finding.Kind != PoolingFindings.LawDoesNotFit)
        .Distinct()
        .GroupBy(finding => finding.Kind)
        .Select(alike => Markup.Of($"{alike.First().Message}{(alike.Count() > 1 ? Markup.Of($" <a href=\"#found\">{alike.Count() - 1} more</a> of this kind.") : Markup.None)} <span class=\"quiet\">{alike.Key.WhatToDo}</span>"));

    private static Markup Names(Edition edition, string[] samples)
    {
        var names = string.Join(", ", samples.Take(MostNames).Select(sample => edition.SampleLink(sample).Text));
        return samples.Length > MostNames ? Markup.Of($"{new Markup(names)} and {samples.Length - MostNames} more") : new(names);
    }
}
