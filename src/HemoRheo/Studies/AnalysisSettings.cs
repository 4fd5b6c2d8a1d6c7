namespace HemoRheo;

/// <summary>What is fitted and reported.</summary>
/// <param name="Laws">Names of the flow laws fitted to every curve.</param>
/// <param name="DecideBy">Name of the law whose values are decided on.</param>
/// <param name="StandardRates">The study's standard shear rates, ascending.</param>
/// <param name="Ramp">The ramp that is analyzed; the other serves hysteresis.</param>
/// <param name="CorrectBias">Whether values are corrected by the mean of the period's checks; if not, the bias is a contribution of its own.</param>
/// <param name="Level">Probability that decides a verdict.</param>
public sealed record AnalysisSettings(Items<string> Laws, string DecideBy, Items<ShearRate> StandardRates, Ramp Ramp, bool CorrectBias, double Level);
