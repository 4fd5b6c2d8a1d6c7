using MathNet.Numerics.Distributions;

namespace HemoRheo;

/// <summary>
/// A number on its working scale (viscosities: natural logarithm) with its signed contributions by source.
/// Combinations add contributions source by source before anything is squared, so shared parts stay shared and common parts cancel.
/// </summary>
/// <param name="X">The estimate on the working scale.</param>
/// <param name="Parts">Contributions, at most one a source.</param>
/// <remarks>Source: JCGM 100:2008 (GUM), 5.1 and G.4 (Welch-Satterthwaite), here with contributions of one variance estimate taken together.</remarks>
public sealed record Value(double X, Items<Contribution> Parts)
{
    /// <summary>A number without uncertainty.</summary>
    public static Value Exact(double x) => new(x, []);

    /// <summary>Variance on the working scale: the sum of squared contributions.</summary>
    public double Variance => Parts.Sum(part => part.Amount * part.Amount);

    /// <summary>Standard uncertainty on the working scale.</summary>
    public double StandardUncertainty => Math.Sqrt(Variance);

    /// <summary>Effective degrees of freedom; positive infinity when every variance is known.</summary>
    public double DegreesOfFreedom
    {
        get
        {
            var denominator = Parts.Where(part => double.IsFinite(part.DegreesOfFreedom))
                .GroupBy(part => part.Estimate)
                .Sum(estimate => Square(estimate.Sum(part => part.Amount * part.Amount / Math.Sqrt(part.DegreesOfFreedom))));
            return denominator > 0 ? Square(Variance) / denominator : double.PositiveInfinity;
        }
    }

    /// <summary>The sum of weight times value.</summary>
    public static Value Combine(IEnumerable<(double Weight, Value Value)> terms)
    {
        var x = 0.0;
        var order = new List<Source>();
        var parts = new Dictionary<Source, Contribution>();
        foreach (var (weight, value) in terms)
        {
            x += weight * value.X;
            foreach (var part in value.Parts)
            {
                if (parts.TryGetValue(part.Source, out var known))
                {
                    parts[part.Source] = part with { Amount = known.Amount + weight * part.Amount };
                }
                else
                {
                    parts[part.Source] = part.Times(weight);
                    order.Add(part.Source);
                }
            }
        }

        return new(x, order.Select(source => parts[source]).ToItems());
    }

    /// <summary>The plain mean of these.</summary>
    public static Value Mean(IReadOnlyCollection<Value> values) => Combine(values.Select(value => (1.0 / values.Count, value)));

    /// <summary>Sum, source by source.</summary>
    public static Value operator +(Value a, Value b) => Combine([(1, a), (1, b)]);

    /// <summary>Difference, source by source.</summary>
    public static Value operator -(Value a, Value b) => Combine([(1, a), (-1, b)]);

    /// <summary>Multiple.</summary>
    public static Value operator *(double factor, Value value) => Combine([(factor, value)]);

    /// <summary>This value with one more source.</summary>
    public Value With(Contribution part) => this with { Parts = Parts.With([part]) };

    /// <summary>This value with only the parts that are asked for.</summary>
    public Value Only(Func<Source, bool> keep) => this with { Parts = Parts.Where(part => keep(part.Source)).ToItems() };

    /// <summary>One kind's part: signed where it is one source, else the root of the sum of squares; null where the kind does not occur.</summary>
    public double? Part(SourceKind kind)
    {
        var amounts = Parts.Where(part => part.Source.Kind == kind).Select(part => part.Amount).ToArray();
        return amounts.Length switch { 0 => null, 1 => amounts[0], _ => Math.Sqrt(amounts.Sum(Square)) };
    }

    /// <summary>Interval on the working scale, Student's t with the effective degrees of freedom.</summary>
    /// <param name="level">Coverage, between 0 and 1.</param>
    public Interval Interval(double level = 0.95)
    {
        var reach = ExpandedUncertainty(level);
        return new(X - reach, X + reach);
    }

    /// <summary>Expanded uncertainty on the working scale: half the width of the interval.</summary>
    /// <param name="level">Coverage, between 0 and 1.</param>
    public double ExpandedUncertainty(double level = 0.95) => StudentQuantile.At(DegreesOfFreedom, (1 + level) / 2) * StandardUncertainty;

    /// <summary>The probability that the quantity lies below a limit on the working scale.</summary>
    public double ProbabilityBelow(double limit) => Probability(limit - X);

    /// <summary>The probability that the quantity lies above a limit on the working scale.</summary>
    public double ProbabilityAbove(double limit) => Probability(X - limit);

    /// <inheritdoc/>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{X:G6} ± {StandardUncertainty:G2} (working scale, {Parts.Count} contributions, largest: {(Parts.Count == 0 ? "none" : Parts.MaxBy(part => Math.Abs(part.Amount)).Source)})");

    private double Probability(double margin)
    {
        var u = StandardUncertainty;
        if (u == 0) return margin > 0 ? 1 : 0;
        var z = margin / u;
        var df = DegreesOfFreedom;
        return double.IsFinite(df) ? StudentT.CDF(0, 1, df, z) : Normal.CDF(0, 1, z);
    }

    private static double Square(double x) => x * x;
}
