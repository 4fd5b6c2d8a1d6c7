namespace HemoRheo.Notebooks;

/// <summary>A study's result: one row a sample with how many verdicts of each kind, then what needs a person.</summary>
internal static class ResultView
{
    public static Table Table(StudyResult result) => HemoRheo.Table.Of("sample", "loadings", "status", "below", "within", "above", "undecided", "not judged", "marked", "findings").WithRows(
        result.Samples,
        sample =>
        {
            var decided = sample.Values.Where(value => value.Value.Law == result.Study.Analysis.DecideBy).ToArray();
            return
            [
                sample.Sample,
                sample.Result.Loadings.Count,
                Words.Of(sample.Result.Status),
                Count(decided, Outcome.Below),
                Count(decided, Outcome.Within),
                Count(decided, Outcome.Above),
                Count(decided, Outcome.Undecided),
                decided.Count(value => value.Verdict is null),
                decided.Any(value => value.Marked),
                sample.Result.Findings.Count,
            ];
        });

    public static Markup Of(StudyResult result) => Markup.Of($"""
        {TableMarkup.Of(Table(result), $"{result}; verdicts on values by {result.Study.Analysis.DecideBy}")}{FindingsView.ByKind(result.Findings)}<p><i>{ResearchUse.Caution}</i></p>
        """);

    private static int Count(JudgedValue[] values, Outcome outcome) => values.Count(value => value.Verdict?.Outcome == outcome);
}
