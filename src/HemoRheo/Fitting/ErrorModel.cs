namespace HemoRheo;

/// <summary>How far a reading may lie from its law: variance (relative stress)^2 + floor^2, at the fitted stress.</summary>
/// <param name="Relative">Relative standard deviation of a stress.</param>
/// <param name="Floor">Floor of the standard deviation.</param>
/// <param name="ScaleKnown">True: these are the sizes, and normal quantiles apply; false: known up to a scale estimated from the residuals, and Student's t applies.</param>
public sealed record ErrorModel(double Relative, ShearStress Floor, bool ScaleKnown)
{
    /// <summary>2 % of the stress and a floor of 0.5 mPa, up to a common scale: used where no error model is given.</summary>
    public static ErrorModel Default { get; } = UpToScale(0.02, ShearStress.FromPascals(0.0005));

    /// <summary>Sizes that are known.</summary>
    public static ErrorModel Known(double relative, ShearStress floor) => new(relative, floor, true);

    /// <summary>Sizes that are known up to a common scale.</summary>
    public static ErrorModel UpToScale(double relative, ShearStress floor) => new(relative, floor, false);

    /// <inheritdoc/>
    public override string ToString() => string.Create(
        System.Globalization.CultureInfo.InvariantCulture,
        $"{100 * Relative:G4} % of the stress and {Floor}, {(ScaleKnown ? "known" : "up to scale")}");
}
