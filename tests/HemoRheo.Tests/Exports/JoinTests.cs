namespace HemoRheo.Tests.Exports;

/// <summary>Files, layouts, recordings and tables that do not match: every one is told, on both sides.</summary>
public sealed class JoinTests
{
    private static readonly string Good = StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5");

    [Fact]
    public void A_file_that_no_layout_fits_is_told()
    {
        var readings = Read(folder => folder.Write("exports/notes.docx", "x"));
        Assert.Equal(ExportFindings.NoLayoutFits, Assert.Single(readings.Files.Single(file => file.Path == "exports/notes.docx").Findings).Kind);
    }

    [Fact]
    public void A_file_that_two_layouts_fit_is_told_with_both()
    {
        var readings = Read(folder => folder.Write("study.toml", Study.Template().Replace("files = [\"*.txt\"]", "files = [\"*.txt\", \"a*\"]", StringComparison.Ordinal)));
        var finding = Assert.Single(readings.Files[0].Findings);
        Assert.Equal(ExportFindings.TwoLayoutsFit, finding.Kind);
        Assert.Contains("rows, blocks", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_link_that_leads_out_of_the_folder_is_told_and_not_read()
    {
        using var elsewhere = StudyFolder.Empty().Write("a.csv", Good);
        var readings = Read(folder => File.CreateSymbolicLink(folder.PathOf("exports/c.csv"), elsewhere.PathOf("a.csv")));
        Assert.Equal("exports/a.csv", Assert.Single(readings.Blood).Where.File);
        var finding = Assert.Single(readings.Findings);
        Assert.Equal((ExportFindings.PathLeadsOut, "exports/c.csv"), (finding.Kind, finding.Where.File));
        Assert.DoesNotContain(elsewhere.Root, finding.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public void A_folder_link_that_leads_out_is_told_and_a_link_in_a_circle_ends()
    {
        using var elsewhere = StudyFolder.Empty().Write("a.csv", Good);
        var readings = Read(folder =>
        {
            Directory.CreateSymbolicLink(folder.PathOf("exports/away"), elsewhere.Root);
            Directory.CreateSymbolicLink(folder.PathOf("exports/again"), folder.PathOf("exports"));
        });
        Assert.Single(readings.Blood);
        Assert.Equal(ExportFindings.PathLeadsOut, Assert.Single(readings.Findings).Kind);
    }

    [Fact]
    public void A_file_named_as_blood_and_as_check_is_told()
    {
        var readings = Read(folder => folder.Write("study.toml", Study.Template().Replace("checks = [\"checks\"]", "checks = [\"exports\"]", StringComparison.Ordinal)));
        Assert.Empty(readings.Blood);
        Assert.Equal(ExportFindings.FileInBothLists, Assert.Single(readings.Files[0].Findings).Kind);
    }

    [Fact]
    public void Two_loadings_with_one_number_are_both_set_aside()
    {
        var readings = Read(folder => folder.Write("exports/b.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,4", startedAt: "2026-03-02 10:00:00 +01:00")));
        Assert.Empty(readings.Blood);
        Assert.Equal(["exports/a.csv", "exports/b.csv"], readings.Findings.Select(finding => finding.Where.File!));
        Assert.All(readings.Findings, finding => Assert.Contains("exports/a.csv:2; exports/b.csv:2", finding.Message, StringComparison.Ordinal));
    }

    [Fact]
    public void Two_loadings_with_two_numbers_are_kept()
    {
        var readings = Read(folder => folder.Write("exports/b.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,4", loading: 2)));
        Assert.Empty(readings.Findings);
        Assert.Equal([1, 2], readings.Blood.Select(recording => recording.Loading));
    }

    [Fact]
    public void Samples_and_recordings_without_each_other_are_told()
    {
        var readings = Read(folder => folder.AddSample("S-2", "P-2").Write("exports/b.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-3", "120", "7,4")).Write("people.csv", "person,group\nP-1,A\nP-9,A\n"));
        Assert.Equal(2, readings.Blood.Count);
        Assert.Equal(
            ["person-not-in-table", "person-not-measured", "recording-without-sample", "sample-without-recording"],
            readings.Findings.Select(finding => finding.Code).Order(StringComparer.Ordinal));
        Assert.True(readings.Blood.Single(recording => recording.Sample == "S-3").HasFault);
    }

    [Theory]
    [InlineData(";R1;", ";R2;", "name-undeclared")]
    [InlineData(";R1;", ";;", "metadata-missing")]
    [InlineData(";CYL-1;", ";;", "metadata-missing")]
    [InlineData(";CYL-1;", ";CYL-2;", "name-undeclared")]
    [InlineData("S-1;1;", "S-1;one;", "loading-not-read")]
    [InlineData("S-1;1;", ";1;", "identifier-missing")]
    public void A_recording_without_what_it_needs_is_set_aside(string field, string written, string code)
    {
        var readings = Read(folder => folder.Write("exports/a.csv", Good.Replace(field, written, StringComparison.Ordinal)));
        Assert.Empty(readings.Blood);
        Assert.Contains(readings.Findings, finding => finding.Code == code && finding.Where is { File: "exports/a.csv", Line: 2 });
    }

    [Fact]
    public void The_samples_table_says_what_exports_do_not()
    {
        var readings = Read(folder => folder
            .Write("samples.csv", "sample,person,hematocrit [L/L],counter,instrument,geometry,started_at\nS-1,P-1,0.45,centrifuge,R1,CYL-1,2026-03-02T09:30:00+01:00\n")
            .Write("exports/a.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5", startedAt: "").Replace(";R1;CYL-1;", ";;;", StringComparison.Ordinal)));
        Assert.Empty(readings.Findings);
        Assert.Equal(("R1", "CYL-1", new DateTimeOffset(2026, 3, 2, 9, 30, 0, TimeSpan.FromHours(1))), (readings.Blood[0].Instrument, readings.Blood[0].Geometry, readings.Blood[0].StartedAt));
    }

    [Fact]
    public void An_export_that_disagrees_with_the_samples_table_is_marked()
    {
        var text = StudyFolder.Block("S-1", [("100", "420.5")]).Replace("Loading:", "Person: P-2\nVisit: 2\nLoading:", StringComparison.Ordinal);
        var readings = Read(folder =>
        {
            File.Delete(folder.PathOf("exports/a.csv"));
            folder.Write("exports/b.txt", text);
        });
        Assert.True(readings.Blood[0].HasFault);
        Assert.Equal(2, readings.Findings.Count(finding => finding.Kind == ExportFindings.MetadataDiffers));
        Assert.DoesNotContain("P-2", string.Concat(readings.Findings), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("sample,hematocrit [L/L],counter\nS-1,0.45,centrifuge\n", 2)]
    [InlineData("sample,person,visit,hematocrit [L/L],counter\nS-1,,,0.45,centrifuge\n", 2)]
    [InlineData("sample,person,visit,hematocrit [L/L],counter\nS-1,P-2,2,0.45,centrifuge\n", 2)]
    public void Person_and_visit_may_come_from_the_export_alone(string samples, int visit)
    {
        var readings = ReadBlock("Person: P-2\nVisit: 2\n", samples);
        Assert.Empty(readings.Findings);
        Assert.False(readings.Blood[0].HasFault);
        Assert.Equal(("P-2", visit), (Assert.Single(readings.Samples).Person, readings.Samples[0].Visit));
    }

    [Fact]
    public void Exports_of_one_sample_that_name_two_persons_are_marked_and_the_row_set_aside()
    {
        var second = StudyFolder.Block("S-1", [("100", "420.5")], loading: 2).Replace("Loading:", "Person: P-3\nLoading:", StringComparison.Ordinal);
        var readings = ReadBlock("Person: P-2\n", "sample,hematocrit [L/L],counter\nS-1,0.45,centrifuge\n", second);
        Assert.Empty(readings.Samples);
        Assert.All(readings.Blood, recording => Assert.True(recording.HasFault));
        Assert.Equal(2, readings.Findings.Count(finding => finding.Kind == ExportFindings.MetadataDiffers));
        Assert.DoesNotContain("P-3", string.Concat(readings.Findings), StringComparison.Ordinal);
    }

    [Fact]
    public void A_samples_table_needs_the_column_of_persons_where_no_layout_has_one()
    {
        var readings = Read(folder => folder
            .Write("study.toml", Study.Template().Replace("person = { header = \"Person\" }\n", "", StringComparison.Ordinal))
            .Write("samples.csv", "sample,hematocrit [L/L],counter\nS-1,0.45,centrifuge\n"));
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.TableColumnMissing && finding.Message.Contains("person", StringComparison.Ordinal));
    }

    [Fact]
    public void A_folder_without_exports_is_told_by_its_name()
    {
        var finding = Assert.Single(Read(folder => File.Delete(folder.PathOf("exports/a.csv"))).Findings, finding => finding.Kind == ExportFindings.NoExports);
        Assert.Equal("exports", finding.Where.File);
    }

    [Fact]
    public void A_pipe_among_the_exports_is_told_and_never_waited_for()
    {
        Assert.SkipWhen(OperatingSystem.IsWindows(), "not run: needs named pipes in folders, which Windows has not");
        var readings = Read(folder =>
        {
            using var made = System.Diagnostics.Process.Start("mkfifo", folder.PathOf("exports/b.csv"));
            made.WaitForExit();
            Assert.Equal(0, made.ExitCode);
        });
        Assert.Single(readings.Blood);
        var finding = Assert.Single(readings.Findings);
        Assert.Equal((ExportFindings.FileNotReadable, "exports/b.csv"), (finding.Kind, finding.Where.File));
        Assert.Contains("expected a file", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void The_check_table_says_what_check_exports_do_not()
    {
        var readings = Read(folder => folder
            .Write("study.toml", Study.Template().Replace("# check_table", "check_table", StringComparison.Ordinal))
            .Write("checks.csv", "check,fluid,instrument,started_at,geometry\nC-1,oil-5,R1,2026-03-02T07:00:00+01:00,CYL-1\nC-2,oil-5,R1,2026-03-09T07:00:00+01:00,CYL-1\n")
            .Write("checks/c.csv", StudyFolder.RowsHeader + StudyFolder.Row("C-1", "120", "7,5", startedAt: "").Replace(";R1;CYL-1;", ";;;", StringComparison.Ordinal) + StudyFolder.Row("C-3", "120", "7,5", fluid: "oil-6")));
        var check = Assert.Single(readings.Checks);
        Assert.Equal((RecordingKind.Check, "C-1", "oil-5", "R1"), (check.Kind, check.Sample, check.Fluid, check.Instrument));
        Assert.Equal(
            ["check-without-recording", "name-undeclared", "recording-without-check-row"],
            readings.Findings.Select(finding => finding.Code).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void A_damaged_block_is_set_aside_and_the_next_is_read()
    {
        var block = StudyFolder.Block("S-1", [("100", "420.5")]);
        var readings = Read(folder =>
        {
            File.Delete(folder.PathOf("exports/a.csv"));
            folder.Write("exports/b.txt", block.Replace("Loading: 1", "Loading", StringComparison.Ordinal) + StudyFolder.Block("S-1", [("100", "420.5")], loading: 2) + block.Replace("Loading: 1", "Loading: 3\nLoading: 4", StringComparison.Ordinal));
        });
        Assert.Equal(2, Assert.Single(readings.Blood).Loading);
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.LineNotUnderstood && finding.Where.Line == 2);
        Assert.Contains(readings.Findings, finding => finding.Kind == ExportFindings.KeyTwice && finding.Where.Line == 17);
    }

    [Fact]
    public void Reading_twice_gives_the_same()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/a.csv", Good);
        var study = Study.Open(folder.StudyFile);
        Assert.Equal(study.ReadExports(), Study.Open(folder.StudyFile).ReadExports());
    }

    private static StudyReadings ReadBlock(string keys, string samples, string more = "") => Read(folder =>
    {
        File.Delete(folder.PathOf("exports/a.csv"));
        folder.Write("exports/b.txt", StudyFolder.Block("S-1", [("100", "420.5")]).Replace("Loading:", keys + "Loading:", StringComparison.Ordinal) + more)
            .Write("samples.csv", samples)
            .Write("people.csv", "person,group\nP-2,A\n");
    });

    private static StudyReadings Read(Action<StudyFolder> change)
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/a.csv", Good);
        change(folder);
        return Study.Open(folder.StudyFile).ReadExports();
    }
}
