namespace HemoRheo;

/// <content>Fluids, their certificates and where their flow is laminar.</content>
public static partial class CalibrationFindings
{
    /// <summary>A certificate is not valid on the day of a check.</summary>
    public static FindingKind CertificateNotValid { get; } = new(
        "certificate-not-valid",
        Severity.Warning,
        "The certificate of the fluid was not valid on the day of the check.",
        "An old bottle, or the file of another lot.",
        "Check again with a fluid whose certificate is valid, or have this one certified anew.");

    /// <summary>Rows of a certificate that no curve of its kind follows.</summary>
    public static FindingKind CertificateUnusable { get; } = new(
        "certificate-rows-follow-no-curve",
        Severity.Fault,
        "The rows of the certificate follow no curve of the kind it names, so there is no viscosity between them.",
        "A row typed wrongly, or a fluid that Vogel-Fulcher-Tammann does not describe.",
        "Hold the file against the certificate; interpolate by ASTM D341 where it is an oil.");

    /// <summary>A row of a certificate off the curve through all.</summary>
    public static FindingKind CertificateRowsScatter { get; } = new(
        "certificate-row-off-curve",
        Severity.Warning,
        "A row of the certificate departs from the curve through all its rows by more than its expanded uncertainty.",
        "A row typed wrongly, or an interpolation that does not describe the fluid.",
        "Hold the file against the certificate, or choose the other interpolation.");

    /// <summary>A check's temperature is not that of its bath.</summary>
    public static FindingKind BathDiffers { get; } = new(
        "check-bath-differs",
        Severity.Warning,
        "The temperature that the check reads is not the one its bath is set to.",
        "A fluid that was measured before it had taken the bath's temperature, heat of shearing, or a thermometer that is off.",
        "Wait longer and check again; hold the thermometer against another one.");

    /// <summary>A reading beyond laminar flow.</summary>
    public static FindingKind FlowNotLaminar { get; } = new(
        "check-flow-not-laminar",
        Severity.Fault,
        "At this speed vortices set in with this thin fluid, so the torque is too large though the instrument is right; the reading takes no part in the check.",
        "A fluid as thin as water at the upper end of the speeds.",
        "Nothing for the instrument; use a thicker fluid to check high speeds.",
        "Taylor 1923; DiPrima and Swinney 1981");

    /// <summary>Which cylinder turns is not declared.</summary>
    public static FindingKind TurningUnknown { get; } = new(
        "check-turning-unknown",
        Severity.Note,
        "Which cylinder turns is not declared, so flow was judged as if the inner one did, which is the stricter.",
        "The study file leaves it out.",
        "Write turning = \"inner\" or \"outer\" in the geometry.");

    /// <summary>Laminar flow cannot be judged.</summary>
    public static FindingKind DensityUnknown { get; } = new(
        "check-density-unknown",
        Severity.Note,
        "The density of the fluid is not known, so whether its fastest readings are still in laminar flow is not judged.",
        "A fluid declared without its density.",
        "Write the density in the study file or the certificate file.");

    /// <summary>An export contradicts the geometry it names.</summary>
    public static FindingKind GeometryContradicted { get; } = new(
        "check-geometry-contradicted",
        Severity.Fault,
        "Shear rates or stresses of the export are not those that the geometry it names gives at its speeds and torques, so the check is not counted.",
        "Another cylinder in the instrument than the one chosen in its program, or wrong radii in the study file.",
        "See which geometry was used; correct its name, or the radii in the study file, and export again.");

    /// <summary>Two checks at one time.</summary>
    public static FindingKind OneTime { get; } = new(
        "checks-at-one-time",
        Severity.Warning,
        "Different checks of one instrument start at the same moment, so at least one time is wrong; both are counted.",
        "A time copied from one check to the next, or one check exported under two names.",
        "Correct the time, or remove the copy.");
}
