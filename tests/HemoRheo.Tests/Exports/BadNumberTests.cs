namespace HemoRheo.Tests.Exports;

/// <summary>Numbers, units and columns that are not what the layout declares. Nothing is reinterpreted.</summary>
public sealed class BadNumberTests
{
    private const int TorqueColumn = 12;

    [Theory]
    [InlineData("7.5")]
    [InlineData("1.234")]
    public void A_decimal_point_where_a_comma_is_declared_refuses_the_file(string torque)
    {
        var readings = Rows(StudyFolder.Row("S-1", "120", "7,5") + StudyFolder.Row("S-1", "60", torque));

        Assert.Empty(readings.Blood);
        var finding = Assert.Single(readings.Files[0].Findings);
        Assert.Equal((ExportFindings.DecimalSignDiffers, 3, TorqueColumn), (finding.Kind, finding.Where.Line, finding.Where.Column));
        Assert.Contains($"\"{torque}\"", finding.Message, StringComparison.Ordinal);
        Assert.Contains("torque [µN.m]", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_decimal_comma_where_a_point_is_declared_refuses_the_file()
    {
        var readings = Blocks(StudyFolder.Block("S-1", [("100", "\"420,5\"")]));
        Assert.Empty(readings.Blood);
        var finding = Assert.Single(readings.Files[0].Findings);
        Assert.Equal((ExportFindings.DecimalSignDiffers, 7, 5), (finding.Kind, finding.Where.Line, finding.Where.Column));
    }

    [Fact]
    public void A_decimal_comma_between_commas_is_one_field_too_many_and_kept_out()
    {
        var recordings = Blocks(StudyFolder.Block("S-1", [("100", "420.5"), ("10", "62,25")])).Blood;
        Assert.Single(recordings[0].Readings);
        var finding = Assert.Single(recordings[0].Findings);
        Assert.Equal((ExportFindings.FieldCountDiffers, 8, 6), (finding.Kind, finding.Where.Line, finding.Where.Column));
        Assert.Contains("decimal comma", finding.Kind.UsualCause, StringComparison.Ordinal);
        Assert.True(recordings[0].HasFault);
    }

    [Theory]
    [InlineData("NaN")]
    [InlineData("nan")]
    [InlineData("Infinity")]
    [InlineData("-inf")]
    [InlineData("∞")]
    [InlineData("1e999")]
    [InlineData("#DIV/0!")]
    public void A_number_spelled_as_none_is_told_and_its_reading_kept_out(string torque)
    {
        var readings = Rows(StudyFolder.Row("S-1", "120", torque) + StudyFolder.Row("S-1", "60", "4,25"));

        var kept = Assert.Single(readings.Blood[0].Readings);
        Assert.Equal((2, 3), (kept.Number, kept.Where.Line));
        var finding = Assert.Single(readings.Files[0].Findings);
        Assert.Equal((ExportFindings.NotFinite, 2, TorqueColumn, 1), (finding.Kind, finding.Where.Line, finding.Where.Column, finding.Where.Point));
        Assert.False(readings.Blood[0].HasFault);
    }

    [Theory]
    [InlineData("overload")]
    [InlineData("7,5 µN.m")]
    [InlineData("7,5,0")]
    [InlineData("1 234")]
    [InlineData("5,")]
    [InlineData("0x10")]
    public void A_word_in_a_column_of_numbers_is_told_and_its_reading_kept_out(string torque)
    {
        var readings = Rows(StudyFolder.Row("S-1", "120", torque) + StudyFolder.Row("S-1", "60", "4,25"));
        Assert.Single(readings.Blood[0].Readings);
        var finding = Assert.Single(readings.Files[0].Findings);
        Assert.Equal(ExportFindings.NotANumber, finding.Kind);
        Assert.Equal(TorqueColumn, finding.Where.Column);
    }

    [Theory]
    [InlineData("0", 0)]
    [InlineData("-1.5", -1.5)]
    public void A_shear_rate_of_zero_or_less_is_told_and_its_reading_kept(string rate, double value)
    {
        var readings = Blocks(StudyFolder.Block("S-1", [("100", "420.5"), (rate, "62.25")]));

        Assert.Equal(value, readings.Blood[0].Readings[1].Rate);
        var finding = Assert.Single(readings.Findings);
        Assert.Equal((ExportFindings.RateNotPositive, 8, 4, value, 0.0), (finding.Kind, finding.Where.Line, finding.Where.Column, finding.Observed, finding.Limit));
    }

    [Fact]
    public void A_stress_of_zero_or_less_is_told_and_its_reading_kept()
    {
        var readings = Blocks(StudyFolder.Block("S-1", [("100", "-0.5")]));
        Assert.Equal(-0.0005, readings.Blood[0].Readings[0].Stress);
        Assert.Equal(ExportFindings.StressNotPositive, Assert.Single(readings.Findings).Kind);
    }

    [Fact]
    public void An_empty_field_is_told()
    {
        var readings = Rows(StudyFolder.Row("S-1", "120", "") + StudyFolder.Row("S-1", "60", "4,25", temperature: ""));
        Assert.Null(Assert.Single(readings.Blood[0].Readings).Temperature);
        Assert.Equal([(2, 12), (3, 8)], readings.Findings.Select(finding => (finding.Where.Line!.Value, finding.Where.Column!.Value)));
        Assert.All(readings.Findings, finding => Assert.Equal(ExportFindings.FieldEmpty, finding.Kind));
    }

    [Theory]
    [InlineData("torque [µN.m]", "torque [MN.m.]", "unknown-unit", "MN.m.")]
    [InlineData("torque [µN.m]", "torque [nN.m]", "header-unit-differs", "nN.m")]
    [InlineData("torque [µN.m]", "torqe [µN.m]", "column-missing", "torqe [µN.m]")]
    [InlineData("speed asked [rpm]", "torque [µN.m]", "column-twice", "torque [µN.m]")]
    public void A_header_that_is_not_the_declared_one_refuses_the_file(string header, string written, string code, string says)
    {
        var readings = Rows(StudyFolder.Row("S-1", "120", "7,5"), StudyFolder.RowsHeader.Replace(header, written, StringComparison.Ordinal));
        Assert.Empty(readings.Blood);
        var finding = Assert.Single(readings.Files[0].Findings, finding => finding.Code == code);
        Assert.Equal(1, finding.Where.Line);
        Assert.Contains(says, finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_header_with_another_unit_that_stands_without_brackets_refuses_the_file()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("study.toml", Study.Template().Replace("torque [µN.m]", "torque µN·m", StringComparison.Ordinal));
        folder.Write("exports/a.csv", StudyFolder.RowsHeader.Replace("torque [µN.m]", "torque nN·m", StringComparison.Ordinal) + StudyFolder.Row("S-1", "120", "7,5"));

        var finding = Assert.Single(Study.Open(folder.StudyFile).ReadExports().Files[0].Findings);

        Assert.Equal((ExportFindings.HeaderUnitDiffers, 1, TorqueColumn), (finding.Kind, finding.Where.Line, finding.Where.Column));
    }

    [Theory]
    [InlineData("S-1;1;R1\n", 4)]
    [InlineData("S-1;1;R1;CYL-1;;2026-03-02 09:00:00 +01:00;down;37,0;10,0;60;60;4;5\n", 13)]
    public void A_row_of_another_length_is_told_with_the_column_where_it_begins_to_differ(string row, int column)
    {
        var finding = Assert.Single(Rows(StudyFolder.Row("S-1", "120", "7,5") + row).Files[0].Findings);
        Assert.Equal((ExportFindings.FieldCountDiffers, 3, column), (finding.Kind, finding.Where.Line, finding.Where.Column));
    }

    [Fact]
    public void Columns_and_keys_that_are_not_declared_are_noted()
    {
        var rows = Rows(StudyFolder.Row("S-1", "120", "7,5").Replace("\n", ";x\n", StringComparison.Ordinal), StudyFolder.RowsHeader.Replace("\n", ";operator\n", StringComparison.Ordinal));
        Assert.Equal((ExportFindings.ColumnsNotRead, "Columns not read: \"operator\"."), (Assert.Single(rows.Findings).Kind, rows.Findings[0].Message));
        var blocks = Blocks("Made by: a program\n" + StudyFolder.Block("S-1", [("100", "420.5")]).Replace("Loading:", "Remark: none\nLoading:", StringComparison.Ordinal));
        Assert.Equal([ExportFindings.TextNotRead, ExportFindings.KeysNotRead], blocks.Findings.Select(finding => finding.Kind));
    }

    [Fact]
    public void A_ramp_that_the_layout_does_not_know_is_told_and_left_unstated()
    {
        var readings = Rows(StudyFolder.Row("S-1", "120", "7,5", ramp: "hold"));
        Assert.Equal(Ramp.Unstated, readings.Blood[0].Readings[0].Ramp);
        Assert.Equal((ExportFindings.RampWordUnknown, 7), (Assert.Single(readings.Findings).Kind, readings.Findings[0].Where.Column));
    }

    [Fact]
    public void More_than_a_hundred_findings_of_a_kind_are_counted()
    {
        var readings = Rows(string.Concat(Enumerable.Range(0, 130).Select(_ => StudyFolder.Row("S-1", "120", "off"))));
        Assert.Equal(101, readings.Files[0].Findings.Count(finding => finding.Kind == ExportFindings.NotANumber));
        Assert.Contains(readings.Findings, finding => finding.Observed == 130);
    }

    private static StudyReadings Rows(string rows, string? header = null)
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/a.csv", (header ?? StudyFolder.RowsHeader) + rows);
        return Study.Open(folder.StudyFile).ReadExports();
    }

    private static StudyReadings Blocks(string blocks)
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/b.txt", blocks);
        return Study.Open(folder.StudyFile).ReadExports();
    }
}
