namespace HemoRheo.Tests.Exports;

/// <summary>Exports of blank runs: told from blood and checks by the study file's list, with torques about zero.</summary>
public sealed class BlankExportTests
{
    private static readonly string Run = StudyFolder.RowsHeader
        + string.Concat(new[] { "0,003", "-0,002", "0", "-0,001" }.Select((torque, i) => StudyFolder.Row("B-1", i < 2 ? "0" : "60", torque, startedAt: "2026-03-02 07:30:00 +01:00", ramp: "up", temperature: "")));

    [Fact]
    public void A_blank_run_is_read_with_its_torques_about_zero_and_the_lines_they_came_from()
    {
        var readings = Read(folder => folder.Write("blanks/b.csv", Run.Replace(";;10,0;", ";37,0;10,0;", StringComparison.Ordinal)));
        var blank = Assert.Single(readings.Blanks);
        Assert.Empty(readings.Findings);
        Assert.Empty(blank.Findings);
        Assert.Equal((RecordingKind.Blank, "B-1", "R1", "CYL-1", (string?)null), (blank.Kind, blank.Sample, blank.Instrument, blank.Geometry, blank.Fluid));
        Assert.Equal([3e-9, -2e-9, 0, -1e-9], blank.Readings.Select(reading => Math.Round(reading.Torque!.Value, 12)));
        Assert.Equal([("blanks/b.csv", 2), ("blanks/b.csv", 3), ("blanks/b.csv", 4), ("blanks/b.csv", 5)], blank.Readings.Select(reading => (reading.Where.File!, reading.Where.Line!.Value)));
        Assert.Contains(readings.Files, file => file.Path == "blanks/b.csv" && file.Digest.Length == 64);
        Assert.Empty(readings.Checks);
    }

    [Fact]
    public void A_study_that_declares_none_has_none()
    {
        using var folder = StudyFolder.Valid();
        Assert.Empty(Study.Open(folder.StudyFile).Files.Blanks);
        Assert.False(Study.Open(folder.StudyFile).Instruments[0].CorrectTorqueZero);
    }

    [Fact]
    public void Whether_the_zero_is_corrected_stands_in_the_study_file()
    {
        using var folder = StudyFolder.Valid();
        folder.Write("study.toml", Study.Template().Replace("# correct_torque_zero", "correct_torque_zero", StringComparison.Ordinal));
        Assert.True(Study.Open(folder.StudyFile).Instruments[0].CorrectTorqueZero);
    }

    [Fact]
    public void A_folder_of_blank_runs_that_is_not_there_is_refused_with_its_line()
    {
        using var folder = StudyFolder.Valid();
        folder.Write("study.toml", Declared);
        var fault = Assert.Single(Assert.Throws<StudyFileException>(() => Study.Open(folder.StudyFile)).Faults);
        Assert.Equal("no file \"blanks\"", fault.Found);
    }

    [Fact]
    public void A_misspelled_key_is_refused_with_the_nearest()
    {
        using var folder = StudyFolder.Valid();
        folder.Write("study.toml", Declared.Replace("blanks =", "blank =", StringComparison.Ordinal));
        var faults = Assert.Throws<StudyFileException>(() => Study.Open(folder.StudyFile)).Faults;
        Assert.Contains(faults, fault => fault.ToString().Contains("did you mean \"blanks\"?", StringComparison.Ordinal));
    }

    [Fact]
    public void A_file_of_blank_runs_among_the_checks_is_read_from_neither()
    {
        using var folder = StudyFolder.Valid();
        folder.Write("study.toml", Declared.Replace("blanks = [\"blanks\"]", "blanks = [\"checks\"]", StringComparison.Ordinal)).Write("checks/b.csv", Run);
        var readings = Study.Open(folder.StudyFile).ReadExports();
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.FileInBothLists && finding.Where.File == "checks/b.csv");
        Assert.Empty(readings.Blanks);
        Assert.Empty(readings.Checks);
    }

    [Fact]
    public void The_check_table_may_say_of_a_blank_run_what_its_export_does_not()
    {
        var readings = Read(folder => folder
            .Write("study.toml", Declared.Replace("# check_table", "check_table", StringComparison.Ordinal))
            .Write("checks.csv", "check,fluid,instrument,started_at,geometry\nB-1,,R1,2026-03-02T07:00:00+01:00,CYL-1\n")
            .Write("blanks/b.csv", Run.Replace(";R1;CYL-1;", ";;;", StringComparison.Ordinal).Replace("2026-03-02 07:30:00 +01:00", "", StringComparison.Ordinal)));
        var blank = Assert.Single(readings.Blanks);
        Assert.Equal(("R1", "CYL-1", new DateTimeOffset(2026, 3, 2, 7, 0, 0, TimeSpan.FromHours(1))), (blank.Instrument, blank.Geometry, blank.StartedAt));
    }

    [Fact]
    public void A_blank_run_without_instrument_or_time_is_set_aside_with_its_reason()
    {
        var readings = Read(folder => folder.Write("blanks/b.csv", Run.Replace(";R1;CYL-1;", ";;;", StringComparison.Ordinal)));
        Assert.Empty(readings.Blanks);
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.MetadataMissing && finding.Message.Contains("instrument", StringComparison.Ordinal));
    }

    private static string Declared => Study.Template().Replace("# blanks =", "blanks =", StringComparison.Ordinal);

    private static StudyReadings Read(Action<StudyFolder> change)
    {
        using var folder = StudyFolder.Valid();
        Directory.CreateDirectory(folder.PathOf("blanks"));
        folder.Write("study.toml", Declared).AddSample("S-1", "P-1");
        folder.Write("exports/a.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5"));
        change(folder);
        return Study.Open(folder.StudyFile).ReadExports();
    }
}
