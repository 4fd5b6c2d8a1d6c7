namespace HemoRheo;

/// <summary>What findings of one code mean. A kind is written once, in the room that raises it.</summary>
/// <param name="Code">Stable code: lower-case words joined by hyphens, e.g. <c>torque-below-floor</c>.</param>
/// <param name="Severity">How much it matters.</param>
/// <param name="Meaning">What was found, in one sentence.</param>
/// <param name="UsualCause">What usually causes it in the lab.</param>
/// <param name="WhatToDo">What a person should do.</param>
/// <param name="Source">Where the rule or its limit comes from: author and year, or "common practice, no source".</param>
public sealed record FindingKind(string Code, Severity Severity, string Meaning, string UsualCause, string WhatToDo, string Source = "common practice, no source")
{
    /// <summary>A finding of this kind.</summary>
    /// <param name="where">The place.</param>
    /// <param name="message">One sentence with the numbers and units of this case.</param>
    /// <param name="observed">What was observed, in the unit the message names.</param>
    /// <param name="limit">The limit it was held against, in the same unit.</param>
    public Finding At(Where where, string message, double? observed = null, double? limit = null) => new(this, message, where, observed, limit);
}
