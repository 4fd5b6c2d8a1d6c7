namespace HemoRheo.Notebooks;

/// <summary>A point of a fitted law's line.</summary>
/// <param name="Rate">Shear rate, 1/s.</param>
/// <param name="Viscosity">Apparent viscosity, mPa.s.</param>
/// <param name="Band">Its 95 % interval from the fit alone, mPa.s; null where the fit gives none.</param>
internal readonly record struct LawPoint(double Rate, double Viscosity, Interval? Band);
