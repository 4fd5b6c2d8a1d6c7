namespace HemoRheo.Notebooks;

/// <summary>A control chart and the log it may be made of.</summary>
internal static class ControlChartView
{
    public static Markup Of(ControlChart chart)
    {
        var picture = chart.Segments.Any(segment => segment.Points.Count > 0) ? ChartMarkup.Of(chart.Chart()) : Markup.Of($"<p>There is no check.</p>");
        return Markup.Of($"{picture}{FindingsView.Of(chart.Findings)}");
    }

    public static Markup Of(LogContents log)
    {
        var table = HemoRheo.Table.Of("entry", "recorded at", "recorded by", "says", "digest").WithRows(
            log.Entries,
            entry => [entry.Number, entry.RecordedAt, entry.By, $"{entry.What}", Figures.Digest(entry.Digest)]);
        return Markup.Of($"{TableMarkup.Of(table, $"Log of {log.Instrument}, {log.Verification}")}{FindingsView.Of(log.Findings)}");
    }

    public static Markup Of(InstrumentReview review) => Markup.Of($"""
        {ReviewWords.Of(review).Select(answer => Markup.Of($"<p><b>{answer.Question}</b> <b>{answer.Short}</b> {string.Join(' ', answer.Lines)}</p>\n"))}
        <ul>{ReviewTasks.Of(review).Select(task => Markup.Of($"<li><b>{task.Who}</b> {task.What}</li>"))}</ul>
        {(review.Course.Checks.Count == 0 ? Markup.None : ChartMarkup.Of(review.Chart.Chart()))}
        {TableMarkup.Of(HemoRheo.Table.Of("sample", "loading", "started at", "status", "reason").WithRows(review.InDoubt, doubt => [doubt.Sample, doubt.Loading, doubt.At, Words.Of(doubt.Status), doubt.Reason]), $"Samples in doubt: {review.InDoubt.Count} of {review.Samples}")}
        """);
}
