namespace HemoRheo.Tests.Exports;

/// <summary>The samples and people tables: what cannot be read is withheld, never rescaled, and told without any text of people.</summary>
public sealed class BadTableTests
{
    [Fact]
    public void A_sample_without_hematocrit_is_kept_and_told()
    {
        var readings = Read(folder => folder.AddSample("S-1", "P-1", hematocrit: ""));
        Assert.Null(Assert.Single(readings.Samples).Hematocrit);
        Assert.Equal((ExportFindings.SampleWithoutHematocrit, 2, 5, "S-1"), (Assert.Single(readings.Findings).Kind, readings.Findings[0].Where.Line, readings.Findings[0].Where.Column, readings.Findings[0].Where.Sample));
        Assert.Contains("expected a number in a column such as hematocrit [L/L]", readings.Findings[0].Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("L/L", "45", "per cent")]
    [InlineData("L/L", "1", "per cent")]
    [InlineData("%", "0.45", "L/L")]
    [InlineData("L/L", "0", "0.01 to 1")]
    [InlineData("%", "145", "1 to 100")]
    [InlineData("L/L", "-0.4", "0.01 to 1")]
    public void A_hematocrit_in_the_other_unit_is_withheld_and_not_rescaled(string unit, string hematocrit, string says)
    {
        var readings = Read(folder => folder.AddSample("S-1", "P-1", hematocrit), header: StudyFolder.SamplesHeader.Replace("[L/L]", $"[{unit}]", StringComparison.Ordinal));
        Assert.Null(Assert.Single(readings.Samples).Hematocrit);
        var finding = Assert.Single(readings.Findings);
        Assert.Equal((ExportFindings.HematocritImpossible, "samples.csv", 2, 5), (finding.Kind, finding.Where.File, finding.Where.Line, finding.Where.Column));
        Assert.Contains(says, finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_hematocrit_in_per_cent_is_read_where_the_header_says_so()
    {
        var readings = Read(folder => folder.AddSample("S-1", "P-1", "45"), header: StudyFolder.SamplesHeader.Replace("[L/L]", "[%]", StringComparison.Ordinal));
        Assert.Empty(readings.Findings);
        Assert.Equal(0.45, readings.Samples[0].Hematocrit!.Value.LiterPerLiter, 1e-15);
    }

    [Theory]
    [InlineData("plasma_viscosity", "without a unit")]
    [InlineData("plasma_viscosity [MPa.s]", "MPa.s")]
    public void A_column_without_a_known_unit_is_not_read(string header, string says)
    {
        var readings = Read(folder => folder.AddSample("S-1", "P-1"), header: StudyFolder.SamplesHeader.Replace("plasma_viscosity [mPa.s]", header, StringComparison.Ordinal));
        Assert.Null(readings.Samples[0].PlasmaViscosity);
        var finding = Assert.Single(readings.Findings);
        Assert.Equal((ExportFindings.TableColumnUnit, 1, 7), (finding.Kind, finding.Where.Line, finding.Where.Column));
        Assert.Contains(says, finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Two_samples_with_one_identifier_are_both_set_aside()
    {
        var readings = Read(folder => folder.AddSample("S-1", "P-1").AddSample("S-1", "P-2").AddSample("S-2", "P-2"), rows: "S-2");
        Assert.Equal("S-2", Assert.Single(readings.Samples).Sample);
        Assert.Equal([2, 3], readings.Findings.Where(finding => finding.Kind == ExportFindings.RowTwice).Select(finding => finding.Where.Line!.Value));
    }

    [Theory]
    [InlineData("name")]
    [InlineData("Date of birth")]
    [InlineData("patient_email")]
    [InlineData("record-number")]
    public void A_column_that_looks_like_a_direct_identifier_refuses_the_table(string column)
    {
        var readings = Read(
            folder => folder.Write("samples.csv", $"sample,person,{column}\nS-1,P-1,Jane Doe\n"));
        Assert.Empty(readings.Samples);
        var finding = Assert.Single(readings.Findings, finding => finding.Kind == ExportFindings.DirectIdentifierColumn);
        Assert.Equal(("samples.csv", 1, 3), (finding.Where.File, finding.Where.Line, finding.Where.Column));
        Assert.DoesNotContain("Jane", string.Concat(readings.Findings), StringComparison.Ordinal);
    }

    [Fact]
    public void An_allowed_column_may_stand_there_and_is_not_read()
    {
        var readings = Read(
            folder => folder.Write("samples.csv", "sample,person,collection_name,hematocrit [L/L],counter\nS-1,P-1,Jane Doe,0.45,centrifuge\n").Write("people.csv", "person,group\nP-1,A\n"),
            study: Study.Template().Replace("# allowed_columns", "allowed_columns", StringComparison.Ordinal));
        Assert.Single(readings.Samples);
        Assert.Equal(ExportFindings.ColumnsNotRead, Assert.Single(readings.Findings).Kind);
        Assert.DoesNotContain("Jane", readings.Samples[0].ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void An_unknown_column_is_told_with_the_nearest()
    {
        var readings = Read(folder => folder.AddSample("S-1", "P-1"), header: StudyFolder.SamplesHeader.Replace("drawn_at", "drawn", StringComparison.Ordinal));
        var finding = Assert.Single(readings.Findings);
        Assert.Equal((ExportFindings.TableColumnUnknown, 4), (finding.Kind, finding.Where.Column));
    }

    [Fact]
    public void Semicolons_in_a_table_are_told()
    {
        var readings = Read(folder => folder.Write("samples.csv", "sample;person\nS-1;P-1\n"));
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.TableColumnMissing && finding.Where.Column == 1 && finding.Message.Contains("semicolons", StringComparison.Ordinal));
    }

    [Fact]
    public void A_missing_column_is_told_with_the_column_of_the_nearest_header()
    {
        var readings = Read(folder => folder.Write("samples.csv", "person,smaple\nP-1,S-1\n"));
        var finding = Assert.Single(readings.Findings, finding => finding.Kind == ExportFindings.TableColumnMissing);
        Assert.Equal((1, 2), (finding.Where.Line, finding.Where.Column));
        Assert.Contains("expected it in the header row; the nearest header is \"smaple\"", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_sample_without_person_in_table_and_exports_is_told_with_its_column()
    {
        var readings = Read(folder => folder.AddSample("S-1", ""));
        var finding = Assert.Single(readings.Findings, finding => finding.Kind == ExportFindings.IdentifierMissing && finding.Where.File == "samples.csv");
        Assert.Equal(("samples.csv", 2, 2), (finding.Where.File, finding.Where.Line, finding.Where.Column));
        Assert.Contains("expected a pseudonym", finding.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("<script>alert(1)</script>")]
    [InlineData("=HYPERLINK(\"\"x\"\")")]
    [InlineData("-2+3")]
    [InlineData("../../S-1")]
    [InlineData("Jane Doe")]
    public void A_name_that_is_markup_or_a_formula_is_kept_as_data_and_not_repeated(string name)
    {
        var quoted = $"\"{name}\"";
        var plain = name.Replace("\"\"", "\"", StringComparison.Ordinal);
        var readings = Read(folder => folder.AddSample(quoted, "P-1"), rows: quoted);
        Assert.Equal(plain, Assert.Single(readings.Blood).Sample);
        Assert.Equal(plain, Assert.Single(readings.Samples).Sample);
        Assert.Equal([ExportFindings.IdentifierUnusual, ExportFindings.IdentifierUnusual], readings.Findings.Select(finding => finding.Kind));
        Assert.All(readings.Findings, finding => Assert.DoesNotContain(plain, finding.ToString(), StringComparison.Ordinal));
    }

    [Fact]
    public void Names_that_the_study_does_not_declare_are_told()
    {
        var readings = Read(folder => folder.AddSample("S-1", "P-1", group: "C").Write("samples.csv", StudyFolder.SamplesHeader + "S-1,P-1,1,,0.45,centrifugal,1.22,37,R1\n"));
        Assert.Empty(readings.People);
        Assert.Null(readings.Samples[0].Counter);
        Assert.Equal(2, readings.Findings.Count(finding => finding.Kind == ExportFindings.NameUndeclared));
        Assert.Contains(readings.Findings, finding => finding.Message.Contains("\"centrifuge\"", StringComparison.Ordinal));
    }

    [Fact]
    public void Values_that_cannot_be_are_withheld()
    {
        var readings = Read(folder => folder.AddSample("S-1", "P-1").Write("samples.csv", StudyFolder.SamplesHeader + "S-1,P-1,0,,\"0,45\",centrifuge,-1.22,370,R1\n"));
        var sample = Assert.Single(readings.Samples);
        Assert.Equal((null, null, null), (sample.Hematocrit, sample.PlasmaViscosity, sample.PlasmaTemperature));
        Assert.Equal([3, 5, 7, 8], readings.Findings.Select(finding => finding.Where.Column!.Value).Order());
    }

    private static StudyReadings Read(Action<StudyFolder> fill, string? header = null, string rows = "S-1", string? study = null)
    {
        using var folder = StudyFolder.Valid();
        if (study is not null) folder.Write("study.toml", study);
        if (header is not null) folder.Write("samples.csv", header);
        fill(folder);
        folder.Write("exports/a.csv", StudyFolder.RowsHeader + StudyFolder.Row(rows, "120", "7,5"));
        return Study.Open(folder.StudyFile).ReadExports();
    }
}
