namespace HemoRheo.Notebooks;

/// <summary>Who is counted, who is not, and why: people and samples apart, each adding up.</summary>
internal static class CountSection
{
    /// <summary>The tables.</summary>
    public static Markup Write(CohortSummary summary)
    {
        var rows = Alike(summary).ToArray();
        return Markup.Of($"""
            <div class="wide"><table><caption>Samples: used, marked and set aside are all that were measured</caption>
            <thead><tr><th scope="col">group</th><th scope="col">quantity</th><th scope="col" class="n">measured</th><th scope="col" class="n">used</th><th scope="col" class="n">marked</th><th scope="col">set aside, by code of the finding</th></tr></thead>
            <tbody>{rows.Select(row => Markup.Of($"<tr><th scope=\"row\">{row.Group.Label}</th><td>{row.Names}</td><td class=\"n\">{row.Group.Samples}</td><td class=\"n\">{row.Group.SamplesUsed}</td><td class=\"n\">{row.Group.Marked}</td><td>{Marks.Reasons(row.Group.SetAside)}</td></tr>\n"))}</tbody></table></div>
            <div class="wide"><table><caption>People: counted and left out are all of the group</caption>
            <thead><tr><th scope="col">group</th><th scope="col">quantity</th><th scope="col" class="n">people</th><th scope="col" class="n">counted</th><th scope="col">from their samples</th><th scope="col">left out, by code of their first sample</th></tr></thead>
            <tbody>{rows.Select(row => Markup.Of($"<tr><th scope=\"row\">{row.Group.Label}</th><td>{row.Names}</td><td class=\"n\">{row.Group.People}</td><td class=\"n\">{row.Group.Used}</td><td>{Visits(row.Group)}</td><td>{Marks.Reasons(row.Group.PeopleLeftOut ?? [])}</td></tr>\n"))}</tbody></table></div>
            <p class="quiet">Marked samples were measured while the instrument was not in order; they are never used. A person without any usable sample is left out.</p>
            """);
    }

    /// <summary>How many samples the counted people have, and that several of one person count once.</summary>
    private static string Visits(GroupSummary group) => (group.SamplesUsed - group.Used) switch
    {
        0 when group.Used == 0 => Figures.Nothing,
        0 => "one each",
        var further => $"{group.SamplesUsed}: {Figures.Count(further, "further visit")} averaged into the person",
    };

    private static IEnumerable<(GroupSummary Group, string Names)> Alike(CohortSummary summary)
    {
        var groups = summary.Measurands.SelectMany(one => new[] { (one, group: one.First), (one, group: one.Second) })
            .GroupBy(pair => pair.group with { Mean = null, StandardDeviation = null, WhyNoMean = null });
        foreach (var label in groups.GroupBy(alike => alike.Key.Label))
        {
            var byCount = label.OrderBy(alike => alike.Count()).ToArray();
            foreach (var alike in byCount)
            {
                var names = byCount.Length == 1 ? "every quantity" : alike == byCount[^1] ? "all other quantities" : string.Join("; ", alike.Select(pair => $"{pair.one.Measurand.Name}, {Words.Short(pair.one.Basis)}"));
                yield return (alike.Key, names);
            }
        }
    }
}
