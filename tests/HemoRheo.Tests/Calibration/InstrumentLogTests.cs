using System.Globalization;
using System.Security.Cryptography;
using System.Text;
using HemoRheo.Benchmarks.SimulatedCharts;
using nietras.SeparatedValues;

namespace HemoRheo.Tests.Calibration;

public sealed class InstrumentLogTests : IDisposable
{
    private readonly LogFolder _folder = new();

    private static DateTimeOffset Start => LogFolder.Start;

    public void Dispose() => _folder.Dispose();

    [Fact]
    public void What_is_recorded_is_read_back_to_the_last_bit()
    {
        var check = InventedLoggedCheck.Of("C1", Start, 1.0 / 3) with { Temperature = new(37.000000000000007), Name = "Prüfung \"1\", µ" };
        var bare = check with { Name = "C2", At = Start.AddTicks(1), Readings = [new(1e-300, null, -0.0)], Export = null, ExportDigest = null };
        LoggedEvent[] events = [check, bare, new LoggedAdjustment(Start.AddDays(1), "gap set"), new LoggedBlankRun(Start.AddDays(2), "CYL-1", [new(0.5, 1e-9, 2e-10, 30)]), new LoggedCorrection(2, "wrong lot", check with { Lot = "lot 8" })];
        foreach (var what in events) Assert.Equal(what, _folder.Log.Append(what, Start.AddDays(3), "B. Jones").What);
        var contents = InstrumentLog.Open(_folder.Path).Read();
        Assert.Equal([new LoggedOpening("R1"), .. events], contents.Entries.Select(entry => entry.What));
        Assert.Equal([1L, 2, 3, 4, 5, 6], contents.Entries.Select(entry => entry.Number));
        Assert.Equal(("B. Jones", Start.AddDays(3)), (contents.Entries[1].By, contents.Entries[1].RecordedAt));
        Assert.True(contents.Verification.Sound);
        Assert.Empty(contents.Findings);
    }

    [Fact]
    public void A_check_of_a_study_is_kept_whole()
    {
        var recording = InvestigatedInstrument.Check(0, 1);
        var check = Assert.Single(InvestigatedInstrument.History(recording).Checks);
        var readings = TestStudy.Readings(TestStudy.Plain, [recording]) with { Files = [new("checks/C0.csv", "abc", "rows", 1, 12, [])] };
        var logged = check.ToLog(readings);
        Assert.Equal(("R1", "C0", 1, "oil", "lot 7", "checks/C0.csv", "abc"), (logged.Instrument, logged.Name, logged.Filling, logged.Fluid, logged.Lot, logged.Export, logged.ExportDigest));
        Assert.Equal((check.At, check.Error, check.Limit, check.Outcome, check.Measured), (logged.At, logged.Error, logged.Limit, logged.Outcome, logged.Measured));
        Assert.Equal(12, logged.Readings.Count);
        Assert.All(logged.Readings, reading => Assert.Equal(Math.Log(1.01), reading.Error, 1e-12));
        var viscosity = TestStudy.Oil.ViscosityAt(Temperature.Body).PascalSeconds * 1.01;
        Assert.Equal(300 * viscosity / TestStudy.Cylinders.StressPerTorque(), logged.Readings[0].Torque!.Value, 1e-18);
        Assert.Equal(logged, _folder.Log.Append(logged, Start, "A. Miller").What);
    }

    [Fact]
    public void A_correction_changes_what_stands_and_not_what_was_written()
    {
        _folder.Check(1);
        _folder.Check(2);
        var right = InventedLoggedCheck.Of("C1", Start.AddDays(4), 0.002);
        _folder.Log.Append(new LoggedCorrection(2, "day mistyped", right with { Lot = "lot 9" }), Start.AddDays(5), "B. Jones");
        _folder.Log.Append(new LoggedCorrection(2, "lot mistyped", right), Start.AddDays(6), "B. Jones");
        _folder.Log.Append(new LoggedCorrection(3, "bubble seen", null), Start.AddDays(7), "B. Jones");
        var contents = _folder.Log.Read();
        var standing = Assert.Single(contents.Standing);
        Assert.Equal(right, standing.What);
        Assert.Equal([4L, 5], standing.Corrections.Select(entry => entry.Number));
        Assert.Equal("C1", ((LoggedCheck)standing.Entry.What).Name);
        Assert.Equal(Start.AddDays(1), ((LoggedCheck)standing.Entry.What).At);
        Assert.Equal(6, contents.Entries.Count);
        Assert.Equal([right], contents.Checks);
    }

    [Fact]
    public void Checks_entered_late_stand_where_they_happened()
    {
        _folder.Check(5);
        var late = _folder.Log.Append(InventedLoggedCheck.Of("late", Start.AddDays(2), 0), Start.AddDays(6), "A. Miller");
        Assert.Empty(late.Findings);
        Assert.Equal(["late", "C5"], _folder.Log.Read().Checks.Select(check => check.Name));
    }

    [Fact]
    public void A_clock_set_back_is_taken_and_said()
    {
        _folder.Check(5);
        var entry = _folder.Log.Append(new LoggedAdjustment(Start.AddDays(1), "gap set"), Start.AddDays(4), "A. Miller");
        Assert.Equal("Entry 3 was recorded at 2026-03-06 09:00 +01:00, before entry 2 at 2026-03-07 09:10 +01:00.", Assert.Single(entry.Findings).Message);
        Assert.Equal(["log-clock-set-back"], _folder.Log.Read().Findings.Codes());
        // The same moment in another offset is not earlier.
        Assert.Empty(_folder.Log.Append(new LoggedAdjustment(Start, "again"), Start.AddDays(4).ToOffset(TimeSpan.Zero), "A. Miller").Findings);
    }

    [Fact]
    public void What_happens_after_it_was_recorded_twice_or_at_one_moment_is_said()
    {
        Assert.Equal(["log-ahead-of-clock"], _folder.Log.Append(InventedLoggedCheck.Of("C1", Start.AddDays(1), 0), Start, "A. Miller").Findings.Codes());
        _folder.Check(2);
        _folder.Check(2);
        _folder.Log.Append(InventedLoggedCheck.Of("other", Start.AddDays(2), 0), Start.AddDays(3), "A. Miller");
        var findings = _folder.Log.Read().Findings;
        Assert.Equal(["log-ahead-of-clock", "log-recorded-twice", "log-same-moment"], findings.Codes());
        Assert.Equal("Entries 3, 4 record filling 1 of check 'C2' from the same export.", findings[1].Message);
        Assert.Equal("Entries 3, 4, 5 are different checks at one moment, 2026-03-04 09:00 +01:00.", findings[2].Message);
    }

    [Fact]
    public void The_chart_has_one_point_a_filling_and_starts_anew_at_an_adjustment()
    {
        for (var week = 0; week < 30; week++) _folder.Check(7 * week, week % 2 == 0 ? 0.004 : -0.004);
        _folder.Check(7, 0.001);
        _folder.Check(7, 0.001, filling: 2);
        Assert.Equal(31, _folder.Log.Read().ControlChart().Current.Points.Count);
        _folder.Log.Append(new LoggedAdjustment(Start.AddDays(150), "spring changed"), Start.AddDays(300), "A. Miller");
        var chart = _folder.Log.Read().ControlChart();
        Assert.Equal([23, 8], chart.Segments.Select(segment => segment.Points.Count));
        Assert.Equal((-0.004 + 0.001) / 2, chart.Segments[0].Points[1].Check.Error.X, 1e-12);
    }

    [Fact]
    public void The_export_is_the_same_bytes_in_any_culture_and_its_digests_can_be_made_again_from_it()
    {
        _folder.Check(1, -1.0 / 3);
        _folder.Log.Append(new LoggedAdjustment(Start.AddDays(2), "=1+1, \"gap\""), Start.AddDays(2), "A. Miller");
        _folder.Log.Append(new LoggedCorrection(2, "lot", InventedLoggedCheck.Of("C1", Start, 0)), Start.AddDays(2), "A. Miller");
        var csv = _folder.Log.ToCsv();
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new("de-DE");
            Assert.Equal(csv, InstrumentLog.Open(_folder.Path).ToCsv());
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }

        using var reader = Sep.New(',').Reader(options => options with { Unescape = true }).FromText(csv);
        var digest = "";
        foreach (var row in reader)
        {
            var text = string.Join('\n', [digest, row["entry"].ToString(), row["kind"].ToString(), row["recorded_at"].ToString(), row["recorded_by"].ToString(), row["content"].ToString()]);
            digest = Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(text)));
            Assert.Equal(row["digest"].ToString(), digest);
        }

        Assert.Equal(_folder.Log.Verify().LastDigest, digest);
        var lines = csv.Split('\n');
        Assert.Equal(6, lines.Length);
        Assert.StartsWith("2,check,2026-03-03T09:10:00+01:00,A. Miller,,2026-03-03T09:00:00+01:00,C1,1,oil,lot 7,37,", lines[2], StringComparison.Ordinal);
        Assert.Contains("\"'=1+1, \"\"gap\"\"\"", lines[3], StringComparison.Ordinal);
        Assert.StartsWith("4,correction,2026-03-04T09:00:00+01:00,A. Miller,2,2026-03-02T09:00:00+01:00,C1,", lines[4], StringComparison.Ordinal);
    }

    [Fact]
    public void Misuse_is_told_and_nothing_is_recorded()
    {
        _folder.Check(1);
        var check = InventedLoggedCheck.Of("C2", Start, 0);
        Refused(check with { Instrument = "R2" });
        Refused(check with { Limit = double.NaN });
        Refused(new LoggedOpening("R1"));
        Refused(new LoggedCorrection(9, "why", null));
        Refused(new LoggedCorrection(1, "why", null));
        Refused(new LoggedCorrection(2, " ", null));
        Refused(new LoggedCorrection(2, "why", new LoggedAdjustment(Start, "x")));
        _folder.Log.Append(new LoggedCorrection(2, "why", null), Start, "A. Miller");
        Refused(new LoggedCorrection(3, "why", null));
        Refused(check, "A\nB");
        Refused(check, "=A");
        Assert.Equal(3, _folder.Log.Read().Entries.Count);

        void Refused(LoggedEvent what, string by = "A. Miller") => Assert.ThrowsAny<ArgumentException>(() => _folder.Log.Append(what, Start, by));
    }

    [Fact]
    public void Threads_of_one_program_lose_nothing()
    {
        Parallel.For(0, 4, writer =>
        {
            for (var i = 0; i < 5; i++) InstrumentLog.Open(_folder.Path).Append(InventedLoggedCheck.Of($"{writer}/{i}", Start, 0), Start, "A. Miller");
        });
        var contents = _folder.Log.Read();
        Assert.True(contents.Verification.Sound);
        Assert.Equal(20, contents.Checks.Select(check => check.Name).Distinct().Count());
    }
}
