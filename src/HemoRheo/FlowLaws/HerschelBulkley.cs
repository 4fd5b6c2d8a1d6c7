using System.Globalization;
using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The numbers of the law of Herschel and Bulkley: stress = yield stress + consistency x rate^flow index, while it flows.</summary>
/// <param name="YieldStress">Yield stress: an extrapolation to a rate of zero, not a measured stress.</param>
/// <param name="Consistency">Consistency, Pa.s^n: its unit depends on the flow index.</param>
/// <param name="FlowIndex">Flow index n; at 1 the law is Bingham's.</param>
/// <remarks>Source: Herschel and Bulkley 1926, Kolloid-Zeitschrift 39:291-300. For whole blood from about 1 to 1000 1/s.</remarks>
public sealed record HerschelBulkley(ShearStress YieldStress, double Consistency, double FlowIndex)
{
    internal static FlowLaw<HerschelBulkley> Law { get; } = new FormulaLaw<Formula, HerschelBulkley>(
        "Herschel-Bulkley",
        new("Herschel and Bulkley", 1926, "Kolloid-Zeitschrift 39:291-300"),
        [new("yield stress", "τ_y", "Pa"), new("consistency", "K", "Pa.s^n"), new("flow index", "n", "1")],
        new(1, 1000),
        new(0, "Power law", Wall: 1e-8, Inside: 1e-2, OfLowestStress: true));

    /// <inheritdoc/>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"yield stress {YieldStress}, consistency {Consistency:G4} Pa.s^n, flow index {FlowIndex:G4}");

    private readonly struct Formula : ILawFormula<HerschelBulkley>
    {
        private static readonly double[] SharesOfLowestStress = [0.02, 0.3, 0.6, 0.8, 0.95];

        /// <summary>A power law above each of a few yield stresses; the nearest one.</summary>
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
        {
            double lowest = double.PositiveInfinity, least = double.PositiveInfinity;
            foreach (var stress in pascals) lowest = Math.Min(lowest, stress);
            Span<double> line = stackalloc double[2];
            foreach (var share in SharesOfLowestStress)
            {
                PowerLaw.Guess(perSecond, pascals, share * lowest, line);
                double distance = 0;
                for (var i = 0; i < perSecond.Length; i++)
                {
                    var relative = (share * lowest + line[0] * Math.Pow(perSecond[i], line[1])) / pascals[i] - 1;
                    distance += relative * relative;
                }

                if (distance > least) continue;
                least = distance;
                (guess[0], guess[1], guess[2]) = (share * lowest, line[0], line[1]);
            }
        }

        public static HerschelBulkley Values(IReadOnlyList<double> estimates) => new(ShearStress.FromPascals(estimates[0]), estimates[1], estimates[2]);

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => p[0] + p[1] * T.Pow(rate, p[2]);
    }
}
