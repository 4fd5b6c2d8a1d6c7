namespace HemoRheo;

/// <summary>A built-in law, made of a formula.</summary>
internal sealed record FormulaLaw<F, TValues>(string Name, Citation Source, Items<LawParameter> Parameters, Interval ValidRates, LawBoundary? Limit = null, HandSlopes? ByHand = null)
    : FlowLaw<TValues>(Name, Source, Parameters, ValidRates)
    where F : struct, ILawFormula<TValues>
{
    internal override LawBoundary? Boundary => Limit;

    internal override TValues Values(IReadOnlyList<double> estimates) => F.Values(estimates);

    internal override void FirstGuess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess) => F.Guess(perSecond, pascals, guess);

    internal override Lane StressOf(Lane rate, ReadOnlySpan<Lane> natural) => default(F).Stress(rate, natural);

    internal override void StressesAndSlopes(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> scaled, Span<Lane> stresses, Span<Lane> slopes)
    {
        if (ByHand is null)
        {
            ByFormula(rates, scaled, stresses, slopes);
            return;
        }

        Span<Lane> natural = stackalloc Lane[LaneDual.Slopes];
        for (var k = 0; k < scaled.Length; k++) natural[k] = Parameters[k].ToNatural(scaled[k]);
        ByHand(rates, natural[..scaled.Length], stresses, slopes);
    }

    /// <summary>The same with exact slopes from the formula, also where there are slopes by hand.</summary>
    internal override void ByFormula(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> scaled, Span<Lane> stresses, Span<Lane> slopes) =>
        FormulaLoops.Run(default(F), Parameters, rates, scaled, stresses, slopes);
}
