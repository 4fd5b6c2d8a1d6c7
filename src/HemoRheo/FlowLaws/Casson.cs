using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The numbers of Casson's law: stress = (sqrt(yield stress) + sqrt(Casson viscosity x rate))^2.</summary>
/// <param name="YieldStress">Yield stress: an extrapolation to a rate of zero, not a measured stress.</param>
/// <param name="CassonViscosity">Casson viscosity: the viscosity that the law approaches at high rates.</param>
/// <remarks>Source: Casson 1959, in Mill (ed.), Rheology of Disperse Systems, 84-104. For whole blood from about 0.1 to 1000 1/s.</remarks>
public sealed record Casson(ShearStress YieldStress, Viscosity CassonViscosity)
{
    internal static FlowLaw<Casson> Law { get; } = new FormulaLaw<Formula, Casson>(
        "Casson",
        new("Casson", 1959, "in Mill (ed.), Rheology of Disperse Systems, Pergamon, 84-104"),
        [new("yield stress", "τ_y", "Pa"), new("Casson viscosity", "η_C", "Pa.s")],
        new(0.1, 1000),
        new(0, "Newtonian", Wall: 1e-8, Inside: 1e-2, OfLowestStress: true),
        Formula.ByHand);

    /// <inheritdoc/>
    public override string ToString() => $"yield stress {YieldStress}, Casson viscosity {CassonViscosity}";

    /// <summary>Square root of stress against square root of rate is a straight line.</summary>
    internal static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
    {
        double w = 0, x = 0, y = 0, xx = 0, xy = 0, lowest = double.PositiveInfinity;
        for (var i = 0; i < perSecond.Length; i++)
        {
            var weight = 1 / pascals[i];
            var (a, b) = (Math.Sqrt(perSecond[i]), Math.Sqrt(pascals[i]));
            w += weight;
            x += weight * a;
            y += weight * b;
            xx += weight * a * a;
            xy += weight * a * b;
            lowest = Math.Min(lowest, pascals[i]);
        }

        var slope = (w * xy - x * y) / (w * xx - x * x);
        var intercept = (y - slope * x) / w;
        var least = 0.1 * Math.Sqrt(lowest);
        if (!(slope > 0) || !(intercept > least))
        {
            intercept = least;
            slope = Math.Max((y - intercept * w) / x, 0.1 * y / x);
        }

        guess[0] = intercept * intercept;
        guess[1] = slope * slope;
    }

    private readonly struct Formula : ILawFormula<Casson>
    {
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess) => HemoRheo.Casson.Guess(perSecond, pascals, guess);

        public static Casson Values(IReadOnlyList<double> estimates) => new(ShearStress.FromPascals(estimates[0]), Viscosity.FromPascalSeconds(estimates[1]));

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => T.Square(T.Sqrt(p[0]) + T.Sqrt(p[1] * rate));

        /// <summary>With the two roots a and b the stress is (a + b)^2, and its slopes with respect to the logarithms are a (a + b) and b (a + b).</summary>
        public static void ByHand(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> natural, Span<Lane> stresses, Span<Lane> slopes)
        {
            var (a, viscosity) = (Lane.Sqrt(natural[0]), natural[1]);
            var bySecond = slopes.Slice(rates.Length, rates.Length);
            for (var i = 0; i < rates.Length; i++)
            {
                var b = Lane.Sqrt(viscosity * rates[i]);
                var sum = a + b;
                stresses[i] = Lane.Square(sum);
                slopes[i] = a * sum;
                bySecond[i] = b * sum;
            }
        }
    }
}
