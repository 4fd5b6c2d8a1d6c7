namespace HemoRheo;

/// <summary>Reference limits that the study file gives.</summary>
/// <param name="Rate">The shear rate of the viscosity they limit.</param>
/// <param name="AtStandardHematocrit">Whether they speak of values at the standard hematocrit or of native ones.</param>
/// <param name="Lower">Lower limit.</param>
/// <param name="Upper">Upper limit.</param>
/// <param name="Source">Where they were published or how they were obtained.</param>
public sealed record DeclaredLimits(ShearRate Rate, bool AtStandardHematocrit, Viscosity Lower, Viscosity Upper, string Source);
