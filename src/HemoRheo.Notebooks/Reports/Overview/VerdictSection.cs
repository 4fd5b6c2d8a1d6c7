namespace HemoRheo.Notebooks;

/// <summary>How many verdicts of each kind each group has.</summary>
internal static class VerdictSection
{
    /// <summary>The section.</summary>
    public static Markup Write(Edition edition)
    {
        var counts = (edition.Summary?.Outcomes ?? Counted(edition))
            .Where(count => count.Basis == edition.Basis || count.Basis == HematocritBasis.Native)
            .GroupBy(count => (count.Measurand, count.Basis))
            .Where(one => one.Any(count => count.Below + count.Within + count.Above + count.Undecided + count.Marked > 0))
            .OrderBy(one => one.Key.Basis == edition.Basis ? 0 : 1).SelectMany(one => one).ToArray();
        if (counts.Length == 0) return Page.Section("verdicts", "Verdicts", Markup.Of($"<p>No value was judged: there is no reference range.</p>"));
        return Page.Section("verdicts", "Verdicts", Markup.Of($"""
            <p>A verdict says where a value lies against its reference range if one outcome is at least {Figures.Fixed(edition.Study.Analysis.Level, 2)} probable; else it is undecided. Values measured while an instrument was not in order are judged, marked and counted apart.</p>
            <div class="wide"><table><caption>Verdicts by group, counted in samples; values by the {edition.Law} law</caption>
            <thead><tr><th scope="col">quantity</th><th scope="col">group</th><th scope="col" class="n">samples</th><th scope="col" class="n">below</th><th scope="col" class="n">within</th><th scope="col" class="n">above</th><th scope="col" class="n">undecided</th><th scope="col" class="n">not judged</th><th scope="col" class="n">marked</th></tr></thead>
            <tbody>{counts.Select(Row)}</tbody></table></div>
            """));
    }

    private static Markup Row(OutcomeCount count) => Markup.Of($"""
        <tr><th scope="row">{count.Measurand.Name}<br/><small>{Words.Of(count.Basis)}</small></th><td>{count.Label}</td><td class="n">{count.Samples}</td><td class="n">{count.Below}</td><td class="n">{count.Within}</td><td class="n">{count.Above}</td><td class="n">{count.Undecided}</td><td class="n">{count.NotJudged}</td><td class="n">{count.Marked}</td></tr>

        """);

    private static Items<OutcomeCount> Counted(Edition edition) => new[] { edition.Basis, HematocritBasis.Native }
        .SelectMany(basis => edition.Rates.Select(rate => (basis, rate, values: edition.Results.Samples.Select(sample => edition.Find(sample, rate, basis)).ToArray())))
        .Where(one => one.values.Any(value => value?.Verdict is not null))
        .Select(one => new OutcomeCount("all samples", one.rate, one.basis, Of(one.values, Outcome.Below), Of(one.values, Outcome.Within), Of(one.values, Outcome.Above), Of(one.values, Outcome.Undecided), one.values.Count(value => value?.Verdict is null), one.values.Count(value => value is { Verdict: not null, Marked: true })))
        .ToItems();

    private static int Of(JudgedValue?[] values, Outcome outcome) => values.Count(value => value is { Marked: false, Verdict: { } verdict } && verdict.Outcome == outcome);
}
