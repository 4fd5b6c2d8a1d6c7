using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>A constant viscosity: stress = viscosity x rate.</summary>
/// <param name="Viscosity">Dynamic viscosity.</param>
/// <remarks>Source: Newton 1687, Principia, book 2, section 9. For calibration fluids, water and plasma; whole blood only well above 100 1/s.</remarks>
public sealed record Newtonian(Viscosity Viscosity)
{
    internal static FlowLaw<Newtonian> Law { get; } = new FormulaLaw<Formula, Newtonian>(
        "Newtonian",
        new("Newton", 1687, "Philosophiae Naturalis Principia Mathematica, book 2, section 9"),
        [new("viscosity", "η", "Pa.s")],
        new(0.01, 10000));

    /// <inheritdoc/>
    public override string ToString() => $"viscosity {Viscosity}";

    private readonly struct Formula : ILawFormula<Newtonian>
    {
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
        {
            double sum = 0;
            for (var i = 0; i < perSecond.Length; i++) sum += pascals[i] / perSecond[i];
            guess[0] = sum / perSecond.Length;
        }

        public static Newtonian Values(IReadOnlyList<double> estimates) => new(Viscosity.FromPascalSeconds(estimates[0]));

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * rate;
    }
}
