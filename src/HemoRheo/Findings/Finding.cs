namespace HemoRheo;

/// <summary>A data-quality finding: a value that travels with what it concerns, never an exception and never a silent repair.</summary>
/// <param name="Kind">What findings of this code mean, and what to do.</param>
/// <param name="Message">One sentence about this case, with numbers and units.</param>
/// <param name="Where">The place.</param>
/// <param name="Observed">What was observed, in the unit the message names; null where no number applies.</param>
/// <param name="Limit">The limit, in the same unit; null where no number applies.</param>
public sealed record Finding(FindingKind Kind, string Message, Where Where, double? Observed = null, double? Limit = null)
{
    /// <summary>The stable code.</summary>
    public string Code => Kind.Code;

    /// <summary>How much it matters.</summary>
    public Severity Severity => Kind.Severity;

    /// <inheritdoc/>
    public override string ToString() => $"{Code}: {Message} ({Where})";
}
