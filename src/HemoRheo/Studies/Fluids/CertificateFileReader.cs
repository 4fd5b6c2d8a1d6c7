using System.Security.Cryptography;

namespace HemoRheo;

/// <summary>Makes a <see cref="Certificate"/> of a certificate file, as strictly as the study file is read; faults are collected with line and column.</summary>
internal static class CertificateFileReader
{
    // The full form of ASTM D341 holds from here.
    private const double LeastKinematicViscosity = 0.21e-6;

    /// <summary>The certificate; null, with faults, where the file has any.</summary>
    /// <param name="folder">The study's folder.</param>
    /// <param name="path">Path of the file below it.</param>
    /// <param name="faults">Receives the faults, under that path.</param>
    public static Certificate? Read(string folder, string path, StudyFileFaults faults)
    {
        var own = faults.Of(path);
        var bytes = File.ReadAllBytes(Path.Combine(folder, path));
        var before = own.Count;
        var text = StudyText.Decoded(bytes, own);
        if (own.Count > before || TomlTree.Read(text, own) is not { } root) return null;
        var top = new SectionReader(root, "", own, CertificateFileKeys.All);
        var interpolation = top.Text("interpolation") == "ASTM D341" ? CertificateInterpolation.AstmD341 : CertificateInterpolation.Vft;
        var rows = Rows(root, interpolation == CertificateInterpolation.AstmD341, own);
        var certificate = new Certificate(
            top.Text("name"),
            top.Text("lot"),
            top.Date("issued"),
            top.Date("valid_until"),
            top.Number("coverage_factor"),
            interpolation,
            rows,
            path.Replace('\\', '/'),
            Convert.ToHexStringLower(SHA256.HashData(bytes)));
        if (own.Count > before) return null;
        Check(top, certificate);
        return own.Count > before ? null : certificate;
    }

    private static Items<CertificateRow> Rows(TomlTable root, bool needsDensity, StudyFileFaults faults)
    {
        if (root.Find("rows")?.Node is TomlList { OfTables: true } list)
            return list.Items.Select(item => Row(new((TomlTable)item, "[[rows]]", faults, CertificateFileKeys.All), needsDensity)).OrderBy(row => row.At.DegreesCelsius).ToItems();
        faults.Add(root.Find("rows")?.Node ?? root, "no rows", "[[rows]], one a certified temperature", "add them as the certificate states them");
        return [];
    }

    private static CertificateRow Row(SectionReader section, bool needsDensity)
    {
        var (own, kinematic, density) = (section.OptionalAmount("viscosity"), section.OptionalAmount("kinematic_viscosity"), section.OptionalAmount("density"));
        if (own is null == kinematic is null)
            section.Refuse("kinematic_viscosity", own is null ? "neither viscosity nor kinematic_viscosity" : "both viscosity and kinematic_viscosity", "one of the two", "write what the certificate states");
        else if (density is null && (kinematic is not null || needsDensity))
            section.Refuse("density", "no \"density\"", kinematic is null ? "density at each temperature for ASTM D341" : "density with kinematic_viscosity", "add it as the certificate states it");
        else if (needsDensity && (kinematic ?? own / density) < LeastKinematicViscosity)
            section.Refuse("kinematic_viscosity", "a kinematic viscosity below 0.21 mm2/s", "0.21 mm2/s or more for ASTM D341", "interpolate by VFT");
        return new(
            Temperature.FromDegreesCelsius(section.Amount("temperature")),
            Viscosity.FromPascalSeconds(own ?? (kinematic * density) ?? double.NaN),
            section.Amount("expanded_uncertainty"),
            density);
    }

    private static void Check(SectionReader top, Certificate certificate)
    {
        var rows = certificate.Rows;
        if (certificate.ValidUntil < certificate.Issued) top.Refuse("valid_until", "a last day before the day of issue", "valid_until after issued", "correct one of the two");
        var needed = certificate.Interpolation == CertificateInterpolation.Vft ? 3 : 2;
        if (rows.Count < needed) top.Refuse("interpolation", $"{rows.Count} temperatures", $"{needed} or more for this interpolation", needed == 3 && rows.Count == 2 ? "add a temperature, or interpolate by ASTM D341" : "add temperatures");
        for (var i = 1; i < rows.Count; i++)
        {
            if (rows[i].At == rows[i - 1].At) top.Refuse("rows", $"{rows[i].At} twice", "each temperature once", "remove one");
            else if (rows[i].Viscosity.PascalSeconds >= rows[i - 1].Viscosity.PascalSeconds) top.Refuse("rows", $"a viscosity at {rows[i].At} that is not below that at {rows[i - 1].At}", "viscosities that fall as temperature rises", "correct the row");
        }
    }
}
