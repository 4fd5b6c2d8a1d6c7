namespace HemoRheo;

/// <summary>A smooth function of a law's parameters on the fitting scale.</summary>
/// <param name="scaled">Parameters on the fitting scale.</param>
/// <param name="gradient">Receives its slopes with respect to them.</param>
internal delegate double ScaledFunction(ReadOnlySpan<double> scaled, Span<double> gradient);
