namespace HemoRheo;

/// <content>Files, analysis, reference limits, groups.</content>
internal sealed partial class StudyFileReader
{
    private StudyFiles Files(SectionReader section)
    {
        var files = new StudyFiles(section.Texts("exports"), section.Texts("checks"), section.Text("samples"), section.OptionalText("people"), section.OptionalText("check_table"))
        {
            Blanks = section.Texts("blanks"),
            AllowedColumns = section.Texts("allowed_columns"),
        };
        if (section.Table.Find("exports")?.Node is TomlList { Items.Count: 0 })
            section.Refuse("exports", "no export", "at least one file or folder", "name the folder with the exports");
        foreach (var entry in section.Table.Entries.Where(entry => entry.Key is not "allowed_columns"))
            foreach (var node in entry.Node is TomlList list ? list.Items : [entry.Node])
                if (node is TomlScalar { Value: string path }) CheckPath(node, path, mayBeFolder: entry.Key is "exports" or "checks" or "blanks");
        return files;
    }

    private void CheckPath(TomlNode node, string path, bool mayBeFolder)
    {
        const string below = "a path below the study's folder";
        if (path.Contains('\0'))
        {
            _faults.Add(node, "a path with a zero character", below, "correct the path");
            return;
        }

        var full = Path.GetFullPath(path, folder);
        if (Path.IsPathRooted(path)) _faults.Add(node, "an absolute path", below, "write it relative to the study file");
        else if (!FolderPath.Below(folder, full)) _faults.Add(node, $"the path \"{path}\", which leads out of the study's folder", below, "move the data into the folder");
        else if (!File.Exists(full) && !Directory.Exists(full)) _faults.Add(node, $"no file \"{path}\"", "a file that is there", "correct the path or add the file");
        else if (FolderPath.LeadsOut(folder, full)) _faults.Add(node, $"\"{path}\", a link that leads out of the study's folder", below, "copy the data into the folder");
        else if (!mayBeFolder && Directory.Exists(full)) _faults.Add(node, $"the folder \"{path}\"", "a file", "name the file itself");
    }

    private static AnalysisSettings Analysis(SectionReader section)
    {
        var settings = new AnalysisSettings(
            section.Texts("laws"),
            section.Text("decide_by"),
            section.Amounts("standard_rates").Select(ShearRate.FromReciprocalSeconds).ToItems(),
            section.Text("ramp") == "up" ? Ramp.Up : Ramp.Down,
            section.Truth("correct_bias"),
            section.Number("level"));
        if (settings.DecideBy.Length > 0 && settings.Laws.Count > 0 && !settings.Laws.Contains(settings.DecideBy))
            section.Refuse("decide_by", $"the law \"{settings.DecideBy}\", which is not among laws", $"one of {string.Join(", ", settings.Laws)}", "add it to laws or decide by another");
        if (settings.Laws.Distinct().Count() < settings.Laws.Count) section.Refuse("laws", "a law named twice", "each law once", "remove one");
        if (section.Table.Find("laws")?.Node is TomlList { Items.Count: 0 }) section.Refuse("laws", "no law", "at least one law", "name the laws to fit");
        if (section.Table.Find("standard_rates")?.Node is TomlList { Items.Count: 0 }) section.Refuse("standard_rates", "no shear rate", "at least one", "name the study's standard shear rates");
        for (var i = 1; i < settings.StandardRates.Count; i++)
        {
            if (settings.StandardRates[i].ReciprocalSeconds <= settings.StandardRates[i - 1].ReciprocalSeconds)
            {
                section.Refuse("standard_rates", $"{settings.StandardRates[i]} after {settings.StandardRates[i - 1]}", "ascending shear rates, each once", "put them in ascending order");
                break;
            }
        }

        return settings;
    }

    private static StandardHematocrit Standard(SectionReader section) => new(
        Hematocrit.FromLiterPerLiter(section.Amount("hematocrit")),
        section.Text("decide_by") == "study-slope" ? StandardisingRule.StudySlope : StandardisingRule.PlasmaPower);

    private ReferenceSettings Reference(SectionReader section, AnalysisSettings analysis)
    {
        var asked = new HashSet<(ShearRate, bool)>();
        return new(section.Truth("from_controls"), Each(section.Table, "[[reference.declared]]", declared => Declared(declared, analysis, asked)));
    }

    private static DeclaredLimits Declared(SectionReader section, AnalysisSettings analysis, HashSet<(ShearRate, bool)> asked)
    {
        var limits = new DeclaredLimits(
            ShearRate.FromReciprocalSeconds(section.Amount("rate")),
            section.Truth("at_standard_hematocrit"),
            Viscosity.FromPascalSeconds(section.Amount("lower")),
            Viscosity.FromPascalSeconds(section.Amount("upper")),
            section.Text("source"));
        if (limits.Upper.PascalSeconds <= limits.Lower.PascalSeconds) section.Refuse("upper", "an upper limit that is not above the lower", "upper > lower", "correct one of the two");
        if (!asked.Add((limits.Rate, limits.AtStandardHematocrit)))
            section.Refuse("rate", $"limits at {limits.Rate} a second time", "one pair of limits for each rate and hematocrit", "remove one of the two");
        if (!double.IsNaN(limits.Rate.ReciprocalSeconds) && analysis.StandardRates.Count > 0 && !analysis.StandardRates.Contains(limits.Rate))
            section.Refuse("rate", $"limits at {limits.Rate}", $"one of standard_rates: {string.Join(", ", analysis.StandardRates)}", "add the rate to standard_rates or correct it");
        return limits;
    }

    private static Group Group(SectionReader section) => new(section.Text("code"), section.Text("label"), section.Truth("controls"));

    private void CheckTogether(TomlTable root, Study study)
    {
        Once(root, "layouts", "name");
        Once(root, "instruments", "name");
        Once(root, "geometries", "name");
        Once(root, "fluids", "name");
        Once(root, "counters", "name");
        Once(root, "groups", "code");
        Need(root, study.Layouts.Count, "[[layouts]]");
        Need(root, study.Instruments.Count, "[[instruments]]");
        if (study.Files.Checks.Count > 0) Need(root, study.Fluids.Count, "[[fluids]]");
        var bySpeed = study.Layouts.FirstOrDefault(layout => layout.Fields.Any(field => field.Meaning == FieldMeaning.Torque) && !layout.Fields.Any(field => field.Meaning == FieldMeaning.ShearStress));
        if (bySpeed is not null) Need(root, study.Geometries.Count, "[[geometries]]");
        if (study.Groups.Count > 0 && study.Files.People is null && root.Find("files") is { } files)
            _faults.Add(files.Line, files.Column, "groups without a people table", "people = \"people.csv\" in [files]", "add the table with person and group");
        if (study.Files.People is not null) Need(root, study.Groups.Count, "[[groups]]");
        if (study.Reference.FromControls && !study.Groups.Any(group => group.Controls) && root.Find("reference") is { } reference)
            _faults.Add(reference.Line, reference.Column, "from_controls = true without a control group", "one of [[groups]] with controls = true", "mark the control group, or write from_controls = false and declare limits");
    }

    private void Need(TomlTable root, int count, string section)
    {
        if (count == 0 && root.Find(section.Trim('[', ']')) is null) _faults.Add(root, $"no section {section}", "at least one", "add it; the template shows how");
    }

    private void Once(TomlTable root, string section, string key)
    {
        if (root.Find(section)?.Node is not TomlList list) return;
        var named = list.Items.OfType<TomlTable>().Select(table => table.Find(key)?.Node).OfType<TomlScalar>().Where(scalar => scalar.Value is string);
        foreach (var same in named.GroupBy(scalar => (string)scalar.Value!).Where(same => same.Count() > 1))
            foreach (var later in same.Skip(1))
                _faults.Add(later, $"a second one of [[{section}]] with the {key} \"{same.Key}\"", $"each {key} once", $"the first is at line {same.First().Line}; rename or remove one");
    }
}
