using Microsoft.Data.Sqlite;

namespace HemoRheo;

/// <summary>The SQLite file of a log: how it is opened, what it must be, and what its tables are.</summary>
/// <remarks>
/// Rollback journal (DELETE), not write-ahead log: at rest a log is one file that can be copied, archived and read from read-only media, and one entry a day needs no speed.
/// Synchronous EXTRA, so that what was recorded survives a loss of power. SQLite locks the file with the operating system's locks: on a network share
/// these are often missing or wrong, so several machines writing one log there is not supported.
/// The file is never opened by any other means in this process: closing such a handle would take SQLite's locks away (sqlite.org/howtocorrupt.html, 2.2).
/// </remarks>
internal sealed class LogFile(string path, TimeSpan patience, int? mostPages)
{
    private const int ApplicationId = 0x48524C47;
    private const int Format = 1;

    private const string Tables = """
        CREATE TABLE entry (number INTEGER PRIMARY KEY, kind TEXT NOT NULL, recorded_at TEXT NOT NULL, recorded_by TEXT NOT NULL, content TEXT NOT NULL, digest TEXT NOT NULL) STRICT;
        CREATE TRIGGER entry_stays_as_it_is BEFORE UPDATE ON entry BEGIN SELECT RAISE(ABORT, 'An entry of an instrument log is never changed: record a correction.'); END;
        CREATE TRIGGER entry_stays BEFORE DELETE ON entry BEGIN SELECT RAISE(ABORT, 'An entry of an instrument log is never deleted: record a correction.'); END;
        """;

    /// <summary>Makes the tables and the first entry, all at once or not at all.</summary>
    internal void Create(Func<string, LogRow> first) => Guarded(() =>
    {
        using var connection = Connected(SqliteOpenMode.ReadWriteCreate);
        using var transaction = connection.BeginTransaction(deferred: false);
        if (Number(connection, "SELECT count(*) FROM sqlite_master") > 0 || Number(connection, "PRAGMA application_id") != 0)
        {
            throw new InstrumentLogException($"'{path}' exists already. It was left as it is: open it, or create the new log under another name.");
        }

        Run(connection, FormattableString.Invariant($"PRAGMA application_id = {ApplicationId}; PRAGMA user_version = {Format}; {Tables}"));
        Insert(connection, first(""));
        transaction.Commit();
        return true;
    });

    /// <summary>All rows.</summary>
    internal List<LogRow> Rows() => Guarded(() =>
    {
        using var connection = Opened();
        return Rows(connection, "ORDER BY number");
    });

    /// <summary>The first row; null where there is none.</summary>
    internal LogRow? First() => Guarded(() =>
    {
        using var connection = Opened();
        return Rows(connection, "ORDER BY number LIMIT 1") is [var row] ? row : null;
    });

    /// <summary>Adds one row, made from the last one and the row of a number that it asks for.</summary>
    internal LogRow Append(Func<LogRow, Func<long, LogRow?>, LogRow> next) => Guarded(() =>
    {
        if (File.Exists(path) && File.GetAttributes(path).HasFlag(FileAttributes.ReadOnly))
        {
            throw new InstrumentLogException($"The instrument log '{path}' is read-only. Nothing was recorded: make it writable, or work on a copy.");
        }

        using var connection = Opened();
        using var transaction = connection.BeginTransaction(deferred: false);
        var last = Rows(connection, "ORDER BY number DESC LIMIT 1") is [var row] ? row : throw new InstrumentLogException($"The instrument log '{path}' has lost its entries. Nothing was recorded: go on with the last good copy.");
        var added = next(last, number => Rows(connection, "WHERE number = $number", number) is [var found] ? found : null);
        Insert(connection, added);
        transaction.Commit();
        return added;
    });

    private T Guarded<T>(Func<T> use)
    {
        try
        {
            return use();
        }
        catch (SqliteException wrong)
        {
            throw LogTrouble.Of(wrong, path);
        }
    }

    private SqliteConnection Opened()
    {
        if (!File.Exists(path)) throw new InstrumentLogException($"There is no instrument log '{path}'. Name the right file, or create the log.");
        if (new FileInfo(path).Length == 0) throw new InstrumentLogException($"The instrument log '{path}' is empty: creating it was interrupted, or it was cut off. Create it again, or take the last good copy.");
        var connection = Connected(SqliteOpenMode.ReadWrite);
        try
        {
            Recognize(connection);
            return connection;
        }
        catch
        {
            connection.Dispose();
            throw;
        }
    }

    private void Recognize(SqliteConnection connection)
    {
        if (Number(connection, "PRAGMA application_id") is not ApplicationId) throw new InstrumentLogException(LogTrouble.NotALog(path));
        if (Number(connection, "PRAGMA user_version") is var format && format != Format)
        {
            throw new InstrumentLogException(FormattableString.Invariant($"The instrument log '{path}' has format {format}; this program knows format {Format}. It was left as it is: use the version of the program that wrote it, or a newer one."));
        }

        // SQLite takes a last page that was cut off for zeros. The length is asked last: a log only grows, perhaps between the two questions.
        var whole = Number(connection, "PRAGMA page_count") * Number(connection, "PRAGMA page_size");
        if (new FileInfo(path).Length < whole) throw new InstrumentLogException(LogTrouble.Damaged(path));
    }

    private SqliteConnection Connected(SqliteOpenMode mode)
    {
        var connection = new SqliteConnection(new SqliteConnectionStringBuilder { DataSource = path, Mode = mode, Pooling = false, DefaultTimeout = 1 }.ToString());
        try
        {
            connection.Open();
            Run(connection, FormattableString.Invariant($"PRAGMA busy_timeout = {(int)patience.TotalMilliseconds}; PRAGMA synchronous = EXTRA; PRAGMA trusted_schema = OFF"));
            if (mostPages is { } pages) Run(connection, FormattableString.Invariant($"PRAGMA max_page_count = {pages}"));
            return connection;
        }
        catch
        {
            connection.Dispose();
            throw;
        }
    }

    private List<LogRow> Rows(SqliteConnection connection, string which, long? number = null)
    {
        using var command = connection.CreateCommand();
        command.CommandText = $"SELECT number, kind, recorded_at, recorded_by, content, digest FROM entry {which}";
        if (number is { } asked) command.Parameters.AddWithValue("$number", asked);
        using var reader = command.ExecuteReader();
        var rows = new List<LogRow>();
        while (reader.Read()) rows.Add(new(reader.GetInt64(0), Text(1), Text(2), Text(3), Text(4), Text(5)));
        return rows;

        string Text(int column) => reader.IsDBNull(column) ? throw new InstrumentLogException(LogTrouble.Damaged(path)) : reader.GetString(column);
    }

    private static void Insert(SqliteConnection connection, LogRow row)
    {
        using var command = connection.CreateCommand();
        command.CommandText = "INSERT INTO entry VALUES ($number, $kind, $recorded_at, $recorded_by, $content, $digest)";
        command.Parameters.AddWithValue("$number", row.Number);
        command.Parameters.AddWithValue("$kind", row.Kind);
        command.Parameters.AddWithValue("$recorded_at", row.RecordedAt);
        command.Parameters.AddWithValue("$recorded_by", row.By);
        command.Parameters.AddWithValue("$content", row.Content);
        command.Parameters.AddWithValue("$digest", row.Digest);
        command.ExecuteNonQuery();
    }

    private static long Number(SqliteConnection connection, string question)
    {
        using var command = connection.CreateCommand();
        command.CommandText = question;
        return (long)command.ExecuteScalar()!;
    }

    private static void Run(SqliteConnection connection, string statements)
    {
        using var command = connection.CreateCommand();
        command.CommandText = statements;
        command.ExecuteNonQuery();
    }
}
