using System.Text;

namespace HemoRheo.Tests.Studies;

/// <summary>Each fault of a study file is told with its line, its column, what was found, what was expected and what to do. The sign ¦ marks the place.</summary>
public sealed class StudyFileFaultTests
{
    [Theory]
    [InlineData("torque_zero = ", "¦torque_zer = ", "the unknown key \"torque_zer\"", "did you mean \"torque_zero\"?")]
    [InlineData("[blood]", "[¦bloot]", "the unknown key \"bloot\"", "did you mean \"blood\"?")]
    [InlineData("plasma_uncertainty = ", "¦inner_radius = ", "the unknown key \"inner_radius\"", "[[geometries]]")]
    [InlineData("[[geometries]] ", "[[¦geometries]]\nwidth = 1 ", "no \"name\" in [[geometries]]", "add it", "name = \"CYL-1\"\n", "")]
    [InlineData("seed = 1 ", "seed = ¦\"one\" ", "the text \"one\"", "seed = 20261201")]
    [InlineData("seed = 1 ", "seed = ¦1.5 ", "the number 1.5", "seed = 20261201")]
    [InlineData("inner_radius = \"12.5 mm\"", "inner_radius = ¦\"-12.5 mm\"", "-12.5 mm", "correct inner_radius")]
    [InlineData("inner_radius = \"12.5 mm\"", "inner_radius = ¦\"12,5 mm\"", "decimal comma", "\"12.5 mm\"")]
    [InlineData("inner_radius = \"12.5 mm\"", "inner_radius = ¦\"12.5 Mm\"", "unit \"Mm\" is unknown for this quantity; the nearest is \"mm\"", "\"12.5 mm\"")]
    [InlineData("inner_radius = \"12.5 mm\"", "inner_radius = ¦12.5", "the number 12.5", "\"12.5 mm\"")]
    [InlineData("outer_radius = \"13.56 mm\"", "outer_radius = ¦\"12.5 mm\"", "not larger than the inner one", "correct one of the two")]
    [InlineData("viscosity = \"4.85 mPa.s\"", "viscosity = ¦\"4.85 MPa.s\"", "unit \"MPa.s\" is unknown", "mPa.s")]
    [InlineData("coverage_factor = 2      ", "coverage_factor = ¦0      ", "the number 0", "correct coverage_factor")]
    [InlineData("coverage_factor = 2      ", "coverage_factor = ¦inf      ", "the number Infinity", "correct coverage_factor")]
    [InlineData("[[fluids]]\nname = \"oil-5\"", "[[¦fluids]]\nname = \"oil-5\"", "no \"coverage_factor\" in [[fluids]]", "add it", "coverage_factor = 2                       #", "#")]
    [InlineData("[[fluids]]\nname = \"oil-5\"", "[[¦fluids]]\nname = \"oil-5\"", "no \"per_kelvin\" for the certified fluid", "add per_kelvin", "per_kelvin = \"2.2 %/K\"", "")]
    [InlineData("kind = \"water\" ", "at = ¦\"37 °C\"\nkind = \"water\" ", "\"at\" for water", "remove at")]
    [InlineData("kind = \"water\" ", "kind = ¦\"watr\" ", "the text \"watr\"", "did you mean \"water\"?")]
    [InlineData("level = 0.95", "level = ¦0.5", "the number 0.5", "correct level")]
    [InlineData("level = 0.95", "level = ¦1", "the number 1", "correct level")]
    [InlineData("# point_correlation = 0.3", "point_correlation = ¦1", "the number 1", "correct point_correlation")]
    [InlineData("# point_correlation = 0.3", "point_correlation = ¦-0.1", "the number -0.1", "correct point_correlation")]
    [InlineData("[\"1 1/s\", \"10 1/s\", \"100 1/s\"]", "¦[\"10 1/s\", \"1 1/s\"]", "1 1/s after 10 1/s", "ascending order")]
    [InlineData("[\"1 1/s\", \"10 1/s\", \"100 1/s\"]", "[\"1 1/s\", ¦\"-10 1/s\"]", "-10 1/s", "correct standard_rates")]
    [InlineData("[\"1 1/s\", \"10 1/s\", \"100 1/s\"]", "[¦1, \"10 1/s\"]", "the number 1", "1 1/s")]
    [InlineData("\"Casson\", \"Quemada\"]", "¦\"Cason\", \"Quemada\"]", "the text \"Cason\"", "did you mean \"Casson\"?")]
    [InlineData("laws = [\"Newtonian\", \"Casson\", \"Quemada\"]\ndecide_by = \"Quemada\"", "laws = [\"Newtonian\", \"Casson\"]\ndecide_by = ¦\"Quemada\"", "not among laws", "decide by another")]
    [InlineData("name = \"water\"", "name = ¦\"oil-5\"", "a second one of [[fluids]] with the name \"oil-5\"", "rename or remove one")]
    [InlineData("[[geometries]] ", "[[instruments]]\nname = ¦\"R1\"\ntorque_zero = \"0 N.m\"\nthermometer = \"0 K\"\ncheck_every = \"8 d\"\ncheck_limit = \"3 %\"\n[[geometries]] ", "a second one of [[instruments]]", "rename or remove one")]
    [InlineData("hematocrit = \"0.45 L/L\"", "hematocrit = ¦\"45 L/L\"", "45 L/L", "did you mean 45 %?")]
    [InlineData("hematocrit = \"0.45 L/L\"", "hematocrit = ¦45", "the number 45", "\"0.45 L/L\"")]
    [InlineData("exports = [\"exports\"]", "exports = [¦\"export\"]", "no file \"export\"", "correct the path")]
    [InlineData("exports = [\"exports\"]", "exports = [¦\"../elsewhere\"]", "leads out of the study's folder", "move the data into the folder")]
    [InlineData("exports = [\"exports\"]", "exports = [¦\"/etc/hosts\"]", "an absolute path", "relative to the study file")]
    [InlineData("samples = \"samples.csv\"", "samples = ¦\"exports\"", "the folder \"exports\"", "name the file itself")]
    [InlineData("samples = \"samples.csv\"", "samples = ¦\"sam\\u0000ples.csv\"", "zero character", "correct the path")]
    [InlineData("time_format = \"yyyy-MM-dd HH:mm:ss zzz\"", "time_format = ¦\"yyyy-MM-dd HH:mm:ss\"", "a time format without offset", "the hour when clocks go back happens twice")]
    [InlineData("speed = { header = \"speed [rpm]\", unit = \"rpm\" }", "speed = { header = \"speed [rpm]\", unit = ¦\"rad/s\" }", "the unit \"rad/s\" for a header that says \"rpm\"", "correct header or unit")]
    [InlineData("header = \"torque [µN.m]\", unit = \"µN.m\"", "header = \"Torque µN·m\", unit = ¦\"nN.m\"", "the unit \"nN.m\" for a header that says \"µN·m\"", "correct header or unit")]
    [InlineData("header = \"torque [µN.m]\", unit = \"µN.m\"", "header = \"Torque mN m\", unit = ¦\"µN.m\"", "the unit \"µN.m\" for a header that says \"mN m\"", "correct header or unit")]
    [InlineData("header = \"temperature [°C]\", unit = \"°C\"", "header = \"Temp K\", unit = ¦\"°C\"", "the unit \"°C\" for a header that says \"K\"", "correct header or unit")]
    [InlineData("speed = { header = \"speed [rpm]\", unit = \"rpm\" }", "speed = { header = \"speed [rpm]\", unit = ¦\"RPM\" }", "the unknown unit \"RPM\"", "did you mean \"rpm\"?")]
    [InlineData("speed = { header = \"speed [rpm]\", unit = \"rpm\" }", "speed = ¦{ header = \"speed [rpm]\" }", "no unit for speed", "write the unit")]
    [InlineData("speed = { header = \"speed [rpm]\", unit = \"rpm\" }", "speed = ¦\"speed [rpm]\"", "the text \"speed [rpm]\"", "header and unit in braces")]
    [InlineData("speed = { header = \"speed [rpm]\", unit = \"rpm\" }", "speed = { header = \"speed [rpm]\", unit = \"rpm\", ¦units = \"rpm\" }", "the unknown key \"units\"", "did you mean \"unit\"?")]
    [InlineData("encoding = \"utf-8\" ", "encoding = ¦\"utf-9\" ", "the unknown encoding \"utf-9\"", "correct encoding")]
    [InlineData("separator = \";\"", "separator = ¦\",\"", "a separator that is also the decimal sign", "correct separator or decimal_sign")]
    [InlineData("separator = \";\"", "separator = ¦\";;\"", "the text \";;\"", "one character")]
    [InlineData("check_every = \"8 d\"", "check_every = ¦\"1e9 d\"", "more than", "correct it")]
    [InlineData("# adjusted = [2026-03-02T09:00:00+01:00]", "adjusted = [¦2026-03-02T09:00:00]", "a date or time without an offset", "2026-03-02T09:00:00+01:00")]
    [InlineData("[[groups]]\ncode = \"A\"", "[[reference.declared]]\nrate = \"10 1/s\"\nat_standard_hematocrit = true\nlower = \"5 mPa.s\"\nupper = \"8 mPa.s\"\nsource = \"a\"\n[[reference.declared]]\nrate = ¦\"10 1/s\"\nat_standard_hematocrit = true\nlower = \"5 mPa.s\"\nupper = \"8 mPa.s\"\nsource = \"a\"\n[[groups]]\ncode = \"A\"", "limits at 10 1/s a second time", "remove one of the two")]
    [InlineData("people = \"people.csv\"", "#", "groups without a people table", "add the table", "[files]", "[¦files]")]
    [InlineData("\ncontrols = true", "\ncontrols = false", "from_controls = true without a control group", "mark the control group", "[reference]", "[¦reference]")]
    [InlineData("[standard_hematocrit]\nhematocrit = \"0.45 L/L\"\ndecide_by = \"plasma-power\"", "", "no section [standard_hematocrit]", "the template shows how", "# A study", "¦# A study")]
    public void A_fault_is_told_with_its_place(string text, string wrong, string found, string cure, string also = "", string alsoWrong = "")
    {
        var file = ReplaceFirst(Study.Template(), text, wrong);
        if (also.Length > 0) file = ReplaceFirst(file, also, alsoWrong);
        var at = file.IndexOf('¦', StringComparison.Ordinal);
        var line = file[..at].Count(sign => sign == '\n') + 1;
        var column = at - (at == 0 ? -1 : file.LastIndexOf('\n', at - 1));

        var thrown = Thrown(file.Remove(at, 1));

        var fault = Assert.Single(thrown.Faults, fault => fault.Found.Contains(found, StringComparison.Ordinal));
        Assert.Equal(("study.toml", line, column), (fault.File, fault.Line, fault.Column));
        Assert.Contains(cure, fault.WhatToDo + fault.Expected, StringComparison.Ordinal);
        Assert.Contains($"study.toml:{line}:{column}: found ", thrown.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void All_faults_of_a_file_are_told_together_in_file_order()
    {
        var file = Study.Template().Replace("seed = 1 ", "sed = 1 ", StringComparison.Ordinal).Replace("level = 0.95", "level = 95", StringComparison.Ordinal).Replace("\"0.1 K\"", "\"0.1 C\"", StringComparison.Ordinal);

        var faults = Thrown(file).Faults;

        Assert.Equal(4, faults.Count);
        Assert.Equal(faults.OrderBy(fault => fault.Line), faults);
    }

    [Theory]
    [InlineData("Torque µN·m")]
    [InlineData("Torque µN m")]
    [InlineData("Torque")]
    [InlineData("Torque 1")]
    [InlineData("Torque m")]
    [InlineData("µN.m")]
    public void A_header_that_says_the_declared_unit_without_brackets_or_none_is_taken(string header)
    {
        using var folder = StudyFolder.Valid();
        folder.Write("study.toml", ReplaceFirst(Study.Template(), "torque [µN.m]", header));
        Assert.Contains(Study.Open(folder.StudyFile).Layouts[0].Fields, field => field.Header == header);
    }

    [Fact]
    public void Text_that_is_not_TOML_is_told_with_its_place()
    {
        var fault = Assert.Single(Thrown(Study.Template().Replace("seed = 1 ", "seed = = ", StringComparison.Ordinal)).Faults);
        Assert.Equal(6, fault.Line);
    }

    [Fact]
    public void One_open_quote_is_one_fault_with_what_the_parser_says_of_it()
    {
        var fault = Assert.Single(Thrown(Study.Template().Replace("name = \"My study\"", "name = \"My study", StringComparison.Ordinal)).Faults);
        Assert.Equal(5, fault.Line);
        Assert.Matches(@"^text that is not TOML \(.+\)$", fault.Found);
        Assert.DoesNotContain("nvalid", fault.Expected, StringComparison.Ordinal);
        Assert.Contains("open quote", fault.WhatToDo, StringComparison.Ordinal);
    }

    [Fact]
    public void Bytes_that_are_not_UTF_8_are_told_with_their_place()
    {
        using var folder = StudyFolder.Valid();
        folder.Write("study.toml", [.. "name = \"a\"\nseed = é"u8[..^2], 0xE9]);
        var fault = Assert.Single(Assert.Throws<StudyFileException>(() => Study.Open(folder.StudyFile)).Faults);
        Assert.Equal((2, 8), (fault.Line, fault.Column));
    }

    [Fact]
    public void A_link_that_leads_out_of_the_folder_is_refused()
    {
        using var elsewhere = StudyFolder.Empty().Write("samples.csv", StudyFolder.SamplesHeader);
        using var folder = StudyFolder.Valid();
        File.Delete(folder.PathOf("samples.csv"));
        File.CreateSymbolicLink(folder.PathOf("samples.csv"), elsewhere.PathOf("samples.csv"));

        var fault = Assert.Single(Assert.Throws<StudyFileException>(() => Study.Open(folder.StudyFile)).Faults);

        Assert.Contains("a link that leads out of the study's folder", fault.Found, StringComparison.Ordinal);
        Assert.Equal((12, 11), (fault.Line, fault.Column));
    }

    [Fact]
    public void A_study_file_that_is_not_there_is_misuse() =>
        Assert.Contains("no study file", Assert.Throws<FileNotFoundException>(() => Study.Open(Path.Combine(Repository.Root, "nowhere.toml"))).Message, StringComparison.Ordinal);

    [Fact]
    public void Damaged_files_throw_faults_and_nothing_else()
    {
        using var folder = StudyFolder.Valid();
        var random = new Random(20261201);
        for (var round = 0; round < 400; round++)
        {
            var text = new StringBuilder(Study.Template());
            for (var change = random.Next(1, 4); change > 0; change--)
            {
                var at = random.Next(text.Length - 20);
                if (random.Next(2) == 0) text.Remove(at, random.Next(1, 20));
                else text.Insert(at, "\"[]{}=.,#\n1-e\0\u00e9"[random.Next(15)]);
            }

            folder.Write("study.toml", text.ToString());
            var thrown = Record.Exception(() => Study.Open(folder.StudyFile));
            Assert.True(thrown is null or StudyFileException { Faults.Count: > 0 }, $"round {round}: {thrown}");
        }
    }

    private static StudyFileException Thrown(string text)
    {
        using var folder = StudyFolder.Valid();
        folder.Write("study.toml", text);
        return Assert.Throws<StudyFileException>(() => Study.Open(folder.StudyFile));
    }

    private static string ReplaceFirst(string text, string old, string with)
    {
        var at = text.IndexOf(old, StringComparison.Ordinal);
        Assert.True(at >= 0, $"the template has no {old}");
        return text.Remove(at, old.Length).Insert(at, with);
    }
}
