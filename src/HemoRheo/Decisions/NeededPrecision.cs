namespace HemoRheo;

/// <summary>What a verdict would take.</summary>
public static class NeededPrecision
{
    /// <summary>
    /// The factor to which chosen contributions must shrink for the verdict on a value, at its present estimate, to be decided.
    /// </summary>
    /// <param name="value">The value.</param>
    /// <param name="limits">Limits on its working scale.</param>
    /// <param name="level">Probability that decides.</param>
    /// <param name="chosen">Which contributions shrink. Degrees of freedom are left as they are.</param>
    /// <returns>1 where it is decided as it is; between 0 and 1 where shrinking helps; null where even without these contributions it is not decided.</returns>
    public static double? Factor(Value value, Interval limits, double level, Func<Source, bool> chosen)
    {
        bool Decides(double factor) => Verdict.Of(Shrunk(value, factor, chosen), limits, level).Outcome != Outcome.Undecided;
        if (Decides(1)) return 1;
        if (!Decides(0)) return null;
        double decided = 0, undecided = 1;
        for (var step = 0; step < 50; step++)
        {
            var middle = (decided + undecided) / 2;
            if (Decides(middle)) decided = middle;
            else undecided = middle;
        }

        return decided;
    }

    private static Value Shrunk(Value value, double factor, Func<Source, bool> chosen) =>
        value with { Parts = value.Parts.Select(part => chosen(part.Source) ? part.Times(factor) : part).ToItems() };
}
