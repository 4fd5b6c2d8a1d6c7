namespace HemoRheo;

/// <summary>One value of a sample, with its whole budget.</summary>
/// <param name="Measurand">What it is.</param>
/// <param name="Law">Name of the law it comes from.</param>
/// <param name="Basis">The hematocrit it speaks of.</param>
/// <param name="Value">The value on the measurand's working scale, with its contributions.</param>
/// <param name="Interpolated">The same read off between the readings, without a law, on the working scale and corrected alike; null where readings do not enclose the rate, or it does not apply.</param>
/// <param name="Decidable">Whether it may be decided on and summarized; if not, its findings say why.</param>
/// <param name="Findings">Findings about this value.</param>
public sealed record SampleValue(Measurand Measurand, string Law, HematocritBasis Basis, Value Value, double? Interpolated, bool Decidable, Items<Finding> Findings)
{
    /// <summary>The estimate in SI.</summary>
    public double Si => Measurand.ToSi(Value.X);

    /// <summary>The estimate in the shown unit.</summary>
    public double Shown => Measurand.ToShown(Value.X);

    /// <summary>Its interval in the shown unit.</summary>
    /// <param name="level">Coverage.</param>
    public Interval Interval(double level = 0.95) => Value.Interval(level).Select(Measurand.ToShown);

    /// <inheritdoc/>
    public override string ToString() => string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{Measurand.Name}, {Basis.Words()}, {Law}: {Shown:G5} {Measurand.Shown} ({Interval().Lower:G5} to {Interval().Upper:G5})");
}
