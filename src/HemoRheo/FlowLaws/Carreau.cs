using System.Globalization;
using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The numbers of Carreau's law: viscosity = high-shear viscosity + (low-shear viscosity - high-shear viscosity) x (1 + (time constant x rate)^2)^((n - 1) / 2).</summary>
/// <param name="LowShearViscosity">The viscosity approached at low rates.</param>
/// <param name="HighShearViscosity">The viscosity approached at high rates.</param>
/// <param name="TimeConstantSeconds">Time constant: thinning starts near its inverse.</param>
/// <param name="FlowIndex">Flow index n of the part between the two viscosities; below 1, and for a steep curve also below zero.</param>
/// <remarks>Source: Carreau 1972, Transactions of the Society of Rheology 16:99-127. For whole blood from about 0.1 to 1000 1/s. Where the two viscosities are equal, time constant and flow index mean nothing.</remarks>
public sealed record Carreau(Viscosity LowShearViscosity, Viscosity HighShearViscosity, double TimeConstantSeconds, double FlowIndex)
{
    internal static FlowLaw<Carreau> Law { get; } = new FormulaLaw<Formula, Carreau>(
        "Carreau",
        new("Carreau", 1972, "Transactions of the Society of Rheology 16:99-127"),
        [new("low-shear viscosity", "η_0", "Pa.s"), new("high-shear viscosity", "η_∞", "Pa.s"), new("time constant", "λ", "s"), new("flow index", "n", "1", double.NegativeInfinity)],
        new(0.1, 1000),
        new(1, "the same law without a high-shear viscosity", Wall: 1e-10, Inside: 1e-4, OfLowestStress: true));

    /// <inheritdoc/>
    public override string ToString() => string.Create(
        CultureInfo.InvariantCulture,
        $"low-shear viscosity {LowShearViscosity}, high-shear viscosity {HighShearViscosity}, time constant {TimeConstantSeconds:G4} s, flow index {FlowIndex:G4}");

    private readonly struct Formula : ILawFormula<Carreau>
    {
        /// <summary>Cross's law with n = 1 - m falls alike at high rates.</summary>
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
        {
            Cross.Guess(perSecond, pascals, guess);
            guess[3] = 1 - guess[3];
        }

        public static Carreau Values(IReadOnlyList<double> estimates) =>
            new(Viscosity.FromPascalSeconds(estimates[0]), Viscosity.FromPascalSeconds(estimates[1]), estimates[2], estimates[3]);

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> =>
            rate * (p[1] + (p[0] - p[1]) * T.Pow(1 + T.Square(p[2] * rate), (p[3] - 1) * 0.5));
    }
}
