namespace HemoRheo.Notebooks;

/// <summary>An instrument's status over time, asked of its history between the moments at which it can change.</summary>
internal static class StatusSpans
{
    /// <summary>Stretches of one status from the first check until the last check or the end of what it vouches for, in order of time.</summary>
    /// <param name="history">A history with at least one check.</param>
    public static Items<StatusSpan> Of(InstrumentHistory history)
    {
        var every = history.Instrument.CheckEvery;
        var first = history.Checks[0].At;
        var last = history.Checks[^1].At + every;
        var turns = history.Checks.SelectMany(check => new[] { check.At, check.At + every }).Concat(history.Instrument.Adjusted)
            .Where(moment => moment >= first && moment <= last).Distinct().Order().ToArray();
        var spans = new List<StatusSpan>();
        for (var i = 1; i < turns.Length; i++)
        {
            var status = history.At(turns[i - 1] + (turns[i] - turns[i - 1]) / 2).Status;
            if (spans.Count > 0 && spans[^1].Status == status) spans[^1] = spans[^1] with { Until = turns[i] };
            else spans.Add(new(turns[i - 1], turns[i], status));
        }

        return spans.ToItems();
    }
}
