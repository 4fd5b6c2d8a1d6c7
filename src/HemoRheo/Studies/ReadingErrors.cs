namespace HemoRheo;

/// <summary>The declared error of one reading: variance (relative stress)^2 + floor^2.</summary>
/// <param name="Relative">Relative standard deviation.</param>
/// <param name="Floor">Floor, Pa.</param>
/// <param name="Known">True: sizes are known; false: known up to a scale that each fit estimates.</param>
/// <param name="DeclaredLoading">Relative standard deviation between loadings, used when the study has no replicate loadings; null when not declared.</param>
/// <param name="PointCorrelation">Declared correlation of neighboring readings of a ramp, from 0 to below 1; null to have it estimated over the study.</param>
public sealed record ReadingErrors(double Relative, double Floor, bool Known, double? DeclaredLoading, double? PointCorrelation = null);
