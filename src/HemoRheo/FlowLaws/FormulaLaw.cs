using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>A law made of a formula: the loops live here, so that they are compiled anew for each formula.</summary>
internal sealed record FormulaLaw<F, TValues>(string Name, Citation Source, Items<LawParameter> Parameters, Interval ValidRates, LawBoundary? Limit = null)
    : FlowLaw<TValues>(Name, Source, Parameters, ValidRates)
    where F : struct, ILawFormula<TValues>
{
    internal override LawBoundary? Boundary => Limit;

    internal override TValues Values(IReadOnlyList<double> estimates) => F.Values(estimates);

    internal override void FirstGuess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess) => F.Guess(perSecond, pascals, guess);

    internal override Lane StressOf(Lane rate, ReadOnlySpan<Lane> natural) => default(F).Stress(rate, natural);

    internal override void StressesAndSlopes(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> scaled, Span<Lane> stresses, Span<Lane> slopes)
    {
        var count = scaled.Length;
        Span<LaneDual> seeds = stackalloc LaneDual[LaneDual.Slopes];
        for (var k = 0; k < count; k++)
        {
            var natural = Parameters[k].ToNatural(scaled[k]);
            seeds[k] = LaneDual.Seed(natural, k, Parameters[k].SlopeOf(natural));
        }

        ReadOnlySpan<LaneDual> p = seeds[..count];
        for (var i = 0; i < rates.Length; i++)
        {
            var stress = default(F).Stress(new LaneDual(rates[i]), p);
            stresses[i] = stress.Value;
            Store(stress, slopes, i, rates.Length, count);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void Store(in LaneDual stress, Span<Lane> slopes, int i, int stride, int count)
    {
        slopes[i] = stress.S0;
        if (count > 1) slopes[stride + i] = stress.S1;
        if (count > 2) slopes[2 * stride + i] = stress.S2;
        if (count > 3) slopes[3 * stride + i] = stress.S3;
        if (count > 4) slopes[4 * stride + i] = stress.S4;
    }
}
