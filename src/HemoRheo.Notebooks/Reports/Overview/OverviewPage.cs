namespace HemoRheo.Notebooks;

/// <summary>The first page: what was run, what needs attention, the groups side by side, every sample.</summary>
internal static class OverviewPage
{
    /// <summary>The page.</summary>
    public static string Write(Edition edition) => Page.Write("Cohort overview", Trail(edition), edition.Study.Name, Markup.Of($"""
        {RunSection.Lead(edition)}
        {AttentionSection.Write(edition)}
        {VerdictSection.Write(edition)}
        {GroupSection.Write(edition)}
        {RangeSection.Write(edition)}
        {SamplesSection.Write(edition)}
        {EvidenceSection.Write(edition)}
        {FoundSection.Write(edition)}
        {RunSection.Write(edition)}
        {Cautions(edition)}
        """));

    private static Markup Trail(Edition edition) => Markup.Of($"""
        <ul><li><a href="#attention">Attention</a></li><li><a href="#verdicts">Verdicts</a></li><li><a href="#groups">Groups</a></li><li><a href="#ranges">Reference ranges</a></li><li><a href="#samples">Samples</a></li><li><a href="#laws">Laws</a></li><li><a href="#found">Findings</a></li><li><a href="#run">Run</a></li>{edition.Results.Analyzed.Histories.Select(history => Markup.Of($"<li>{edition.InstrumentLink(history.Instrument.Name)}</li>"))}<li><a href="tables/README.txt">Tables</a></li></ul>
        """);

    private static Markup Cautions(Edition edition) => Page.Section("cautions", "Cautions", Markup.Of($"""
        <ul class="look">
        <li>Viscosities outside the kept shear rates are never decided on. A yield stress is an extrapolation below the lowest shear rate and carries the uncertainty of the torque zero.</li>
        <li>A value at the standard hematocrit rests on the rule named beside it; the two rules answer the same question by different assumptions, and both are shown.</li>
        <li>A comparison as it is and one adjusted for hematocrit answer different questions: how the groups differ as people are, and how their blood would differ at one hematocrit. Neither replaces the other.</li>
        <li>Values measured while an instrument was not in order are judged and marked, and never counted among the others.</li>
        {(edition.Summary?.Cautions ?? []).Select(caution => Markup.Of($"<li>{caution}</li>"))}
        </ul>
        """));
}
