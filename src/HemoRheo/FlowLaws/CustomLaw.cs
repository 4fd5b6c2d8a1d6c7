namespace HemoRheo;

/// <summary>A user's own law.</summary>
internal sealed record CustomLaw(string Name, LawFunction Function, Items<LawParameter> Parameters)
    : FlowLaw<NamedValues>(Name, new("the user", 0, "a law of the user's own"), Parameters, new(0, double.PositiveInfinity))
{
    internal override LawBoundary? Boundary => null;

    internal override NamedValues Values(IReadOnlyList<double> estimates) => new(Parameters, estimates.ToItems());

    internal override void FirstGuess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
    {
        for (var k = 0; k < guess.Length; k++) guess[k] = Parameters[k].Start!.Value;
    }

    internal override Lane StressOf(Lane rate, ReadOnlySpan<Lane> natural)
    {
        Span<LaneDual> p = stackalloc LaneDual[LaneDual.Slopes];
        for (var k = 0; k < natural.Length; k++) p[k] = new(natural[k]);
        return Function(new(rate), p[..natural.Length]).Value;
    }

    internal override void StressesAndSlopes(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> scaled, Span<Lane> stresses, Span<Lane> slopes)
    {
        Span<LaneDual> p = stackalloc LaneDual[LaneDual.Slopes];
        for (var k = 0; k < scaled.Length; k++)
        {
            var natural = Parameters[k].ToNatural(scaled[k]);
            p[k] = LaneDual.Seed(natural, k, Parameters[k].SlopeOf(natural));
        }

        for (var i = 0; i < rates.Length; i++)
        {
            var stress = Function(new(rates[i]), p[..scaled.Length]);
            stresses[i] = stress.Value;
            for (var k = 0; k < scaled.Length; k++) slopes[k * rates.Length + i] = stress.Slope(k);
        }
    }
}
