using Microsoft.Data.Sqlite;

namespace HemoRheo;

/// <summary>What is wrong with the file of a log, in plain words.</summary>
internal static class LogTrouble
{
    // Primary result codes of SQLite (sqlite.org/rescode.html).
    private const int Busy = 5;
    private const int Locked = 6;
    private const int ReadOnly = 8;
    private const int ReadOrWriteFailed = 10;
    private const int Corrupt = 11;
    private const int Full = 13;
    private const int CannotOpen = 14;
    private const int NotSqlite = 26;

    internal static InstrumentLogException Of(SqliteException wrong, string path) => new(
        wrong.SqliteErrorCode switch
        {
            Busy or Locked => $"The instrument log '{path}' is being written by another program. Nothing was recorded: close that program or wait, then try again.",
            ReadOnly => $"The instrument log '{path}' or its folder is read-only. Nothing was recorded: make both writable, or work on a copy; a log that a program was stopped in while writing must be opened once where it can be written.",
            Corrupt => Damaged(path),
            Full => $"The disk of the instrument log '{path}' is full. Nothing was recorded: make room and record again.",
            CannotOpen => $"The instrument log '{path}' cannot be opened. Nothing was recorded: see that the folder exists and that this account may read and write it.",
            ReadOrWriteFailed => $"The disk failed while the instrument log '{path}' was read or written. Nothing was recorded: check disk and connection, verify the log, record again.",
            NotSqlite => NotALog(path),
            _ => $"The instrument log '{path}' cannot be used: {wrong.Message} Nothing was recorded.",
        },
        wrong);

    internal static string Damaged(string path) => $"The instrument log '{path}' is damaged or cut off. Nothing was recorded: keep the file as it is, and go on with the last good copy.";

    internal static string NotALog(string path) => $"'{path}' is not an instrument log, or its beginning was overwritten. It was left as it is: name the right file, or create a new log under another name.";
}
