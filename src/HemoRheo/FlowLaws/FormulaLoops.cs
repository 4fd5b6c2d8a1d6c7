using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The loops over a formula, compiled anew for each one.</summary>
internal static class FormulaLoops
{
    /// <summary>Stresses and slopes with respect to the scaled parameters, one curve a lane: slope k of point i at k * rates.Length + i.</summary>
    public static void Run<F>(F formula, Items<LawParameter> parameters, ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> scaled, Span<Lane> stresses, Span<Lane> slopes) where F : struct, IFormula
    {
        Span<LaneDual> seeds = stackalloc LaneDual[LaneDual.Slopes];
        for (var k = 0; k < scaled.Length; k++)
        {
            var natural = parameters[k].ToNatural(scaled[k]);
            seeds[k] = LaneDual.Seed(natural, k, parameters[k].SlopeOf(natural));
        }

        ReadOnlySpan<LaneDual> p = seeds[..scaled.Length];
        for (var i = 0; i < rates.Length; i++)
        {
            var stress = formula.Stress(new LaneDual(rates[i]), p);
            stresses[i] = stress.Value;
            Store(stress, slopes, i, rates.Length, p.Length);
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
