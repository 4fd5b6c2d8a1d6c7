namespace HemoRheo;

/// <summary>A value held against a reference range.</summary>
public static class ValueJudging
{
    /// <summary>Judges a value against a range, with the contributions both share taken out first.</summary>
    /// <param name="value">The value.</param>
    /// <param name="range">The range.</param>
    /// <param name="level">Probability that decides, above 0.5 and below 1.</param>
    /// <param name="marked">Whether the value is to be marked because the instrument was not in order.</param>
    /// <returns>
    /// The value with its verdict; without one, and with the reason, where it may not be decided on
    /// or the range answers another question (another measurand, law or hematocrit basis).
    /// </returns>
    public static JudgedValue JudgedBy(this SampleValue value, ReferenceRange range, double level = 0.95, bool marked = false)
    {
        if (WhyAnother(value, range) is { } another) return new(value, null, null, another, false, marked);
        if (WhyUndecidable(value) is { } reason) return new(value, range, null, reason, false, marked);
        var own = Value.Combine([(1, value.Value), (-1, new Value(0, range.Shared))]);
        var verdict = Verdict.Of(own, range.Limits, level);
        return new(value, range, verdict, null, Corners(range).Any(limits => limits.Lower > limits.Upper || Verdict.Of(own, limits, level).Outcome != verdict.Outcome), marked);
    }

    internal static string? WhyUndecidable(SampleValue value)
    {
        if (!double.IsFinite(value.Value.X) || !double.IsFinite(value.Value.StandardUncertainty)) return "The value or its uncertainty is not a finite number.";
        return value.Decidable ? null : value.Findings.MaxBy(finding => finding.Severity)?.Message ?? "The value may not be decided on.";
    }

    private static string? WhyAnother(SampleValue value, ReferenceRange range)
    {
        if (range.Measurand != value.Measurand) return $"The range is of {range.Measurand.Name}, the value of {value.Measurand.Name}.";
        if (range.Law is not null && range.Law != value.Law) return $"The range rests on values by {range.Law}, this value is by {value.Law}.";
        return range.Basis == value.Basis ? null : $"The range speaks of values at {range.Basis.Words()}, this value is at {value.Basis.Words()}.";
    }

    private static IEnumerable<Interval> Corners(ReferenceRange range) =>
        range is { LowerLimit: { } lower, UpperLimit: { } upper }
            ? [new(lower.Lower, upper.Lower), new(lower.Lower, upper.Upper), new(lower.Upper, upper.Lower), new(lower.Upper, upper.Upper)]
            : [];
}
