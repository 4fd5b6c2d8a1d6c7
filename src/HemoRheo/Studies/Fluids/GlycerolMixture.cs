namespace HemoRheo;

/// <summary>A mixture of glycerol and water.</summary>
/// <param name="MassFraction">Mass of glycerol over mass of the mixture, between 0 and 1.</param>
/// <param name="MassFractionUncertainty">Its standard uncertainty.</param>
public sealed record GlycerolMixture(double MassFraction, double MassFractionUncertainty);
