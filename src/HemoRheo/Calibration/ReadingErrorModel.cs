namespace HemoRheo;

/// <summary>
/// The error model of a curve's readings: what the study declares, with the torque resolution of its instrument through its geometry; the noise of a blank run takes the place of the floor
/// where it is larger. It is not added: a declared floor already holds the noise, and may hold what a filled gap adds.
/// </summary>
internal static class ReadingErrorModel
{
    /// <summary>The error model of a curve.</summary>
    public static ErrorModel Of(Study study, FlowCurve curve)
    {
        var declared = new ErrorModel(study.Errors.Relative, ShearStress.FromPascals(study.Errors.Floor), study.Errors.Known);
        if (curve.StressPerTorque is not { } perTorque) return declared;
        var resolved = Resolution(study, curve) is { } step ? declared.WithTorqueResolution(step, perTorque) : declared;
        return Noise(study, curve) * perTorque is { } noise && noise > resolved.Floor.Pascals ? resolved with { Floor = ShearStress.FromPascals(noise) } : resolved;
    }

    /// <summary>Says so where a declared resolution cannot be turned into a stress.</summary>
    public static IEnumerable<Finding> Findings(Study study, FlowCurve curve) => Resolution(study, curve) is not null && curve.StressPerTorque is null
        ? [CalibrationFindings.ResolutionUnknown.At(curve.Label.Where, $"The torque resolution of '{curve.Label.Recording!.Instrument}' is declared and the geometry of this recording is not known.")]
        : [];

    /// <summary>Noise of an empty gap at the slowest kept point, where the floor decides.</summary>
    private static double? Noise(Study study, FlowCurve curve) => curve.Points.MinBy(point => point.Rate.ReciprocalSeconds) is { } slowest ? curve.Torque?.At(curve.SpeedOf(slowest, study))?.Noise : null;

    private static double? Resolution(Study study, FlowCurve curve) => study.Instruments.FirstOrDefault(known => known.Name == curve.Label.Recording?.Instrument)?.TorqueResolution;
}
