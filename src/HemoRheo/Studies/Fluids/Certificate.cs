namespace HemoRheo;

/// <summary>The certificate of a calibration fluid's lot, as its certificate file says.</summary>
/// <param name="Name">The fluid's name on the certificate.</param>
/// <param name="Lot">Its lot.</param>
/// <param name="Issued">Date of issue.</param>
/// <param name="ValidUntil">Last day on which it is valid.</param>
/// <param name="CoverageFactor">Coverage factor k of its expanded uncertainties.</param>
/// <param name="Interpolation">How its viscosities are interpolated in temperature.</param>
/// <param name="Rows">Its temperatures, ascending.</param>
/// <param name="File">Path of the file below the study's folder.</param>
/// <param name="Digest">SHA-256 of the file's bytes, lower-case hexadecimal.</param>
public sealed record Certificate(
    string Name,
    string Lot,
    DateOnly Issued,
    DateOnly ValidUntil,
    double CoverageFactor,
    CertificateInterpolation Interpolation,
    Items<CertificateRow> Rows,
    string File,
    string Digest)
{
    /// <summary>Lowest and highest certified temperature, degC. No viscosity is taken from outside them.</summary>
    public Interval Range => new(Rows[0].At.DegreesCelsius, Rows[^1].At.DegreesCelsius);

    /// <summary>Whether it is valid on a day.</summary>
    /// <param name="day">The day.</param>
    public bool ValidOn(DateOnly day) => day >= Issued && day <= ValidUntil;

    /// <inheritdoc/>
    public override string ToString() => FormattableString.Invariant($"certificate of {Name}, lot {Lot}, {Rows.Count} temperatures from {Range.Lower:G4} to {Range.Upper:G4} degC, valid until {ValidUntil:yyyy-MM-dd}");
}
