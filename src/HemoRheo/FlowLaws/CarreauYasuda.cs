using System.Globalization;
using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The numbers of the law of Carreau and Yasuda: viscosity = high-shear viscosity + (low-shear viscosity - high-shear viscosity) x (1 + (time constant x rate)^a)^((n - 1) / a).</summary>
/// <param name="LowShearViscosity">The viscosity approached at low rates.</param>
/// <param name="HighShearViscosity">The viscosity approached at high rates.</param>
/// <param name="TimeConstantSeconds">Time constant: thinning starts near its inverse.</param>
/// <param name="Transition">a, above zero: how sharply the low-shear viscosity is left. At 2 the law is Carreau's, at 1 - n Cross's.</param>
/// <param name="FlowIndex">Flow index n of the part between the two viscosities; below 1, and for a steep curve also below zero.</param>
/// <remarks>Source: Yasuda, Armstrong and Cohen 1981, Rheologica Acta 20:163-178. For whole blood from about 0.1 to 1000 1/s. Few curves of blood can tell all five numbers apart.</remarks>
public sealed record CarreauYasuda(Viscosity LowShearViscosity, Viscosity HighShearViscosity, double TimeConstantSeconds, double Transition, double FlowIndex)
{
    internal static FlowLaw<CarreauYasuda> Law { get; } = new FormulaLaw<Formula, CarreauYasuda>(
        "Carreau-Yasuda",
        new("Yasuda, Armstrong and Cohen", 1981, "Rheologica Acta 20:163-178"),
        [
            new("low-shear viscosity", "η_0", "Pa.s"), new("high-shear viscosity", "η_∞", "Pa.s"), new("time constant", "λ", "s"),
            new("transition", "a", "1"), new("flow index", "n", "1", double.NegativeInfinity),
        ],
        new(0.1, 1000),
        new(1, "the same law without a high-shear viscosity", Wall: 1e-10, Inside: 1e-4, OfLowestStress: true));

    /// <inheritdoc/>
    public override string ToString() => string.Create(
        CultureInfo.InvariantCulture,
        $"low-shear viscosity {LowShearViscosity}, high-shear viscosity {HighShearViscosity}, time constant {TimeConstantSeconds:G4} s, transition {Transition:G4}, flow index {FlowIndex:G4}");

    private readonly struct Formula : ILawFormula<CarreauYasuda>
    {
        /// <summary>Cross's law is this one with a = m and n = 1 - m.</summary>
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
        {
            Cross.Guess(perSecond, pascals, guess);
            guess[4] = 1 - guess[3];
        }

        public static CarreauYasuda Values(IReadOnlyList<double> estimates) =>
            new(Viscosity.FromPascalSeconds(estimates[0]), Viscosity.FromPascalSeconds(estimates[1]), estimates[2], estimates[3], estimates[4]);

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            rate * (p[1] + (p[0] - p[1]) * T.Pow(1 + T.Pow(p[2] * rate, p[3]), (p[4] - 1) / p[3]));
    }
}
