namespace HemoRheo;

/// <summary>A deterministic start for a fit, from a linearised form of the law.</summary>
/// <param name="perSecond">Shear rates, above zero, 1/s.</param>
/// <param name="pascals">Shear stresses, above zero, Pa.</param>
/// <param name="guess">Receives the parameters on their natural scale, inside their bounds.</param>
internal delegate void FirstGuess(ReadOnlySpan<double> perSecond, ReadOnlySpan<double> pascals, Span<double> guess);
