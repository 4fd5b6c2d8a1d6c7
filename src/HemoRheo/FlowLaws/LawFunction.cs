namespace HemoRheo;

/// <summary>A user's flow law as a lambda: <c>(rate, p) => p[0] + p[1] * LaneDual.Pow(rate, p[2])</c>.</summary>
/// <param name="rate">Shear rate, 1/s.</param>
/// <param name="p">Parameters on their natural scale, SI.</param>
/// <returns>Shear stress, Pa.</returns>
public delegate LaneDual LawFunction(LaneDual rate, ReadOnlySpan<LaneDual> p);
