namespace HemoRheo;

/// <summary>Consecutive checks that none failed and no adjustment parts.</summary>
/// <param name="Checks">The checks, at least one.</param>
/// <param name="Until">The failed check or adjustment that ended it; null while it lasts.</param>
internal sealed record CheckSpan(Items<InstrumentCheck> Checks, DateTimeOffset? Until)
{
    /// <summary>The spans of an instrument's checks, which are in order of time.</summary>
    internal static Items<CheckSpan> Of(Instrument instrument, IEnumerable<InstrumentCheck> checks)
    {
        var spans = new List<CheckSpan>();
        var open = new List<InstrumentCheck>();
        foreach (var check in checks)
        {
            if (open.Count > 0 && instrument.AdjustedAfter(open[^1].At) is { } adjusted && adjusted <= check.At) Close(adjusted);
            if (check.Outcome == CheckOutcome.Fails) Close(check.At);
            else open.Add(check);
        }

        if (open.Count > 0) Close(instrument.AdjustedAfter(open[^1].At));
        return spans.ToItems();

        void Close(DateTimeOffset? until)
        {
            if (open.Count > 0) spans.Add(new(open.ToItems(), until));
            open.Clear();
        }
    }
}
