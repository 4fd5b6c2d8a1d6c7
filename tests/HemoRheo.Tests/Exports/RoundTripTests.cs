namespace HemoRheo.Tests.Exports;

public sealed class RoundTripTests
{
    [Fact]
    public void Rows_with_decimal_comma_keep_speed_torque_and_their_lines()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1");
        folder.Write("exports/a.csv", StudyFolder.RowsHeader + StudyFolder.Row("S-1", "120", "7,5", ramp: "down") + StudyFolder.Row("S-1", "60,0", "4,25e0", ramp: "up"));

        var readings = Study.Open(folder.StudyFile).ReadExports();

        Assert.Empty(readings.Findings);
        var recording = Assert.Single(readings.Blood);
        Assert.Equal(("S-1", 1, "R1", "CYL-1"), (recording.Sample, recording.Loading, recording.Instrument, recording.Geometry));
        Assert.Equal(new DateTimeOffset(2026, 3, 2, 9, 0, 0, TimeSpan.FromHours(1)), recording.StartedAt);
        Assert.Equal(new DateOnly(2026, 3, 2), recording.Day);
        Assert.Equal(2, recording.Readings.Count);
        var first = recording.Readings[0];
        Assert.Equal(12.566370614359172, first.Speed!.Value, 1e-12);
        Assert.Equal(12.566370614359172, first.SetSpeed!.Value, 1e-12);
        Assert.Equal(7.5e-6, first.Torque!.Value, 1e-18);
        Assert.Equal(37, first.Temperature!.Value, 1e-12);
        Assert.Equal(10, first.Elapsed!.Value, 1e-12);
        Assert.Equal(Ramp.Down, first.Ramp);
        Assert.Null(first.Stress);
        Assert.Equal(new Where("exports/a.csv", Line: 2, Column: 12, Sample: "S-1", Loading: 1, Point: 1), first.Where);
        Assert.Equal(4.25e-6, recording.Readings[1].Torque!.Value, 1e-18);
        Assert.Equal(Ramp.Up, recording.Readings[1].Ramp);
        Assert.Equal(3, recording.Readings[1].Where.Line);
    }

    [Fact]
    public void Blocks_with_decimal_point_keep_rate_stress_and_their_lines()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1").AddSample("S-2", "P-2", group: "B");
        folder.Write("exports/b.txt", StudyFolder.Block("S-1", [("100", "420.5"), ("10.0", "62")]) + "\n" + StudyFolder.Block("S-2", [("1", "11.25")], ramp: "up"));

        var readings = Study.Open(folder.StudyFile).ReadExports();

        Assert.Empty(readings.Findings);
        Assert.Equal(2, readings.Blood.Count);
        var reading = readings.Blood[0].Readings[0];
        Assert.Equal(100, reading.Rate!.Value, 1e-12);
        Assert.Equal(0.4205, reading.Stress!.Value, 1e-15);
        Assert.Equal(Ramp.Down, reading.Ramp);
        Assert.Equal(new Where("exports/b.txt", Line: 7, Column: 5, Sample: "S-1", Loading: 1, Point: 1), reading.Where);
        Assert.Equal(Ramp.Up, readings.Blood[1].Readings[0].Ramp);
        Assert.Equal(10, readings.Blood[1].Where.Line);
        Assert.Equal(16, readings.Blood[1].Readings[0].Where.Line);
    }

    [Fact]
    public void Files_samples_and_people_are_listed_with_their_digests()
    {
        using var folder = StudyFolder.Valid().AddSample("S-1", "P-1", hematocrit: "0.42");
        folder.Write("exports/b.txt", StudyFolder.Block("S-1", [("100", "420.5")]));

        var readings = Study.Open(folder.StudyFile).ReadExports();

        Assert.Equal(["exports/b.txt", "people.csv", "samples.csv"], readings.Files.Select(file => file.Path));
        Assert.Equal(["blocks", "people table", "samples table"], readings.Files.Select(file => file.Layout));
        Assert.Equal((1, 1), (readings.Files[0].Recordings, readings.Files[0].Readings));
        Assert.Equal(64, readings.Files[0].Digest.Length);
        var sample = Assert.Single(readings.Samples);
        Assert.Equal(0.42, sample.Hematocrit!.Value.LiterPerLiter, 1e-15);
        Assert.Equal(0.00122, sample.PlasmaViscosity!.Value.PascalSeconds, 1e-15);
        Assert.Equal("R1", sample.PlasmaInstrument);
        Assert.Equal(new Person("P-1", "A", new("people.csv", Line: 2)), Assert.Single(readings.People));
    }
}
