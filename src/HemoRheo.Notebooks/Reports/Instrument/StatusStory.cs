namespace HemoRheo.Notebooks;

/// <summary>The state of an instrument in words.</summary>
internal static class StatusStory
{
    /// <summary>Whether it is right, by its last check.</summary>
    public static Markup Now(InstrumentHistory history)
    {
        if (history.Checks.Count == 0) return Markup.Of($"<p><b>Unknown.</b> It was never checked.</p>");
        var last = history.Checks[^1];
        var error = $"{Figures.Signed(100 * (Math.Exp(last.Error.X) - 1))} %";
        var limit = $"±{Figures.Fixed(100 * history.Instrument.CheckLimit, 1)} %";
        return last.Outcome switch
        {
            CheckOutcome.Passes => Markup.Of($"<p><b>Yes, at its last check</b> on <span class=\"w\">{Figures.Date(last.At)}</span>: error {error}, within {limit} with a probability of {Figures.Probability(last.ProbabilityWithin)}.</p>"),
            CheckOutcome.Fails => Markup.Of($"<p><b>No.</b> Its last check, on <span class=\"w\">{Figures.Date(last.At)}</span>, failed: error {error}, beyond {limit}.</p>"),
            _ => Markup.Of($"<p><b>Cannot tell.</b> Its last check, on <span class=\"w\">{Figures.Date(last.At)}</span>, showed {error}; the probability of lying within {limit} is {Figures.Probability(last.ProbabilityWithin)}.</p>"),
        };
    }

    /// <summary>The stretches of time in which it was not in order.</summary>
    public static Markup Troubles(InstrumentHistory history)
    {
        if (history.Checks.Count == 0) return Markup.Of($"<p>Unknown at all times.</p>");
        var troubles = StatusSpans.Of(history).Where(span => span.Status != InstrumentStatus.InOrder).ToArray();
        return troubles.Length == 0
            ? Markup.Of($"<p>It was in order from its first check, on {Figures.Date(history.Checks[0].At)}, on.</p>")
            : Markup.Of($"{troubles.Select(span => Markup.Of($"<p><b>{Words.Of(span.Status)}</b> from <span class=\"w\">{Figures.Date(span.From)}</span> to <span class=\"w\">{Figures.Date(span.Until)}</span></p>"))}");
    }
}
