using System.Globalization;
using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The numbers of the Ostwald-de Waele power law: stress = consistency x rate^flow index.</summary>
/// <param name="Consistency">Consistency, Pa.s^n: its unit depends on the flow index. Its number is that of the stress in Pa at 1 1/s.</param>
/// <param name="FlowIndex">Flow index n: below 1 shear-thinning, 1 Newtonian, above 1 shear-thickening.</param>
/// <remarks>Source: Ostwald 1925, Kolloid-Zeitschrift 36:99-117. It has no plateau: for whole blood in a middle range only, from about 23 to 230 1/s.</remarks>
public sealed record PowerLaw(double Consistency, double FlowIndex)
{
    internal static FlowLaw<PowerLaw> Law { get; } = new FormulaLaw<Formula, PowerLaw>(
        "Power law",
        new("Ostwald", 1925, "Kolloid-Zeitschrift 36:99-117; de Waele 1923"),
        [new("consistency", "K", "Pa.s^n"), new("flow index", "n", "1")],
        new(23, 230));

    /// <inheritdoc/>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"consistency {Consistency:G4} Pa.s^n, flow index {FlowIndex:G4}");

    /// <summary>Log stress above a yield stress against log rate is a straight line.</summary>
    internal static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, double yieldStress, Span<double> guess)
    {
        double x = 0, y = 0, xx = 0, xy = 0;
        for (var i = 0; i < perSecond.Length; i++)
        {
            var (a, b) = (Math.Log(perSecond[i]), Math.Log(pascals[i] - yieldStress));
            x += a;
            y += b;
            xx += a * a;
            xy += a * b;
        }

        double n = perSecond.Length;
        var slope = (n * xy - x * y) / (n * xx - x * x);
        guess[1] = slope > 0.02 ? slope : 0.02;
        guess[0] = Math.Exp((y - guess[1] * x) / n);
    }

    private readonly struct Formula : ILawFormula<PowerLaw>
    {
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess) => HemoRheo.PowerLaw.Guess(perSecond, pascals, 0, guess);

        public static PowerLaw Values(IReadOnlyList<double> estimates) => new(estimates[0], estimates[1]);

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] * T.Pow(rate, p[1]);
    }
}
