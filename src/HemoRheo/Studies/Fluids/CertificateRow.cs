namespace HemoRheo;

/// <summary>One temperature of a certificate.</summary>
/// <param name="At">The temperature.</param>
/// <param name="Viscosity">Certified dynamic viscosity; where the certificate states the kinematic one, that times the density.</param>
/// <param name="RelativeExpandedUncertainty">Its relative expanded uncertainty U.</param>
/// <param name="Density">Density, kg/m3; null where the certificate states none.</param>
public sealed record CertificateRow(Temperature At, Viscosity Viscosity, double RelativeExpandedUncertainty, double? Density);
