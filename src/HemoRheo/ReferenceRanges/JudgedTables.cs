namespace HemoRheo;

/// <summary>Verdicts as tables.</summary>
public static class JudgedTables
{
    /// <summary>One row a value that was judged: what it is, the hematocrit it speaks of, its 95 % interval and the outcome.</summary>
    /// <param name="sample">The sample.</param>
    public static Table ToTable(this JudgedSample sample)
    {
        var table = Table.Of("measurand", "basis", "value", "interval", "unit", "outcome");
        foreach (var judged in sample.Values)
        {
            if (judged.Verdict is not { } verdict) continue;
            var value = judged.Value;
            var interval = value.Interval();
            table = table.With(
                value.Measurand.Name,
                value.Basis.Words(),
                Cell.Rounded(value.Shown, Math.Abs(interval.Upper - interval.Lower) / 4),
                Rounding.Interval(interval.Lower, interval.Upper),
                value.Measurand.Shown.Symbol,
                judged.Marked ? $"{verdict.Outcome.Words()} (marked)" : verdict.Outcome.Words());
        }

        return table;
    }
}
