namespace HemoRheo.Notebooks;

/// <summary>An instrument's status over time, asked of its checks between the moments at which it can change.</summary>
internal static class StatusSpans
{
    /// <summary>Stretches of one status from the first check until the last check or the end of what it vouches for, in order of time.</summary>
    /// <param name="history">A history with at least one check.</param>
    public static Items<StatusSpan> Of(InstrumentHistory history) =>
        Of(history.Instrument, [.. history.Checks.Select(check => check.At)], moment => history.At(moment).Status);

    /// <summary>The same of the last checks of a course; none where it has no check.</summary>
    /// <param name="course">The course.</param>
    public static Items<StatusSpan> Of(InstrumentCourse course)
    {
        var recent = course with { Checks = course.Checks.TakeLast(ControlChartPicture.Most).ToItems() };
        return recent.Checks.Count == 0 ? [] : Of(course.Instrument, [.. recent.Checks.Select(check => check.At)], moment => recent.At(moment).Status);
    }

    private static Items<StatusSpan> Of(Instrument instrument, DateTimeOffset[] checks, Func<DateTimeOffset, InstrumentStatus> status)
    {
        var every = instrument.CheckEvery;
        var first = checks[0];
        var last = checks[^1] + every;
        var turns = checks.SelectMany(at => new[] { at, at + every }).Concat(instrument.Adjusted)
            .Where(moment => moment >= first && moment <= last).Distinct().Order().ToArray();
        var spans = new List<StatusSpan>();
        for (var i = 1; i < turns.Length; i++)
        {
            var now = status(turns[i - 1] + (turns[i] - turns[i - 1]) / 2);
            if (spans.Count > 0 && spans[^1].Status == now) spans[^1] = spans[^1] with { Until = turns[i] };
            else spans.Add(new(turns[i - 1], turns[i], now));
        }

        return spans.ToItems();
    }
}
