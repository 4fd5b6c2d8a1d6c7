namespace HemoRheo;

/// <summary>The instrument was adjusted or repaired: what its checks said before holds no longer, and its control chart starts anew.</summary>
/// <param name="At">When, with offset.</param>
/// <param name="What">What was done.</param>
public sealed record LoggedAdjustment(DateTimeOffset At, string What) : LoggedEvent
{
    internal override string Kind => "adjustment";

    internal override DateTimeOffset? Happened => At;

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"adjusted on {At:yyyy-MM-dd}: {What}");
}
