namespace HemoRheo;

/// <summary>A closed interval.</summary>
/// <param name="Lower">Lower end.</param>
/// <param name="Upper">Upper end.</param>
public readonly record struct Interval(double Lower, double Upper)
{
    /// <summary>Whether a number lies inside, ends included.</summary>
    public bool Contains(double x) => x >= Lower && x <= Upper;

    /// <summary>Both ends through an increasing function.</summary>
    public Interval Select(Func<double, double> increasing) => new(increasing(Lower), increasing(Upper));

    /// <inheritdoc/>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{Lower:G6} to {Upper:G6}");
}
