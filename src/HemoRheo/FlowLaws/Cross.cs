using System.Globalization;
using System.Runtime.CompilerServices;

namespace HemoRheo;

/// <summary>The numbers of Cross's law: viscosity = high-shear viscosity + (low-shear viscosity - high-shear viscosity) / (1 + (time constant x rate)^exponent).</summary>
/// <param name="LowShearViscosity">The viscosity approached at low rates.</param>
/// <param name="HighShearViscosity">The viscosity approached at high rates.</param>
/// <param name="TimeConstantSeconds">Time constant: at its inverse the viscosity lies halfway. Some papers write K rate^m instead, with K = time constant^m: not the same number.</param>
/// <param name="Exponent">Exponent m, above zero.</param>
/// <remarks>Source: Cross 1965, Journal of Colloid Science 20:417-437. For whole blood from about 0.1 to 1000 1/s. Where the two viscosities are equal, time constant and exponent mean nothing.</remarks>
public sealed record Cross(Viscosity LowShearViscosity, Viscosity HighShearViscosity, double TimeConstantSeconds, double Exponent)
{
    internal static FlowLaw<Cross> Law { get; } = new FormulaLaw<Formula, Cross>(
        "Cross",
        new("Cross", 1965, "Journal of Colloid Science 20:417-437"),
        [new("low-shear viscosity", "η_0", "Pa.s"), new("high-shear viscosity", "η_∞", "Pa.s"), new("time constant", "λ", "s"), new("exponent", "m", "1")],
        new(0.1, 1000),
        new(1, "the same law without a high-shear viscosity", Wall: 1e-10, Inside: 1e-4, OfLowestStress: true));

    /// <inheritdoc/>
    public override string ToString() => string.Create(
        CultureInfo.InvariantCulture,
        $"low-shear viscosity {LowShearViscosity}, high-shear viscosity {HighShearViscosity}, time constant {TimeConstantSeconds:G4} s, exponent {Exponent:G4}");

    /// <summary>With the two viscosities chosen a little outside the readings, log((low - viscosity) / (viscosity - high)) is a straight line over log rate; the nearest of a few choices.</summary>
    internal static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess)
    {
        ReadOnlySpan<double> above = [1.05, 1.5, 4, 20];
        ReadOnlySpan<double> below = [0.95, 0.8, 0.5];
        double highest = 0, lowest = double.PositiveInfinity, least = double.PositiveInfinity;
        for (var i = 0; i < perSecond.Length; i++)
        {
            highest = Math.Max(highest, pascals[i] / perSecond[i]);
            lowest = Math.Min(lowest, pascals[i] / perSecond[i]);
        }

        foreach (var a in above)
        {
            foreach (var b in below)
            {
                var (low, high) = (a * highest, b * lowest);
                var (log, exponent) = Line(perSecond, pascals, low, high);
                double distance = 0;
                for (var i = 0; i < perSecond.Length; i++)
                {
                    var relative = perSecond[i] * (high + (low - high) / (1 + Math.Exp(exponent * (log + Math.Log(perSecond[i]))))) / pascals[i] - 1;
                    distance += relative * relative;
                }

                if (distance > least) continue;
                least = distance;
                (guess[0], guess[1], guess[2], guess[3]) = (low, high, Math.Exp(log), exponent);
            }
        }
    }

    private static (double LogOfTimeConstant, double Exponent) Line(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, double low, double high)
    {
        double x = 0, y = 0, xx = 0, xy = 0, n = perSecond.Length;
        for (var i = 0; i < perSecond.Length; i++)
        {
            var viscosity = pascals[i] / perSecond[i];
            var (a, b) = (Math.Log(perSecond[i]), Math.Log((low - viscosity) / (viscosity - high)));
            x += a;
            y += b;
            xx += a * a;
            xy += a * b;
        }

        var slope = (n * xy - x * y) / (n * xx - x * x);
        var exponent = slope > 0.2 ? Math.Min(slope, 3) : 0.2;
        return (Math.Clamp((y / exponent - x) / n, -50, 50), exponent);
    }

    private readonly struct Formula : ILawFormula<Cross>
    {
        public static void Guess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess) => HemoRheo.Cross.Guess(perSecond, pascals, guess);

        public static Cross Values(IReadOnlyList<double> estimates) =>
            new(Viscosity.FromPascalSeconds(estimates[0]), Viscosity.FromPascalSeconds(estimates[1]), estimates[2], estimates[3]);

        [MethodImpl(MethodImplOptions.AggressiveInlining)]
        public T Stress<T>(T rate, ReadOnlySpan<T> p) where T : struct, ILawNumber<T> => rate * (p[1] + (p[0] - p[1]) / (1 + T.Pow(p[2] * rate, p[3])));
    }
}
