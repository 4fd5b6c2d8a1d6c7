namespace HemoRheo;

/// <summary>The error model of a curve's readings: what the study declares, with the torque resolution of its instrument through its geometry.</summary>
internal static class ReadingErrorModel
{
    /// <summary>The error model of a curve.</summary>
    public static ErrorModel Of(Study study, FlowCurve curve)
    {
        var declared = new ErrorModel(study.Errors.Relative, ShearStress.FromPascals(study.Errors.Floor), study.Errors.Known);
        return Resolution(study, curve) is { } step && curve.StressPerTorque is { } perTorque ? declared.WithTorqueResolution(step, perTorque) : declared;
    }

    /// <summary>Says so where a declared resolution cannot be turned into a stress.</summary>
    public static IEnumerable<Finding> Findings(Study study, FlowCurve curve) => Resolution(study, curve) is not null && curve.StressPerTorque is null
        ? [CalibrationFindings.ResolutionUnknown.At(curve.Label.Where, $"The torque resolution of '{curve.Label.Recording!.Instrument}' is declared and the geometry of this recording is not known.")]
        : [];

    private static double? Resolution(Study study, FlowCurve curve) => study.Instruments.FirstOrDefault(known => known.Name == curve.Label.Recording?.Instrument)?.TorqueResolution;
}
