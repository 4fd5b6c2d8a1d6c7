namespace HemoRheo;

/// <summary>A law's stresses and slopes written by hand, where that is much faster than exact slopes from the formula. A contract test holds it equal to the formula.</summary>
/// <param name="rates">Shear rates, 1/s, point by point.</param>
/// <param name="natural">Parameters on their natural scale.</param>
/// <param name="stresses">Receives the stresses, with the bits of the formula.</param>
/// <param name="slopes">Receives the slope with respect to scaled parameter k at point i at k * rates.Length + i.</param>
internal delegate void HandSlopes(ReadOnlySpan<Lane> rates, ReadOnlySpan<Lane> natural, Span<Lane> stresses, Span<Lane> slopes);
