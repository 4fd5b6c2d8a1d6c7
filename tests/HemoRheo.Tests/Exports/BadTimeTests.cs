namespace HemoRheo.Tests.Exports;

/// <summary>Times without an offset are refused: in the night of 25 October 2026 the hour from 2 to 3 happens twice in central Europe.</summary>
public sealed class BadTimeTests
{
    [Fact]
    public void A_time_without_offset_in_an_export_is_refused_and_explained()
    {
        var readings = Read("2026-10-25 02:30:00");
        Assert.Empty(readings.Blood);
        var finding = Assert.Single(readings.Files[0].Findings, finding => finding.Kind == ExportFindings.TimeWithoutOffset);
        Assert.Equal((2, 6), (finding.Where.Line, finding.Where.Column));
        Assert.Contains("one hour happens twice", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void With_offset_the_two_half_past_two_are_an_hour_apart()
    {
        var summer = Read("2026-10-25 02:30:00 +02:00").Blood[0];
        var winter = Read("2026-10-25 02:30:00 +01:00").Blood[0];
        Assert.Equal(TimeSpan.FromHours(1), winter.StartedAt - summer.StartedAt);
        Assert.Equal(new DateOnly(2026, 10, 25), summer.Day);
    }

    [Fact]
    public void The_day_is_the_local_date() => Assert.Equal(new DateOnly(2026, 3, 2), Read("2026-03-02 00:30:00 +01:00").Blood[0].Day);

    [Theory]
    [InlineData("02.03.2026 09:00")]
    [InlineData("2026-02-30 09:00:00 +01:00")]
    public void A_time_in_another_format_is_refused(string time)
    {
        var readings = Read(time);
        Assert.Empty(readings.Blood);
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.TimeNotRead && finding.Where is { Line: 2, Column: 6 });
    }

    [Fact]
    public void A_time_without_offset_in_the_samples_table_is_withheld_and_explained()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1", drawnAt: "2026-10-25T02:30");
        folder.Write("exports/a.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5"));
        var readings = Study.Open(folder.StudyFile).ReadExports();
        Assert.Null(Assert.Single(readings.Samples).DrawnAt);
        var finding = Assert.Single(readings.Findings);
        Assert.Equal((ExportFindings.TimeWithoutOffset, "samples.csv", 2, 4), (finding.Kind, finding.Where.File, finding.Where.Line, finding.Where.Column));
    }

    [Theory]
    [InlineData("2026-03-02T08:00:00Z", 8)]
    [InlineData("2026-03-02T08:00+01:00", 7)]
    [InlineData("2026-03-02 08:00:00-05:00", 13)]
    public void Tables_take_ISO_times_with_offset(string time, int hour)
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1", drawnAt: time);
        Assert.Equal(hour, Study.Open(folder.StudyFile).ReadExports().Samples[0].DrawnAt!.Value.UtcDateTime.Hour);
    }

    private static StudyReadings Read(string time)
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/a.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5", startedAt: time));
        return Study.Open(folder.StudyFile).ReadExports();
    }
}
