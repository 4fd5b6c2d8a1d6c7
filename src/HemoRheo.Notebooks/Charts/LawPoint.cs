namespace HemoRheo.Notebooks;

/// <summary>A point of a fitted law's line.</summary>
/// <param name="Rate">Shear rate, 1/s.</param>
/// <param name="Viscosity">Apparent viscosity, mPa.s.</param>
internal readonly record struct LawPoint(double Rate, double Viscosity);
