namespace HemoRheo;

/// <summary>One loading of a sample: its curves, fits and the instrument's standing then.</summary>
/// <param name="Recording">The recording.</param>
/// <param name="Curve">The screened curve that was analyzed.</param>
/// <param name="OtherRamp">The screened curve of the other ramp; null where there is none.</param>
/// <param name="Fits">Fits of every law to the analyzed curve.</param>
/// <param name="Standing">Standing of the instrument at that moment; its findings name torques of kept readings at which a check failed, too.</param>
/// <param name="Findings">Findings about this loading, those of its curves and fits included.</param>
public sealed record LoadingResult(Recording Recording, FlowCurve Curve, FlowCurve? OtherRamp, Items<FittedLaw> Fits, InstrumentStanding Standing, Items<Finding> Findings);
