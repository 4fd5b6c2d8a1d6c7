using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The numbers of Quemada's law that a curve can tell: viscosity = high-shear viscosity x [(1 + s) / (r + s)]^2 with s = sqrt(rate / critical rate).</summary>
/// <param name="HighShearViscosity">The viscosity approached at high rates.</param>
/// <param name="CriticalRate">Rate at which aggregates are half gone.</param>
/// <param name="Ratio">r between 0 and 1: square root of high-shear over low-shear viscosity. At r = 0 the law is Casson's.</param>
/// <remarks>Source: Quemada 1978, Rheologica Acta 17:632-642; there r = (1 - H k0 / 2) / (1 - H kinf / 2), H the hematocrit. For whole blood from about 0.1 to 1000 1/s.</remarks>
public sealed record Quemada(Viscosity HighShearViscosity, ShearRate CriticalRate, double Ratio)
{
    internal static FlowLaw<Quemada> Law { get; } = new FormulaLaw<Formula, Quemada>(
        "Quemada",
        new("Quemada", 1978, "Rheologica Acta 17:632-642"),
        [new("high-shear viscosity", "η_∞", "Pa.s"), new("critical rate", "γ_c", "1/s"), new("ratio", "r", "1", 0, 1)],
        new(0.1, 1000),
        new(2, "Casson", Wall: 1e-4, Inside: 0.05, OfLowestStress: false),
        Formula.ByHand);

    /// <inheritdoc/>
    public override string ToString() => string.Create(
        System.Globalization.CultureInfo.InvariantCulture,
        $"high-shear viscosity {HighShearViscosity}, critical rate {CriticalRate}, ratio {Ratio:G4}");

    /// <summary>With z the root of fluidity and g the root of rate, z = B + A q g - q z g is linear in B, A q and q: A the root of high-shear fluidity, q the inverse root of critical rate, B = A r.</summary>
    private static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
    {
        double n = 0, sg = 0, sh = 0, sz = 0, gg = 0, gh = 0, hh = 0, gz = 0, hz = 0;
        for (var i = 0; i < perSecond.Length; i++)
        {
            var g = Math.Sqrt(perSecond[i]);
            var z = Math.Sqrt(perSecond[i] / pascals[i]);
            var h = z * g;
            var weight = 1 / (z * z * (1 + g) * (1 + g));
            n += weight;
            sg += weight * g;
            sh += weight * h;
            sz += weight * z;
            gg += weight * g * g;
            gh += weight * g * h;
            hh += weight * h * h;
            gz += weight * g * z;
            hz += weight * h * z;
        }

        var (cgg, cgh, chh) = (gg - sg * sg / n, gh - sg * sh / n, hh - sh * sh / n);
        var (cgz, chz) = (gz - sg * sz / n, hz - sh * sz / n);
        var determinant = cgg * chh - cgh * cgh;
        var aq = (cgz * chh - chz * cgh) / determinant;
        var q = -(cgg * chz - cgh * cgz) / determinant;
        var b = (sz - aq * sg + q * sh) / n;
        var r = b * q / aq;
        if (q > 0 && aq > 0 && r < 0.95 && double.IsFinite(aq * q * b))
        {
            guess[0] = q / aq * (q / aq);
            guess[1] = 1 / (q * q);
            guess[2] = Math.Max(r, 0.02);
            return;
        }

        HemoRheo.Casson.Guess(perSecond, pascals, guess);
        var (yieldStress, viscosity) = (guess[0], guess[1]);
        guess[0] = viscosity;
        guess[1] = yieldStress / viscosity;
        guess[2] = 0.05;
    }

    private readonly struct Formula : ILawFormula<Quemada>
    {
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess) => HemoRheo.Quemada.Guess(perSecond, pascals, guess);

        public static Quemada Values(IReadOnlyList<double> estimates) =>
            new(Viscosity.FromPascalSeconds(estimates[0]), ShearRate.FromReciprocalSeconds(estimates[1]), estimates[2]);

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T>
        {
            var s = T.Sqrt(rate * (1 / p[1]));
            return rate * p[0] * T.Square((1 + s) * (1 / (p[2] + s)));
        }

        /// <summary>With u = 1 / (r + s) and w = rate x viscosity x (1 + s) u^2 the stress is (1 + s) w, its slope with respect to log critical rate (1 - r) s u w, and with respect to logit r -2 r (1 - r) u (1 + s) w.</summary>
        public static void ByHand(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> natural, Span<Lane> stresses, Span<Lane> slopes)
        {
            var (viscosity, r) = (natural[0], natural[2]);
            var inverse = 1 / natural[1];
            var (rest, twice) = (1 - r, -2 * r * (1 - r));
            var bySecond = slopes.Slice(rates.Length, rates.Length);
            var byThird = slopes.Slice(2 * rates.Length, rates.Length);
            for (var i = 0; i < rates.Length; i++)
            {
                var s = Lane.Sqrt(rates[i] * inverse);
                var u = 1 / (r + s);
                var ratio = (1 + s) * u;
                var stress = rates[i] * viscosity * Lane.Square(ratio);
                stresses[i] = stress;
                slopes[i] = stress;
                bySecond[i] = rates[i] * viscosity * ratio * (rest * s * u * u);
                byThird[i] = twice * u * stress;
            }
        }
    }
}
