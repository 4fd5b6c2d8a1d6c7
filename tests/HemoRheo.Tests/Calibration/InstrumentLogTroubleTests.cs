using HemoRheo.Benchmarks.SimulatedCharts;
using Microsoft.Data.Sqlite;

namespace HemoRheo.Tests.Calibration;

/// <summary>Files that are damaged, locked, foreign or changed: each with a plain message, and never half written.</summary>
public sealed class InstrumentLogTroubleTests : IDisposable
{
    private readonly LogFolder _folder = new();

    public InstrumentLogTroubleTests()
    {
        for (var day = 1; day <= 12; day++) _folder.Check(day);
    }

    public void Dispose() => _folder.Dispose();

    [Theory]
    [InlineData("UPDATE entry SET content = replace(content, '0.001', '0.002') WHERE number = 7", 7, "its kind, moment, name or content was changed")]
    [InlineData("UPDATE entry SET recorded_at = '2026-03-08T09:00:00+01:00' WHERE number = 7", 7, "its kind, moment, name or content was changed")]
    [InlineData("UPDATE entry SET recorded_by = 'B. Jones' WHERE number = 7", 7, "its kind, moment, name or content was changed")]
    [InlineData("UPDATE entry SET digest = replace(digest, 'a', 'b') WHERE number = 7", 7, "its digest was changed after it was written; what it says was not")]
    [InlineData("UPDATE entry SET content = replace(content, '0.001', '0.002') WHERE number = 13", 13, "its kind, moment, name, content or digest was changed")]
    [InlineData("DELETE FROM entry WHERE number = 7", 7, "it is missing; number 8 comes next.")]
    [InlineData("DELETE FROM entry WHERE number = 7; UPDATE entry SET number = number - 1 WHERE number > 7", 7, "it does not follow from the entry before")]
    [InlineData("INSERT INTO entry VALUES (14, 'check', '2026-03-08T09:00:00+01:00', 'A', '{}', 'x')", 14, "its kind, moment, name, content or digest was changed")]
    public void A_tampered_row_is_named_with_what_differs(string statements, long number, string what)
    {
        _folder.Tamper(statements);
        var broken = _folder.Log.Verify().FirstBreak!;
        Assert.Equal(number, broken.Number);
        Assert.StartsWith(what, broken.What, StringComparison.Ordinal);
        var finding = Assert.Single(_folder.Log.Read().Findings, finding => finding.Code == "log-broken");
        Assert.StartsWith($"The log is not as it was written: entry {number}: {what}", finding.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void An_entry_replaced_with_its_digest_breaks_the_next_one()
    {
        var forged = new LogRow(7, "adjustment", "2026-03-08T09:00:00+01:00", "B", "{\"at\":\"2026-03-08T09:00:00+01:00\",\"what\":\"x\"}", "");
        _folder.Tamper($"UPDATE entry SET kind = '{forged.Kind}', recorded_at = '{forged.RecordedAt}', recorded_by = 'B', content = '{forged.Content}', digest = '{forged.DigestAfter(_folder.Log.Read().Entries[5].Digest)}' WHERE number = 7");
        Assert.Equal(8, _folder.Log.Verify().FirstBreak!.Number);
    }

    [Fact]
    public void Entries_cut_off_at_the_end_show_against_a_digest_noted_before()
    {
        var noted = _folder.Log.Verify().LastDigest;
        _folder.Check(20);
        Assert.True(_folder.Log.Verify(noted).Sound);
        _folder.Tamper("DELETE FROM entry WHERE number > 10");
        Assert.True(_folder.Log.Verify().Sound);
        Assert.StartsWith("no entry has the digest noted earlier", _folder.Log.Verify(noted).FirstBreak!.What, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("UPDATE entry SET content = '{}'", "never changed: record a correction")]
    [InlineData("DELETE FROM entry", "never deleted: record a correction")]
    public void Another_program_is_told_not_to_edit_or_delete(string statement, string what)
    {
        using var connection = new SqliteConnection($"Data Source={_folder.Path};Pooling=False");
        connection.Open();
        using var command = connection.CreateCommand();
        command.CommandText = statement;
        Assert.Contains(what, Assert.Throws<SqliteException>(() => command.ExecuteNonQuery()).Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData(0.3)]
    [InlineData(0.9)]
    public void A_file_cut_off_is_damaged(double kept)
    {
        var bytes = File.ReadAllBytes(_folder.Path);
        File.WriteAllBytes(_folder.Path, bytes[..(int)(kept * bytes.Length)]);
        foreach (var message in Messages()) Assert.Contains("is damaged or cut off", message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_byte_changed_anywhere_is_never_taken_for_the_log_as_it_was_written()
    {
        var (bytes, written) = (File.ReadAllBytes(_folder.Path), _folder.Log.ToCsv());
        var random = RandomStream.Of(8, "damage", 0);
        for (var i = 0; i < 150; i++)
        {
            var damaged = (byte[])bytes.Clone();
            damaged[(int)(random.Uniform() * bytes.Length)] ^= (byte)(1 << (int)(random.Uniform() * 8));
            File.WriteAllBytes(_folder.Path, damaged);
            try
            {
                var log = InstrumentLog.Open(_folder.Path);
                Assert.True(!log.Verify().Sound || log.ToCsv() == written);
                _ = log.Read().Findings;
            }
            catch (InstrumentLogException)
            {
                // Told that it is damaged or no log.
            }
        }
    }

    [Fact]
    public void An_empty_file_was_interrupted_and_can_be_created_again()
    {
        File.WriteAllBytes(_folder.Path, []);
        foreach (var message in Messages()) Assert.Contains("is empty: creating it was interrupted, or it was cut off", message, StringComparison.Ordinal);
        Assert.Single(InstrumentLog.Create(_folder.Path, "R1", LogFolder.Start, "A. Miller").Read().Entries);
    }

    [Theory]
    [InlineData("This is a text.\n")]
    [InlineData("SQLite format 3")]
    public void A_file_of_another_kind_is_no_log(string text)
    {
        var other = Path.Combine(_folder.Root, "other.txt");
        File.WriteAllText(other, string.Concat(Enumerable.Repeat(text, 100)));
        Assert.Contains("is not an instrument log", Assert.Throws<InstrumentLogException>(() => InstrumentLog.Open(other)).Message, StringComparison.Ordinal);
        Assert.Throws<InstrumentLogException>(() => InstrumentLog.Create(other, "R1", LogFolder.Start, "A. Miller"));
        Assert.StartsWith(text, File.ReadAllText(other), StringComparison.Ordinal);
    }

    [Fact]
    public void A_database_of_another_program_is_no_log()
    {
        var other = Path.Combine(_folder.Root, "other.db");
        _folder.Tamper("CREATE TABLE t (x)", other);
        Assert.Contains("is not an instrument log", Assert.Throws<InstrumentLogException>(() => InstrumentLog.Open(other)).Message, StringComparison.Ordinal);
        Assert.Contains("exists already", Assert.Throws<InstrumentLogException>(() => InstrumentLog.Create(other, "R1", LogFolder.Start, "A. Miller")).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_log_that_is_there_is_not_created_again_and_one_that_is_not_cannot_be_opened()
    {
        Assert.Contains("exists already", Assert.Throws<InstrumentLogException>(() => InstrumentLog.Create(_folder.Path, "R1", LogFolder.Start, "A. Miller")).Message, StringComparison.Ordinal);
        Assert.Contains("There is no instrument log", Assert.Throws<InstrumentLogException>(() => InstrumentLog.Open(_folder.Path + "x")).Message, StringComparison.Ordinal);
        Assert.False(File.Exists(_folder.Path + "x"));
        Assert.Contains("cannot be opened", Assert.Throws<InstrumentLogException>(() => InstrumentLog.Create(Path.Combine(_folder.Root, "no folder", "R1.log"), "R1", LogFolder.Start, "A. Miller")).Message, StringComparison.Ordinal);
        Assert.Equal(13, _folder.Log.Read().Entries.Count);
    }

    [Fact]
    public void A_newer_format_is_left_alone()
    {
        _folder.Tamper("PRAGMA user_version = 2");
        foreach (var message in Messages()) Assert.Contains("has format 2; this program knows format 1", message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_read_only_file_can_be_read_and_not_written()
    {
        File.SetAttributes(_folder.Path, FileAttributes.ReadOnly);
        Assert.Equal(13, InstrumentLog.Open(_folder.Path).Read().Entries.Count);
        Assert.Contains("is read-only", Assert.Throws<InstrumentLogException>(() => _folder.Check(20)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_locked_file_says_that_another_program_writes_it()
    {
        using var connection = new SqliteConnection($"Data Source={_folder.Path};Pooling=False");
        connection.Open();
        using (var transaction = connection.BeginTransaction(deferred: false))
        {
            var impatient = InstrumentLog.Open(_folder.Path, TimeSpan.FromMilliseconds(50));
            Assert.Contains("is being written by another program", Assert.Throws<InstrumentLogException>(() => impatient.Append(InventedLoggedCheck.Of("C", LogFolder.Start, 0), LogFolder.Start, "A. Miller")).Message, StringComparison.Ordinal);
            Assert.Equal(13, impatient.Read().Entries.Count);
        }

        Assert.Equal(14, _folder.Check(20).Number);
    }

    [Fact]
    public void On_a_full_disk_nothing_is_recorded_and_the_log_stays_sound()
    {
        var pages = (int)(new FileInfo(_folder.Path).Length / 4096);
        var full = InstrumentLog.Open(_folder.Path, TimeSpan.FromSeconds(1), mostPages: pages);
        var message = Assert.Throws<InstrumentLogException>(() =>
        {
            for (var i = 0; i < 10; i++) full.Append(InventedLoggedCheck.Of($"F{i}", LogFolder.Start, 0), LogFolder.Start.AddDays(30), "A. Miller");
        }).Message;
        Assert.Contains("is full. Nothing was recorded: make room and record again.", message, StringComparison.Ordinal);
        var (before, recorded) = (_folder.Log.Verify(), _folder.Check(40));
        Assert.True(before.Sound);
        Assert.Equal(before.Entries + 1, recorded.Number);
        Assert.True(_folder.Log.Verify().Sound);
    }

    private IEnumerable<string> Messages()
    {
        yield return Assert.Throws<InstrumentLogException>(() => InstrumentLog.Open(_folder.Path).Read()).Message;
        yield return Assert.Throws<InstrumentLogException>(() => _folder.Log.Read()).Message;
        yield return Assert.Throws<InstrumentLogException>(() => _folder.Check(20)).Message;
    }
}
