namespace HemoRheo.Notebooks;

/// <summary>Every value of every sample, and the budgets of the law that decides.</summary>
internal static class ValueTables
{
    private static readonly SourceKind[] Kinds = Enum.GetValues<SourceKind>();

    /// <summary>One row a value.</summary>
    public static StudyTable Values(Edition edition) => new("values.csv", "One row a value: sample, law, quantity and hematocrit basis, with its whole budget by kind of source and its verdict.",
        Table.Of([
            "sample", "person", "visit", "group", "law", "decides", "measurand", "basis", "value", "unit", "UCUM code", "standard uncertainty", "degrees of freedom", "lower", "upper",
            "working value", "working uncertainty", .. Kinds.Select(kind => $"c {kind.Words()}"), "interpolated", "decidable", "why not decidable", "status",
            "outcome", "p below", "p within", "p above", "why not judged", "marked", "changes with limits", "lower limit", "upper limit",
        ]).WithRows(Judged(edition), row => Row(edition, row.Sample, row.Value)));

    /// <summary>One row a contribution to a value of the law that decides.</summary>
    public static StudyTable Budget(Edition edition) => new("budget.csv", $"One row a contribution to a value of the law that decides ({edition.Law}).",
        Table.Of("sample", "law", "measurand", "basis", "kind", "belongs to", "working contribution", "share", "degrees of freedom", "variance estimate", "shared")
            .WithRows(Judged(edition).Where(row => row.Value.Value.Law == edition.Law).SelectMany(row => row.Value.Value.Value.Parts.Select(part => (row.Sample, row.Value.Value, part))), row =>
            [
                row.Sample.Sample, row.Value.Law, row.Value.Measurand.Name, Words.Of(row.Value.Basis), row.part.Source.Kind.Words(), row.part.Source.Of,
                StudyTable.Number(row.part.Amount), StudyTable.Number(100 * row.part.Amount * row.part.Amount / row.Value.Value.Variance), StudyTable.Number(row.part.DegreesOfFreedom), row.part.Estimate, row.part.Source.Shared,
            ]));

    private static IEnumerable<(JudgedSample Sample, JudgedValue Value)> Judged(Edition edition) => edition.Results.Samples.SelectMany(sample => sample.Values.Select(value => (sample, value)));

    private static Cell[] Row(Edition edition, JudgedSample sample, JudgedValue judged)
    {
        var value = judged.Value;
        var record = sample.Result.Record;
        var interval = value.Interval();
        var limits = judged.Range?.Limits.Select(value.Measurand.ToShown);
        return
        [
            sample.Sample, record?.Person, record?.Visit, edition.GroupOf(sample), value.Law, value.Law == edition.Law, value.Measurand.Name, Words.Of(value.Basis),
            StudyTable.Number(value.Shown), value.Measurand.Shown.Symbol, value.Measurand.Shown.Ucum, StudyTable.Number(Figures.Uncertainty(value.Measurand, value.Value)), StudyTable.Number(value.Value.DegreesOfFreedom),
            StudyTable.Number(interval.Lower), StudyTable.Number(interval.Upper), StudyTable.Number(value.Value.X), StudyTable.Number(value.Value.StandardUncertainty),
            .. Kinds.Select(kind => StudyTable.Number(value.Value.Part(kind))),
            StudyTable.Number(value.Interpolated is { } working ? value.Measurand.ToShown(working) : null), value.Decidable, value.Decidable ? "" : string.Join(" ", WhyNot.Codes(value)), Words.Of(sample.Result.StatusOf(value)),
            judged.Verdict is { } verdict ? Words.Of(verdict.Outcome) : "", StudyTable.Number(judged.Verdict?.Below), StudyTable.Number(judged.Verdict?.Within), StudyTable.Number(judged.Verdict?.Above),
            judged.WhyNotJudged, judged.Marked, judged.ChangesWithLimits, StudyTable.Number(limits?.Lower), StudyTable.Number(limits?.Upper),
        ];
    }
}
