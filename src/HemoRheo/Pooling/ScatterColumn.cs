namespace HemoRheo;

/// <summary>One column of the loading covariance: a pattern of scatter over the measurands, with its degrees of freedom.</summary>
/// <param name="Amounts">One standard uncertainty of the pattern, for each measurand.</param>
/// <param name="DegreesOfFreedom">Its degrees of freedom; infinite where the scatter is declared.</param>
public sealed record ScatterColumn(Items<double> Amounts, double DegreesOfFreedom);
