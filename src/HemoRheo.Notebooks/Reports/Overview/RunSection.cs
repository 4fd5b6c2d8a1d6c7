namespace HemoRheo.Notebooks;

/// <summary>What was run and whether it is the same as last time.</summary>
internal static class RunSection
{
    private const int MostChanges = 25;

    /// <summary>The first lines of the page.</summary>
    public static Markup Lead(Edition edition)
    {
        var readings = edition.Results.Analyzed.Readings;
        return Markup.Of($"""
            <p class="lead">{Figures.Count(edition.Results.Samples.Count, "sample")} from {Figures.Count(readings.Files.Count, "file")}, {Figures.Count(readings.Blood.Count, "loading")}, {Figures.Count(edition.Results.Analyzed.Histories.Count, "instrument")} with {Figures.Count(edition.Results.Analyzed.Histories.Sum(history => history.Checks.Count), "check")}. Values by the {edition.Law} law, decided on at hematocrit {edition.Study.Standard.Hematocrit.ToString()} by the {(edition.Basis == HematocritBasis.StandardBySlope ? "slope" : "plasma")} rule, at a probability of {Figures.Fixed(edition.Study.Analysis.Level, 2)}.</p>
            <p>{Rerun(edition)}</p>
            """);
    }

    /// <summary>The section.</summary>
    public static Markup Write(Edition edition)
    {
        var study = edition.Study;
        var analysis = study.Analysis;
        return Page.Section("run", "What was run", Markup.Of($"""
            <dl>
            <dt>Study</dt><dd>{study.Name}</dd>
            <dt>Study file</dt><dd>{study.FileName}, SHA-256 begins <code>{Figures.Digest(edition.Record.Settings)}</code></dd>
            <dt>Seed</dt><dd>{study.Seed.ToString(System.Globalization.CultureInfo.InvariantCulture)}</dd>
            <dt>Laws</dt><dd>{string.Join(", ", analysis.Laws)}; decided by {analysis.DecideBy}</dd>
            <dt>Shear rates</dt><dd>{string.Join(", ", analysis.StandardRates)}; {Words.Of(analysis.Ramp)} ramp</dd>
            <dt>Correction by checks</dt><dd>{(analysis.CorrectBias ? "yes" : "no: the bias is a contribution of its own")}</dd>
            <dt>Results</dt><dd>{Figures.Count(edition.Record.Results.Count, "number")}, SHA-256 begins <code>{Figures.Digest(edition.Record.ResultDigest)}</code></dd>
            <dt>Versions</dt><dd>{string.Join("; ", edition.Record.Versions.Select(version => $"{version.Name} {version.Text}"))}</dd>
            <dt>Inputs</dt><dd>{Figures.Count(edition.Record.Inputs.Count, "file")}, each with its digest in <a href="run.json">run.json</a> and <a href="tables/files.csv">files.csv</a></dd>
            </dl>
            {Changes(edition.Comparison)}
            """));
    }

    private static Markup Rerun(Edition edition) => edition.Comparison switch
    {
        null => Markup.Of($"There is no earlier run to compare with."),
        { Identical: true } => Markup.Of($"Compared with the earlier run: <b>identical</b>, every input, setting, version and number."),
        { } changed => Markup.Of($"Compared with the earlier run: <b>{Figures.Count(changed.Changes.Count, "change")}</b>, listed under <a href=\"#run\">What was run</a>."),
    };

    private static Markup Changes(RunComparison? comparison)
    {
        if (comparison is not { Identical: false }) return Markup.None;
        var rows = comparison.Changes.Take(MostChanges).Select(change => Markup.Of($"""
            <tr><td>{change.What}</td><td>{change.Name}</td><td>{Short(change.Before)}</td><td>{Short(change.After)}</td><td>{change.NearestCause}</td></tr>
            """));
        var rest = comparison.Changes.Count > MostChanges ? Markup.Of($"<p class=\"quiet\">{comparison.Changes.Count - MostChanges} more changes are not listed here.</p>") : Markup.None;
        return Markup.Of($"""
            <div class="wide"><table><caption>What changed since the earlier run</caption>
            <thead><tr><th scope="col">what</th><th scope="col">name</th><th scope="col">before</th><th scope="col">after</th><th scope="col">nearest cause</th></tr></thead>
            <tbody>{rows}</tbody></table></div>{rest}
            """);
    }

    private static string Short(string? text) => text is null ? Figures.Nothing : text.Length > 24 ? $"{text[..24]}…" : text;
}
