using System.Diagnostics;
using System.Text;

namespace HemoRheo.Tests.Exports;

/// <summary>Files that are no text, or not the declared one.</summary>
public sealed class BadTextTests
{
    private static readonly string Good = StudyFolder.RowsHeader + StudyFolder.Row("S-1", "60", "4");

    [Theory]
    [InlineData("")]
    [InlineData("\n\n  \n")]
    [InlineData("\uFEFF")]
    public void An_empty_file_is_told(string text)
    {
        var finding = Only(Encoding.UTF8.GetBytes(text));
        Assert.Equal((ExportFindings.FileEmpty, "exports/a.csv", 1), (finding.Kind, finding.Where.File, finding.Where.Line));
    }

    [Fact]
    public void A_header_without_readings_is_told() => Assert.Equal(ExportFindings.FileWithoutReadings, Only(Encoding.UTF8.GetBytes(StudyFolder.RowsHeader)).Kind);

    [Fact]
    public void A_binary_file_is_refused_with_the_place_of_the_first_strange_character()
    {
        var finding = Only([.. Encoding.UTF8.GetBytes(StudyFolder.RowsHeader), .. "S-1"u8, 0, 1, 2, (byte)'\n']);
        Assert.Equal((ExportFindings.FileBinary, 2, 4), (finding.Kind, finding.Where.Line, finding.Where.Column));
        Assert.Contains("U+0000", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void UTF_16_where_UTF_8_is_declared_is_refused_by_name()
    {
        var finding = Only([.. Encoding.Unicode.GetPreamble(), .. Encoding.Unicode.GetBytes(Good)]);
        Assert.Equal((ExportFindings.EncodingMarkDiffers, 1, 1), (finding.Kind, finding.Where.Line, finding.Where.Column));
        Assert.Contains("utf-16", finding.Message, StringComparison.Ordinal);
        Assert.Contains("expected none or that of the declared encoding utf-8", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void UTF_16_without_a_mark_where_UTF_8_is_declared_is_refused() => Assert.Equal(ExportFindings.FileBinary, Only(Encoding.Unicode.GetBytes("sample;loading\n")).Kind);

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public void UTF_16_with_a_mark_is_read_where_it_is_declared(bool bigEndian)
    {
        var encoding = new UnicodeEncoding(bigEndian, byteOrderMark: true);
        var readings = Read([.. encoding.GetPreamble(), .. encoding.GetBytes(Good)], "utf-16");
        Assert.Empty(readings.Findings);
        Assert.Equal(4e-6, readings.Blood[0].Readings[0].Torque!.Value, 1e-18);
    }

    [Fact]
    public void UTF_16_without_a_mark_needs_the_byte_order() => Assert.Equal(ExportFindings.EncodingMarkDiffers, Assert.Single(Read(Encoding.Unicode.GetBytes(Good), "utf-16").Files[0].Findings).Kind);

    [Fact]
    public void A_UTF_8_mark_is_read_over() => Assert.Empty(Read([.. Encoding.UTF8.GetPreamble(), .. Encoding.UTF8.GetBytes(Good)]).Findings);

    [Fact]
    public void Bytes_that_are_not_UTF_8_are_told_with_their_place()
    {
        var finding = Only([.. Encoding.UTF8.GetBytes(StudyFolder.RowsHeader), .. "S-"u8, 0xB5, .. ";1\n"u8]);
        Assert.Equal((ExportFindings.BytesNotText, 2, 3), (finding.Kind, finding.Where.Line, finding.Where.Column));
        Assert.Contains("expected text in that encoding", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_declared_code_page_is_read()
    {
        HemoRheo.Layout layout;
        using (var folder = StudyFolder.Valid()) layout = Study.Open(folder.Write("study.toml", Declared("windows-1252")).StudyFile).Layouts[0];
        Assert.Equal("windows-1252", layout.Encoding);
        var bytes = Encoding.GetEncoding("windows-1252").GetBytes(Good);
        Assert.Contains((byte)0xB5, bytes);
        Assert.Empty(Read(bytes, "windows-1252").Findings);
    }

    [Fact]
    public void A_file_of_500_MB_of_one_line_is_refused_quickly_in_little_memory()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/a.csv", "sample");
        using (var file = new FileStream(folder.PathOf("exports/a.csv"), FileMode.Open))
        {
            file.Write(Encoding.ASCII.GetBytes(new string('7', 1 << 20)));
            file.SetLength(500_000_000);
        }

        var study = Study.Open(folder.StudyFile);
        var before = GC.GetAllocatedBytesForCurrentThread();
        var watch = Stopwatch.StartNew();

        var finding = Assert.Single(study.ReadExports().Files[0].Findings);

        Assert.Equal((ExportFindings.LineTooLong, 1, 1), (finding.Kind, finding.Where.Line, finding.Where.Column));
        Assert.Contains("expected lines", finding.Message, StringComparison.Ordinal);
        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, 4_000_000);
        Assert.InRange(watch.Elapsed.TotalSeconds, 0, 20);
    }

    [Fact]
    public void A_quote_that_is_not_closed_is_told()
    {
        var finding = Only(Encoding.UTF8.GetBytes(StudyFolder.RowsHeader + "\"S-1;1\n"));
        Assert.Equal((ExportFindings.QuoteNotClosed, 2), (finding.Kind, finding.Where.Line));
    }

    [Fact]
    public void Damaged_files_give_findings_and_never_throw()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        var study = Study.Open(folder.StudyFile);
        var rows = Encoding.UTF8.GetBytes(Good + StudyFolder.Row("S-1", "30", "2", ramp: "up"));
        var blocks = Encoding.UTF8.GetBytes(StudyFolder.Block("S-1", [("100", "420.5"), ("10.0", "62")]));
        var random = new Random(20261201);
        for (var round = 0; round < 300; round++)
        {
            folder.Write("exports/a.csv", Damaged(rows, random)).Write("exports/b.txt", Damaged(blocks, random));
            var readings = study.ReadExports();
            Assert.Equal(4, readings.Files.Count);
            Assert.True(readings.Findings.Count > 0 || readings.Blood.Count == 2);
        }
    }

    private static byte[] Damaged(byte[] bytes, Random random)
    {
        var damaged = bytes.ToList();
        for (var change = random.Next(1, 4); change > 0; change--)
        {
            var at = random.Next(damaged.Count);
            if (random.Next(3) == 0) damaged.RemoveRange(at, Math.Min(damaged.Count - at - 1, random.Next(30)));
            else if (random.Next(2) == 0) damaged[at] = (byte)random.Next(256);
            else damaged.Insert(at, (byte)";,.\n\"-e:"[random.Next(8)]);
        }

        return [.. damaged];
    }

    private static string Declared(string encoding) => Study.Template().Replace("encoding = \"utf-8\"", $"encoding = \"{encoding}\"", StringComparison.Ordinal);

    private static StudyReadings Read(byte[] bytes, string encoding = "utf-8")
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("study.toml", Declared(encoding)).Write("exports/a.csv", bytes);
        return Study.Open(folder.StudyFile).ReadExports();
    }

    private static Finding Only(byte[] bytes)
    {
        var readings = Read(bytes);
        Assert.Empty(readings.Blood);
        return Assert.Single(readings.Files[0].Findings);
    }
}
