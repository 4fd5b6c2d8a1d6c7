namespace HemoRheo;

/// <summary>Fits of one law to many curves, each with an error model of its own.</summary>
internal static class FitsByErrors
{
    /// <summary>One fit a curve, in the order of the curves; curves with equal error models are fitted together.</summary>
    /// <param name="curves">The curves.</param>
    /// <param name="law">The law.</param>
    /// <param name="errors">One error model a curve.</param>
    public static FittedLaw[] OfAll(IReadOnlyList<FlowCurve> curves, FlowLaw law, IReadOnlyList<ErrorModel> errors)
    {
        var fits = new FittedLaw[curves.Count];
        foreach (var same in Enumerable.Range(0, curves.Count).GroupBy(i => errors[i]))
        {
            int[] members = [.. same];
            var fitted = Fits.OfAll([.. members.Select(i => curves[i])], law, same.Key);
            for (var k = 0; k < members.Length; k++) fits[members[k]] = fitted[k];
        }

        return fits;
    }
}
