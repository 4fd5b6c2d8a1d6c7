namespace HemoRheo;

/// <summary>A hematocrit counter or other method of hematocrit.</summary>
/// <param name="Name">Name that the samples table uses.</param>
/// <param name="Uncertainty">Standard uncertainty of one sample's hematocrit, L/L, without the shared part.</param>
/// <param name="SharedUncertainty">Standard uncertainty of the bias that all its samples share, L/L.</param>
public sealed record Counter(string Name, double Uncertainty, double SharedUncertainty);
