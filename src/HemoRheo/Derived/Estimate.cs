namespace HemoRheo;

/// <summary>A measurand of one fit, with the fit's own uncertainty and no more: the instrument is not in it, and the scatter between loadings only where loadings were fitted together.</summary>
/// <param name="Measurand">What it is.</param>
/// <param name="Value">The value on the measurand's working scale.</param>
/// <param name="Extrapolated">Whether it lies outside the kept shear rates.</param>
public sealed record Estimate(Measurand Measurand, Value Value, bool Extrapolated)
{
    /// <summary>The estimate in the shown unit.</summary>
    public double Shown => Measurand.ToShown(Value.X);

    /// <summary>Its interval in the shown unit.</summary>
    /// <param name="level">Coverage.</param>
    public Interval Interval(double level = 0.95) => Value.Interval(level).Select(Measurand.ToShown);

    /// <inheritdoc/>
    public override string ToString() => string.Create(
        System.Globalization.CultureInfo.InvariantCulture,
        $"{Measurand.Name}: {Shown:G5} {Measurand.Shown} ({Interval().Lower:G5} to {Interval().Upper:G5}, {(Value.Part(SourceKind.Loading) is null ? "fit alone" : "fit and loadings")}){(Extrapolated ? ", extrapolated" : "")}");
}
