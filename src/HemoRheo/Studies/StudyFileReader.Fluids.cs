namespace HemoRheo;

/// <content>Calibration fluids.</content>
internal sealed partial class StudyFileReader
{
    private static readonly string[] CertificateKeys = ["viscosity", "at", "per_kelvin", "per_kelvin_uncertainty"];
    private static readonly string[] UncertaintyKeys = ["expanded_uncertainty", "coverage_factor"];
    private static readonly string[] MixtureKeys = ["mass_fraction", "mass_fraction_uncertainty"];

    private CalibrationFluid Fluid(SectionReader section)
    {
        var kind = section.Text("kind");
        var fluid = kind switch
        {
            "water" => Water(section),
            "glycerol-water" => Mixture(section),
            "sucrose-40" => SucroseSolution(section),
            "certified" when section.Has("certificate") => Certified(section),
            _ => Declared(section),
        };
        var bath = section.OptionalAmount("bath");
        return fluid with { Density = section.OptionalAmount("density"), Bath = bath is { } set ? Temperature.FromDegreesCelsius(set) : null };
    }

    private static CalibrationFluid Water(SectionReader section)
    {
        Without(section, "water", "none: water is taken from IAPWS SR6-08", [.. CertificateKeys, .. MixtureKeys, "certificate", "density"]);
        section.Demand(["lot", .. UncertaintyKeys]);
        return WaterFluid.Of(section.Text("name"), section.Text("lot"), section.Amount("expanded_uncertainty"), section.Number("coverage_factor"));
    }

    private static CalibrationFluid Mixture(SectionReader section)
    {
        Without(section, "glycerol-water", "none: a mixture is taken from Cheng 2008, known to 3 %", [.. CertificateKeys, .. UncertaintyKeys, "certificate", "density"]);
        section.Demand(["lot", .. MixtureKeys]);
        var (at, mixture) = (new Temperature(20), new GlycerolMixture(section.Amount("mass_fraction"), section.Amount("mass_fraction_uncertainty")));
        var known = mixture.MassFraction is >= 0 and <= 1 ? mixture.MassFraction : 0;
        return new(section.Text("name"), section.Text("lot"), at, GlycerolWater.ViscosityAt(known, at), GlycerolWater.Bound, GlycerolWater.BoundFactor, GlycerolWater.PerKelvinAt(known, at), 0, IsWater: false) { Glycerol = mixture };
    }

    private static CalibrationFluid SucroseSolution(SectionReader section)
    {
        Without(section, "sucrose-40", "none: the solution is taken from Bingham and Jackson 1918, known to 5 %", [.. CertificateKeys, .. UncertaintyKeys, .. MixtureKeys, "certificate"]);
        section.Demand("lot");
        var at = new Temperature(20);
        return new(section.Text("name"), section.Text("lot"), at, Sucrose.ViscosityAt(at), Sucrose.Bound, Sucrose.BoundFactor, Sucrose.PerKelvinAt(at), 0, IsWater: false) { IsSucrose = true };
    }

    private CalibrationFluid Certified(SectionReader section)
    {
        Without(section, "a fluid with a certificate file", "none: the certificate file says it", [.. CertificateKeys, .. UncertaintyKeys, .. MixtureKeys, "lot"]);
        var path = section.Text("certificate");
        var before = _faults.Count;
        if (path.Length > 0) CheckPath(section.Table.Find("certificate")!.Node, path, mayBeFolder: false);
        var certificate = path.Length > 0 && _faults.Count == before ? CertificateFileReader.Read(folder, path, _faults) : null;
        if (certificate is null) return new(section.Text("name"), "", default, default, double.NaN, double.NaN, double.NaN, 0, IsWater: false);
        var (low, high) = (certificate.Rows[0], certificate.Rows[^1]);
        var overall = Math.Log(low.Viscosity.PascalSeconds / high.Viscosity.PascalSeconds) / (high.At.DegreesCelsius - low.At.DegreesCelsius);
        return new(section.Text("name"), certificate.Lot, low.At, low.Viscosity, low.RelativeExpandedUncertainty, certificate.CoverageFactor, overall, 0, IsWater: false) { Certificate = certificate };
    }

    private static CalibrationFluid Declared(SectionReader section)
    {
        Without(section, "the certified fluid", "none: it belongs to glycerol-water", MixtureKeys);
        section.Demand(["lot", .. UncertaintyKeys]);
        foreach (var key in CertificateKeys.Where(key => !section.Has(key)))
            section.Refuse(key, $"no \"{key}\" for the certified fluid", $"{key} as its certificate states it", $"add {key}, or name a certificate file with certificate = \"...\"");
        return new(
            section.Text("name"),
            section.Text("lot"),
            Temperature.FromDegreesCelsius(section.OptionalAmount("at") ?? double.NaN),
            Viscosity.FromPascalSeconds(section.OptionalAmount("viscosity") ?? double.NaN),
            section.Amount("expanded_uncertainty"),
            section.Number("coverage_factor"),
            section.OptionalAmount("per_kelvin") ?? double.NaN,
            section.OptionalAmount("per_kelvin_uncertainty") ?? double.NaN,
            IsWater: false);
    }

    private static void Without(SectionReader section, string what, string expected, string[] keys)
    {
        foreach (var key in keys.Where(section.Has)) section.Refuse(key, $"\"{key}\" for {what}", expected, $"remove {key}");
    }
}
