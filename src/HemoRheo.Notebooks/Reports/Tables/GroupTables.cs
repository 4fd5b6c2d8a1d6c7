namespace HemoRheo.Notebooks;

/// <summary>Groups, their comparison, their verdicts, and the reference ranges.</summary>
internal static class GroupTables
{
    /// <summary>One row a group and quantity.</summary>
    public static StudyTable Groups(Edition edition) => new("cohort.csv", "One row a group and quantity: how many people of how many from how many samples, why not the others, and the mean.",
        Table.Of("measurand", "law", "basis", "group", "people", "n", "people left out", "samples", "samples used", "marked", "set aside", "reasons", "mean", "lower", "upper", "unit", "UCUM code", "working value", "working uncertainty", "degrees of freedom", "spread", "reason")
            .WithRows(Measurands(edition).SelectMany(one => new[] { (one, group: one.First), (one, group: one.Second) }), row => Group(row.one, row.group)));

    /// <summary>One row a comparison of two groups.</summary>
    public static StudyTable Comparisons(Edition edition) => new("comparisons.csv", "One row a comparison of two groups and the question it answers; the working value is the difference of logarithms, or of numbers for quantities that may be negative.",
        Table.Of("measurand", "law", "basis", "question", "first group", "second group", "ratio", "ratio lower", "ratio upper", "working value", "working uncertainty", "degrees of freedom", "probability", "method", "reason")
            .WithRows(Measurands(edition).SelectMany(one => new[] { one.Total, one.Adjusted }.OfType<GroupDifference>().Select(difference => (one, difference))), row => Comparison(row.one, row.difference)));

    /// <summary>One row a group and range.</summary>
    public static StudyTable Verdicts(Edition edition) => new("verdicts.csv", "One row a group and quantity: how many samples have a verdict of each kind, or none.",
        Table.Of("group", "measurand", "basis", "samples", "below", "within", "above", "undecided", "not judged", "marked ones")
            .WithRows(edition.Summary?.Outcomes ?? [], count => [count.Label, count.Measurand.Name, Words.Of(count.Basis), count.Samples, count.Below, count.Within, count.Above, count.Undecided, count.NotJudged, count.Marked]));

    /// <summary>One row a reference range.</summary>
    public static StudyTable Ranges(Edition edition) => new("ranges.csv", "One row a reference range: limits, their own intervals, method and source.",
        Table.Of("measurand", "law", "basis", "lower limit", "upper limit", "unit", "UCUM code", "lower limit from", "lower limit to", "upper limit from", "upper limit to", "n", "reasons", "method", "source")
            .WithRows(edition.Results.Ranges, Range));

    private static Items<MeasurandSummary> Measurands(Edition edition) => edition.Summary?.Measurands ?? [];

    private static Cell[] Group(MeasurandSummary one, GroupSummary group)
    {
        var interval = group.Mean?.Interval().Select(one.Measurand.ToShown);
        return
        [
            one.Measurand.Name, one.Law, Words.Of(one.Basis), group.Label, group.People, group.Used, Reasons(group.PeopleLeftOut ?? []), group.Samples, group.SamplesUsed, group.Marked, group.SetAside.Sum(reason => reason.Count), Reasons(group.SetAside),
            StudyTable.Number(group.Mean is { } mean ? one.Measurand.ToShown(mean.X) : null), StudyTable.Number(interval?.Lower), StudyTable.Number(interval?.Upper), one.Measurand.Shown.Symbol, one.Measurand.Shown.Ucum,
            StudyTable.Number(group.Mean?.X), StudyTable.Number(group.Mean?.StandardUncertainty), StudyTable.Number(group.Mean?.DegreesOfFreedom), StudyTable.Number(group.StandardDeviation), group.WhyNoMean,
        ];
    }

    private static Cell[] Comparison(MeasurandSummary one, GroupDifference difference)
    {
        var ratio = one.Measurand.Logarithmic ? difference.Difference : null;
        var interval = ratio?.Interval().Select(Math.Exp);
        return
        [
            one.Measurand.Name, one.Law, Words.Of(one.Basis), difference.Question, one.First.Label, one.Second.Label, StudyTable.Number(ratio is null ? null : Math.Exp(ratio.X)), StudyTable.Number(interval?.Lower), StudyTable.Number(interval?.Upper),
            StudyTable.Number(difference.Difference?.X), StudyTable.Number(difference.Difference?.StandardUncertainty), StudyTable.Number(difference.Difference?.DegreesOfFreedom), StudyTable.Number(difference.Probability), difference.Method, difference.WhyNot,
        ];
    }

    private static Cell[] Range(ReferenceRange range)
    {
        Cell Shown(double? working) => StudyTable.Number(working is { } known ? range.Measurand.ToShown(known) : null);
        return
        [
            range.Measurand.Name, range.Law, Words.Of(range.Basis), Shown(range.Limits.Lower), Shown(range.Limits.Upper), range.Measurand.Shown.Symbol, range.Measurand.Shown.Ucum,
            Shown(range.LowerLimit?.Lower), Shown(range.LowerLimit?.Upper), Shown(range.UpperLimit?.Lower), Shown(range.UpperLimit?.Upper), range.Used, Reasons(range.Missing), range.Method, range.Source,
        ];
    }

    private static string Reasons(Items<CountedReason> reasons) => string.Join("; ", reasons.Select(reason => $"{reason.Code} {reason.Count}"));
}
