namespace HemoRheo.Tests.Exports;

/// <summary>Files that end in the middle: what stands before the cut is kept, and the recording is marked.</summary>
public sealed class CutFileTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    [InlineData(40)]
    public void Rows_cut_in_the_last_line_keep_the_rows_before(int cut)
    {
        var text = StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5") + StudyFolder.Row("S-1", "60", "4,25");

        var readings = Read("a.csv", text[..^cut]);

        var recording = Assert.Single(readings.Blood);
        Assert.Equal(7.5e-6, Assert.Single(recording.Readings).Torque!.Value, 1e-18);
        var finding = Assert.Single(recording.Findings);
        Assert.Equal((ExportFindings.FileCut, "exports/a.csv", 3, "S-1"), (finding.Kind, finding.Where.File, finding.Where.Line, finding.Where.Sample));
        Assert.True(recording.HasFault);
        Assert.Contains(finding, readings.Findings);
    }

    [Fact]
    public void Blocks_cut_in_the_last_number_keep_the_readings_before()
    {
        var text = StudyFolder.Block("S-1", [("100", "420.5"), ("10", "62.25")]);

        var recording = Assert.Single(Read("b.txt", text[..^3]).Blood);

        Assert.Equal(0.4205, Assert.Single(recording.Readings).Stress!.Value, 1e-15);
        var finding = Assert.Single(recording.Findings);
        Assert.Equal((ExportFindings.FileCut, 8), (finding.Kind, finding.Where.Line));
    }

    [Fact]
    public void A_block_cut_between_lines_is_told_by_its_number_of_readings()
    {
        var text = StudyFolder.Block("S-1", [("100", "420.5"), ("10", "62.25"), ("1", "11")]);

        var recording = Assert.Single(Read("b.txt", text[..text.LastIndexOf("down", StringComparison.Ordinal)]).Blood);

        Assert.Equal(2, recording.Readings.Count);
        var finding = Assert.Single(recording.Findings);
        Assert.Equal((ExportFindings.FileCut, 5), (finding.Kind, finding.Where.Line));
        Assert.Contains("Found 2 readings, expected the 3", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_block_cut_in_its_keys_gives_no_recording_and_is_told()
    {
        var readings = Read("b.txt", StudyFolder.Block("S-2", [("100", "420.5")]) + "Sample: S-1\nLoad");
        Assert.Equal("S-2", Assert.Single(readings.Blood).Sample);
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.FileCut && finding.Where is { Line: 9, Sample: "S-1" });
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.RecordingWithoutReadings && finding.Where.Sample == "S-1");
    }

    [Fact]
    public void A_header_cut_in_the_middle_is_told()
    {
        var finding = Assert.Single(Read("a.csv", StudyFolder.RowsHeader[..30]).Files[0].Findings, finding => finding.Kind == ExportFindings.FileCut);
        Assert.Equal((1, 31), (finding.Where.Line, finding.Where.Column));
    }

    [Fact]
    public void A_layout_may_say_that_whole_files_end_without_a_line_end()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("study.toml", Study.Template().Replace("# last_line_ends", "last_line_ends", StringComparison.Ordinal));
        folder.Write("exports/a.csv", (StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5")).TrimEnd('\n'));

        var readings = Study.Open(folder.StudyFile).ReadExports();

        Assert.Empty(readings.Findings);
        Assert.Single(Assert.Single(readings.Blood).Readings);
    }

    private static StudyReadings Read(string name, string text)
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1").AddSample("S-2", "P-1");
        folder.Write($"exports/{name}", text);
        return Study.Open(folder.StudyFile).ReadExports();
    }
}
