using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The numbers of Bingham's law: stress = yield stress + plastic viscosity x rate, while it flows.</summary>
/// <param name="YieldStress">Yield stress: where the straight line of the measured rates meets a rate of zero. Blood bends below that line.</param>
/// <param name="PlasticViscosity">Plastic viscosity: the slope of the line.</param>
/// <remarks>Source: Bingham 1916, Bulletin of the Bureau of Standards 13:309-353. For whole blood from about 50 to 1000 1/s, where its curve is nearly straight.</remarks>
public sealed record Bingham(ShearStress YieldStress, Viscosity PlasticViscosity)
{
    internal static FlowLaw<Bingham> Law { get; } = new FormulaLaw<Formula, Bingham>(
        "Bingham",
        new("Bingham", 1916, "Bulletin of the Bureau of Standards 13:309-353"),
        [new("yield stress", "τ_y", "Pa"), new("plastic viscosity", "η_p", "Pa.s")],
        new(50, 1000),
        new(0, "Newtonian", Wall: 1e-8, Inside: 1e-2, OfLowestStress: true));

    /// <inheritdoc/>
    public override string ToString() => $"yield stress {YieldStress}, plastic viscosity {PlasticViscosity}";

    private readonly struct Formula : ILawFormula<Bingham>
    {
        /// <summary>The line through the readings, weighted by relative errors.</summary>
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
        {
            double w = 0, x = 0, y = 0, xx = 0, xy = 0, lowest = double.PositiveInfinity;
            for (var i = 0; i < perSecond.Length; i++)
            {
                var weight = 1 / pascals[i] / pascals[i];
                w += weight;
                x += weight * perSecond[i];
                y += weight * pascals[i];
                xx += weight * perSecond[i] * perSecond[i];
                xy += weight * perSecond[i] * pascals[i];
                lowest = Math.Min(lowest, pascals[i]);
            }

            var slope = (w * xy - x * y) / (w * xx - x * x);
            var intercept = (y - slope * x) / w;
            var least = 0.01 * lowest;
            if (!(slope > 0) || !(intercept > least))
            {
                intercept = least;
                slope = Math.Max((y - intercept * w) / x, 0.1 * y / x);
            }

            guess[0] = intercept;
            guess[1] = slope;
        }

        public static Bingham Values(IReadOnlyList<double> estimates) => new(ShearStress.FromPascals(estimates[0]), Viscosity.FromPascalSeconds(estimates[1]));

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] + p[1] * rate;
    }
}
