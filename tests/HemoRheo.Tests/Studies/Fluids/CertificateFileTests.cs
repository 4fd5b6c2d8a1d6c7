namespace HemoRheo.Tests.Studies.Fluids;

/// <summary>Certificate files: read strictly, each fault with file, line and column. The sign ¦ marks the place.</summary>
public sealed class CertificateFileTests
{
    private const string Oil = """
name = "viscosity oil 5"
lot = "24-117"
issued = 2026-01-15
valid_until = 2027-01-14
coverage_factor = 2
interpolation = "VFT"

[[rows]]
temperature = "40 °C"
kinematic_viscosity = "5.00 mm2/s"
density = "0.850 g/mL"
expanded_uncertainty = "0.3 %"

[[rows]]
temperature = "20 °C"
viscosity = "8.60 mPa.s"
density = "860 kg/m3"
expanded_uncertainty = "0.4 %"

[[rows]]
temperature = "60 °C"
viscosity = "2.60 mPa.s"
density = "840 kg/m3"
expanded_uncertainty = "0.4 %"

""";

    [Fact]
    public void A_certificate_is_read_with_its_rows_by_temperature()
    {
        var fluid = Opened(Oil).Fluids[0];
        var certificate = fluid.Certificate!;
        Assert.Equal(("oil-5", "24-117", 2.0), (fluid.Name, fluid.Lot, fluid.CoverageFactor));
        Assert.Equal((new DateOnly(2026, 1, 15), new DateOnly(2027, 1, 14)), (certificate.Issued, certificate.ValidUntil));
        Assert.Equal([20, 40, 60], certificate.Rows.Select(row => row.At.DegreesCelsius));
        Assert.Equal(5.00 * 0.850, certificate.Rows[1].Viscosity.MillipascalSeconds, 1e-12);
        Assert.Equal(0.003, certificate.Rows[1].RelativeExpandedUncertainty, 1e-15);
        Assert.Equal(new Interval(20, 60), certificate.Range);
        Assert.Equal("oil-5.toml", certificate.File);
        Assert.Equal(64, certificate.Digest.Length);
        Assert.True(certificate.ValidOn(new(2027, 1, 14)));
        Assert.False(certificate.ValidOn(new(2027, 1, 15)));
        Assert.False(certificate.ValidOn(new(2026, 1, 14)));
    }

    [Theory]
    [InlineData("name = \"vis", "¦name = \"vis", "no \"coverage_factor\"", "add it", "coverage_factor = 2\n", "")]
    [InlineData("lot = ", "¦lott = ", "the unknown key \"lott\"", "did you mean \"lot\"?")]
    [InlineData("coverage_factor = 2", "coverage_factor = ¦\"2\"", "the text \"2\"", "coverage_factor = 2")]
    [InlineData("valid_until = 2027-01-14", "valid_until = ¦\"2027-01-14\"", "the text \"2027-01-14\"", "valid_until = 2027-01-14")]
    [InlineData("valid_until = 2027-01-14", "valid_until = ¦2025-01-14", "a last day before the day of issue", "correct one of the two")]
    [InlineData("\"VFT\"", "¦\"WLF\"", "the text \"WLF\"", "\"VFT\", \"ASTM D341\"")]
    [InlineData("\"8.60 mPa.s\"", "¦\"8,60 mPa.s\"", "decimal comma", "mPa.s")]
    [InlineData("density = \"0.850 g/mL\"\n", "", "no \"density\"", "add it as the certificate states it", "[[rows]]", "[[¦rows]]")]
    [InlineData("viscosity = \"8.60 mPa.s\"", "viscosity = \"8.60 mPa.s\"\nkinematic_viscosity = ¦\"10 mm2/s\"", "both viscosity and kinematic_viscosity", "write what the certificate states")]
    [InlineData("expanded_uncertainty = \"0.3 %\"", "", "no \"expanded_uncertainty\" in [[rows]]", "add it", "[[rows]]", "[[¦rows]]")]
    public void A_fault_is_told_with_its_place(string text, string wrong, string found, string cure, string also = "", string alsoWrong = "")
    {
        var file = Replaced(Oil, text, wrong);
        if (also.Length > 0) file = Replaced(file, also, alsoWrong);
        var at = file.IndexOf('¦', StringComparison.Ordinal);
        var (line, column) = (file[..at].Count(sign => sign == '\n') + 1, at - (at == 0 ? -1 : file.LastIndexOf('\n', at - 1)));
        var fault = Assert.Single(Thrown(file.Remove(at, 1)).Faults, fault => fault.Found.Contains(found, StringComparison.Ordinal));
        Assert.Equal(("oil-5.toml", line, column), (fault.File, fault.Line, fault.Column));
        Assert.Contains(cure, fault.WhatToDo + fault.Expected, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"60 °C\"", "\"20 °C\"", "20 degC twice")]
    [InlineData("\"2.60 mPa.s\"", "\"9.60 mPa.s\"", "not below that at 40 degC")]
    [InlineData("seed", "seed", "2 temperatures", "interpolate by ASTM D341")]
    public void Rows_that_cannot_be_are_told(string text, string wrong, string found, string cure = "")
    {
        var file = text == "seed" ? Oil[..Oil.LastIndexOf("[[rows]]", StringComparison.Ordinal)] : Replaced(Oil, text, wrong);
        var fault = Thrown(file).Faults[0];
        Assert.Contains(found, fault.Found, StringComparison.Ordinal);
        Assert.Contains(cure, fault.WhatToDo, StringComparison.Ordinal);
    }

    [Fact]
    public void ASTM_D341_does_with_two_rows_and_needs_their_densities()
    {
        var two = Replaced(Oil[..Oil.LastIndexOf("[[rows]]", StringComparison.Ordinal)], "\"VFT\"", "\"ASTM D341\"");
        Assert.Equal(CertificateInterpolation.AstmD341, Opened(two).Fluids[0].Certificate!.Interpolation);
        Assert.Contains("no \"density\"", Thrown(Replaced(two, "density = \"860 kg/m3\"\n", "")).Faults[0].Found, StringComparison.Ordinal);
    }

    [Fact]
    public void A_certificate_file_that_is_missing_no_TOML_or_not_UTF_8_is_told()
    {
        Assert.Contains("no file \"oil-5.toml\"", Thrown(null).Faults[0].Found, StringComparison.Ordinal);
        Assert.Equal(("oil-5.toml", 1), (Thrown("name = = 1").Faults[0].File, Thrown("name = = 1").Faults[0].Line));
        using var folder = Folder();
        folder.Write("oil-5.toml", [.. "name = \""u8, 0xE9]);
        Assert.Contains("not UTF-8", Assert.Throws<StudyFileException>(() => Study.Open(folder.StudyFile)).Faults[0].Found, StringComparison.Ordinal);
    }

    [Fact]
    public void What_the_certificate_says_may_not_stand_in_the_study_file_too()
    {
        using var folder = StudyFolder.Valid();
        folder.Write("oil-5.toml", Oil).Write("study.toml", Replaced(Study.Template(), "lot = \"lot of the certificate\"", "certificate = \"oil-5.toml\""));
        var faults = Assert.Throws<StudyFileException>(() => Study.Open(folder.StudyFile)).Faults;
        Assert.Contains(faults, fault => fault.Found == "\"viscosity\" for a fluid with a certificate file" && fault.WhatToDo == "remove viscosity");
        Assert.Equal(6, faults.Count);
    }

    [Fact]
    public void Mixtures_and_solutions_are_declared_without_a_certificate()
    {
        var study = Opened(Oil, "[[fluids]]\nname = \"glycerol\"\nkind = \"glycerol-water\"\nlot = \"batch 3\"\nmass_fraction = \"50 %\"\nmass_fraction_uncertainty = \"0.1 %\"\nbath = \"37 °C\"\n\n[[fluids]]\nname = \"sugar\"\nkind = \"sucrose-40\"\nlot = \"b\"\ndensity = \"1.17 g/mL\"\n\n");
        var (glycerol, sugar) = (study.Fluids.Single(fluid => fluid.Name == "glycerol"), study.Fluids.Single(fluid => fluid.Name == "sugar"));
        Assert.Equal((new GlycerolMixture(0.5, 0.001), 37.0), (glycerol.Glycerol!, glycerol.Bath!.Value.DegreesCelsius));
        Assert.Equal(0.03 / Math.Sqrt(3), glycerol.RelativeExpandedUncertainty / glycerol.CoverageFactor, 1e-15);
        Assert.True(sugar.IsSucrose);
        Assert.Equal(1170, sugar.Density!.Value, 1e-9);
    }

    [Theory]
    [InlineData("kind = \"glycerol-water\"\nlot = \"b\"\nmass_fraction = \"50 %\"", "no \"mass_fraction_uncertainty\" in [[fluids]]")]
    [InlineData("kind = \"glycerol-water\"\nlot = \"b\"\nmass_fraction = \"50 %\"\nmass_fraction_uncertainty = \"0.1 %\"\ncoverage_factor = 2", "\"coverage_factor\" for glycerol-water")]
    [InlineData("kind = \"sucrose-40\"\nlot = \"b\"\nmass_fraction = \"60 %\"", "\"mass_fraction\" for sucrose-40")]
    [InlineData("kind = \"water\"\nlot = \"b\"\nexpanded_uncertainty = \"1 %\"\ncoverage_factor = 2\ndensity = \"1 g/mL\"", "\"density\" for water")]
    public void Keys_of_another_kind_of_fluid_are_told(string keys, string found) =>
        Assert.Contains(Assert.Throws<StudyFileException>(() => Opened(Oil, $"[[fluids]]\nname = \"other\"\n{keys}\n\n")).Faults, fault => fault.Found == found);

    private static StudyFileException Thrown(string? certificate)
    {
        using var folder = Folder();
        if (certificate is not null) folder.Write("oil-5.toml", certificate);
        return Assert.Throws<StudyFileException>(() => Study.Open(folder.StudyFile));
    }

    private static Study Opened(string certificate, string more = "")
    {
        using var folder = Folder(more);
        folder.Write("oil-5.toml", certificate);
        return Study.Open(folder.StudyFile);
    }

    private static StudyFolder Folder(string more = "")
    {
        var template = Study.Template();
        var (from, to) = (template.IndexOf("lot = \"lot of the certificate\"", StringComparison.Ordinal), template.IndexOf("# density = \"849", StringComparison.Ordinal));
        return StudyFolder.Valid().Write("study.toml", Replaced(template.Remove(from, to - from).Insert(from, "certificate = \"oil-5.toml\"\n"), "[[counters]]   ", more + "[[counters]]   "));
    }

    private static string Replaced(string text, string old, string with)
    {
        var at = text.IndexOf(old, StringComparison.Ordinal);
        Assert.True(at >= 0, $"there is no {old}");
        return text.Remove(at, old.Length).Insert(at, with);
    }
}
