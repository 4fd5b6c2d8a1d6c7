namespace HemoRheo;

/// <summary>Every key that a certificate file may have. The strict reader knows these and no others.</summary>
public static class CertificateFileKeys
{
    /// <summary>The keys, in the order a file writes them.</summary>
    public static Items<StudyFileKey> All { get; } =
    [
        new("", "name", StudyFileKeyKind.Text, "Name of the fluid on its certificate.", "\"viscosity oil 5\""),
        new("", "lot", StudyFileKeyKind.Text, "Lot.", "\"24-117\""),
        new("", "issued", StudyFileKeyKind.Date, "Date of issue.", "2026-01-15"),
        new("", "valid_until", StudyFileKeyKind.Date, "Last day on which it is valid.", "2027-01-14"),
        new("", "coverage_factor", StudyFileKeyKind.Number, "Coverage factor k of the expanded uncertainties, as the certificate states it.", "2") { Bounds = KeyBounds.Positive },
        new("", "interpolation", StudyFileKeyKind.Word, "How its viscosities are interpolated in temperature: VFT (Vogel-Fulcher-Tammann, three temperatures or more) or ASTM D341 (two or more, with density).", "\"VFT\"") { Allowed = ["VFT", "ASTM D341"] },
        Amount("temperature", Quantity.Temperature, KeyBounds.BodyOrRoom, "A certified temperature.", "37 °C"),
        Amount("viscosity", Quantity.Viscosity, KeyBounds.Positive, "Dynamic viscosity there; this or kinematic_viscosity.", "4.85 mPa.s") with { Required = false },
        Amount("kinematic_viscosity", Quantity.KinematicViscosity, KeyBounds.Positive, "Kinematic viscosity there, with density; this or viscosity.", "5.71 mm2/s") with { Required = false },
        Amount("density", Quantity.Density, KeyBounds.Positive, "Density there; needed with kinematic_viscosity and for ASTM D341.", "849 kg/m3") with { Required = false },
        Amount("expanded_uncertainty", Quantity.Fraction, KeyBounds.Positive, "Relative expanded uncertainty of the viscosity there.", "0.4 %"),
    ];

    private static StudyFileKey Amount(string name, Quantity quantity, KeyBounds bounds, string meaning, string example) =>
        new("[[rows]]", name, StudyFileKeyKind.Quantity, meaning, $"\"{example}\"") { Quantity = quantity, Bounds = bounds };
}
