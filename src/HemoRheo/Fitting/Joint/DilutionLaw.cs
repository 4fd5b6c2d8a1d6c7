using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>
/// Quemada's law with hematocrit as a second predictor: stress = rate x plasma viscosity x (1 - k H/2)^-2 with k = (k0 + kinf s)/(1 + s), s = sqrt(rate / critical rate).
/// </summary>
/// <remarks>Source: Quemada 1978, Rheologica Acta 17:632-642.</remarks>
internal static class DilutionLaw
{
    public const string AtRest = "structure parameter at rest";

    private const string Name = "Quemada with hematocrit";

    /// <summary>A ratio r of Quemada's law of about 1e-4 at the highest hematocrit, as in his law of one curve.</summary>
    private const double WallShare = 5e-5;

    private const double InsideShare = 0.03;

    /// <summary>One law a hematocrit, with the same parameters: those of the cells stay below 2 / highest hematocrit, where blood would be solid.</summary>
    /// <param name="hematocrits">The hematocrits.</param>
    /// <param name="alone">Fits of Quemada's law to each curve, from which the parameters start.</param>
    public static FlowLaw[] Laws(IReadOnlyList<Hematocrit> hematocrits, IReadOnlyList<FittedLaw> alone)
    {
        var highest = 2 / hematocrits.Max(one => one.LiterPerLiter);
        var (rest, high, rate, plasma) = Starts(hematocrits, alone, highest);
        LawParameter[] parameters =
        [
            new(AtRest, "k_0", "1", 0, highest, rest),
            new("structure parameter at high shear", "k_∞", "1", 0, highest, high),
            new("critical rate", "γ_c", "1/s", Start: rate),
            new("plasma viscosity", "η_p", "Pa.s", Start: plasma),
        ];
        return [.. hematocrits.Select(one => FlowLaw.Custom(Name, new Formula(one.LiterPerLiter), parameters))];
    }

    /// <summary>The parameter at rest runs to its bound where the blood of the highest hematocrit has a yield stress.</summary>
    public static JointWall Wall(FlowLaw law)
    {
        var rest = law.Parameters[0];
        return new(rest.ToScaled(rest.Upper * (1 - WallShare)), double.PositiveInfinity, rest.ToScaled(rest.Upper * (1 - InsideShare)), "the law with a yield stress at the highest hematocrit");
    }

    /// <summary>The root of high-shear fluidity is a line in hematocrit, a (1 - kinf H/2) with a the root of plasma fluidity; the root of fluidity at rest, a (1 - k0 H/2), gives k0.</summary>
    private static (double AtRest, double AtHighShear, double Rate, double Plasma) Starts(IReadOnlyList<Hematocrit> hematocrits, IReadOnlyList<FittedLaw> alone, double highest)
    {
        int[] usable = [.. Enumerable.Range(0, alone.Count).Where(l => alone[l].Usable)];
        if (usable.Length < 2) return (0.9 * highest, 0.5 * highest, 3, 0.0012);
        double[] h = [.. usable.Select(l => hematocrits[l].LiterPerLiter)];
        double[] roots = [.. usable.Select(l => Math.Exp(-0.5 * alone[l].Scaled[0]))];
        var (meanH, meanRoot) = (h.Average(), roots.Average());
        var slope = h.Zip(roots, (x, y) => (x - meanH) * (y - meanRoot)).Sum() / h.Sum(x => (x - meanH) * (x - meanH));
        var rate = Math.Exp(usable.Average(l => alone[l].Scaled[1]));
        if (!(slope < 0)) return (0.9 * highest, 0.5 * highest, rate, 0.0012);
        var a = meanRoot - slope * meanH;
        var rest = usable.Select((l, j) => 2 * (1 - alone[l].Parameters[2].Estimate * roots[j] / a) / h[j]).Average();
        return (Inside(rest), Inside(-2 * slope / a), rate, 1 / (a * a));

        double Inside(double k) => Math.Clamp(k, 0.05 * highest, 0.98 * highest);
    }

    private readonly record struct Formula(double Hematocrit) : IFormula
    {
        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T>
        {
            var s = T.Sqrt(rate / p[2]);
            return rate * p[3] / T.Square(1 - 0.5 * Hematocrit * ((p[0] + p[1] * s) / (1 + s)));
        }
    }
}
