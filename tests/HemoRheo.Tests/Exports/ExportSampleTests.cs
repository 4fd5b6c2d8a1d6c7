using System.Globalization;

namespace HemoRheo.Tests.Exports;

/// <summary>The files of ReferenceData/export-samples against expected.csv, which a Python script computed beside them.</summary>
public sealed class ExportSampleTests
{
    [Fact]
    public void Every_reading_is_that_of_the_independent_script()
    {
        using var folder = StudyFolder.Valid().AddSample("K-01", "P-01").AddSample("K-02", "P-02");
        folder.Write("study.toml", Study.Template().Replace("encoding = \"utf-8\"", "encoding = \"windows-1252\"", StringComparison.Ordinal));
        foreach (var name in new[] { "rows.csv", "blocks.txt" }) folder.Write($"exports/{name}", File.ReadAllBytes(Repository.Reference("export-samples", name)));

        var readings = Study.Open(folder.StudyFile).ReadExports();

        Assert.Empty(readings.Findings);
        var expected = File.ReadLines(Repository.Reference("export-samples", "expected.csv")).Skip(1).Select(line => line.Split(',')).ToArray();
        var read = readings.Blood.SelectMany(recording => recording.Readings).ToArray();
        Assert.Equal(expected.Length, read.Length);
        foreach (var (row, reading) in expected.Zip(read))
        {
            Assert.Equal($"exports/{row[0]}:{row[5]}:{(row[6].Length > 0 ? 12 : 5)}, sample {row[1]}, loading {row[2]}, point {row[3]}", reading.Where.ToString());
            Assert.Equal(row[4], reading.Ramp.ToString().ToLowerInvariant());
            Near(row[6], reading.Speed);
            Near(row[7], reading.Torque);
            Near(row[8], reading.Rate);
            Near(row[9], reading.Stress);
            Near(row[10], reading.Temperature);
            Near(row[11], reading.Elapsed);
        }
    }

    private static void Near(string expected, double? value)
    {
        Assert.Equal(expected.Length == 0, value is null);
        if (value is { } number) Assert.Equal(1, number / double.Parse(expected, CultureInfo.InvariantCulture), 1e-14);
    }
}
