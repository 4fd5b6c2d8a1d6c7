namespace HemoRheo;

/// <summary>A user's own law as a lambda.</summary>
internal sealed record LambdaLaw(string Name, LawFunction Function, Items<LawParameter> Parameters) : UserLaw(Name, Parameters)
{
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
