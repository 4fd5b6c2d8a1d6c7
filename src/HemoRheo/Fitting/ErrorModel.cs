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

    /// <summary>This error model with the resolution of the torque in its floor: <c>errors.WithTorqueResolution(newtonMeters: 1e-8, curve.StressPerTorque)</c>.</summary>
    /// <param name="newtonMeters">The step in which the instrument gives torques, N.m. A torque lies anywhere within a step, so its standard deviation is step / sqrt(12); as a stress it joins the floor in quadrature.</param>
    /// <param name="stressPerTorque">Stress per torque of the geometry, Pa/(N.m), as <see cref="FlowCurve.StressPerTorque"/> has it.</param>
    /// <exception cref="ArgumentException">The step is below zero or not finite, or the stress per torque is not known or not above zero.</exception>
    /// <remarks>Where the sizes are known up to a scale only, the scale multiplies this part too. Source: JCGM 100:2008 (GUM), 4.3.7 and F.2.2.1.</remarks>
    public ErrorModel WithTorqueResolution(double newtonMeters, double? stressPerTorque)
    {
        if (!(newtonMeters >= 0 && double.IsFinite(newtonMeters)))
        {
            throw new ArgumentException(FormattableString.Invariant($"The resolution of a torque is zero or above, in N.m; this one is {newtonMeters}."), nameof(newtonMeters));
        }

        if (stressPerTorque is not { } perTorque)
        {
            throw new ArgumentException("The curve knows no geometry, so a torque cannot be turned into a stress. Declare the geometry, or give the stress per torque, Pa/(N.m).", nameof(stressPerTorque));
        }

        if (!(perTorque > 0 && double.IsFinite(perTorque)))
        {
            throw new ArgumentException(FormattableString.Invariant($"Stress per torque is above zero, in Pa/(N.m); this one is {perTorque}."), nameof(stressPerTorque));
        }

        var resolution = newtonMeters * perTorque / Math.Sqrt(12);
        return resolution == 0 ? this : this with { Floor = ShearStress.FromPascals(Math.Sqrt(Floor.Pascals * Floor.Pascals + resolution * resolution)) };
    }

    /// <summary>Variance of a reading, Pa^2, where the law says this stress.</summary>
    internal double VarianceAt(double pascals) => Relative * pascals * (Relative * pascals) + Floor.Pascals * Floor.Pascals;

    /// <inheritdoc/>
    public override string ToString() => string.Create(
        System.Globalization.CultureInfo.InvariantCulture,
        $"{100 * Relative:G4} % of the stress and {Floor}, {(ScaleKnown ? "known" : "up to scale")}");
}
