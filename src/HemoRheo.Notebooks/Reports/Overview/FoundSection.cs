namespace HemoRheo.Notebooks;

/// <summary>Everything that was found, by code: how often, what it means, what to do.</summary>
internal static class FoundSection
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition)
    {
        var kinds = edition.Results.Findings.GroupBy(finding => finding.Kind).OrderByDescending(group => group.Key.Severity).ThenBy(group => group.Key.Code, StringComparer.Ordinal).ToArray();
        if (kinds.Length == 0) return Page.Section("found", "Findings", Markup.Of($"<p>Nothing was found.</p>"));
        return Page.Section("found", "Findings", Markup.Of($"""
            <p>Each finding with its place stands in <a href="tables/findings.csv">findings.csv</a> and on the page of its sample or instrument.</p>
            <div class="wide"><table><caption>What was found, by code</caption>
            <thead><tr><th scope="col">severity</th><th scope="col">code</th><th scope="col" class="n">count</th><th scope="col">samples</th><th scope="col">what it means</th><th scope="col">what to do</th></tr></thead>
            <tbody>{kinds.Select(kind => Row(edition, kind))}</tbody></table></div>
            """));
    }

    private static Markup Row(Edition edition, IGrouping<FindingKind, Finding> kind) => Markup.Of($"""
        <tr><td>{Words.Of(kind.Key.Severity)}</td><td><code>{kind.Key.Code}</code></td><td class="n">{kind.Count()}</td><td>{Samples(edition, kind)}</td><td>{kind.Key.Meaning}</td><td>{kind.Key.WhatToDo}</td></tr>

        """);

    private static Markup Samples(Edition edition, IEnumerable<Finding> findings)
    {
        var samples = findings.Select(finding => finding.Where.Sample).OfType<string>().Distinct().ToArray();
        var shown = string.Join(", ", samples.Take(4).Select(sample => edition.SampleLink(sample).Text));
        return samples.Length > 4 ? Markup.Of($"{new Markup(shown)} and {samples.Length - 4} more") : new(shown);
    }
}
