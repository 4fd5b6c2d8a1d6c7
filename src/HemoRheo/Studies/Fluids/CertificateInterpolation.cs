namespace HemoRheo;

/// <summary>How a certificate's viscosities are interpolated in temperature.</summary>
public enum CertificateInterpolation
{
    /// <summary>Vogel-Fulcher-Tammann: ln(viscosity) = a + b / (T - T0). Needs three temperatures.</summary>
    Vft,

    /// <summary>ASTM D341: log log of the kinematic viscosity falls in a straight line with log T. Needs two temperatures, and the density at each.</summary>
    AstmD341,
}
