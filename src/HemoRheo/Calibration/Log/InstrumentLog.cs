using static System.FormattableString;

namespace HemoRheo;

/// <summary>
/// The log of one instrument: checks, adjustments, blank runs and corrections in an append-only file. Nothing in it is edited or deleted; a correction is an entry of its own.
/// Every entry carries a digest over itself and the digest before it, so that a later change shows.
/// </summary>
/// <remarks>
/// The file is open only while it is read or written. Several programs of one machine may use a log at once; on a network share only one machine may write it.
/// An entry is there whole or not at all, also when the program is killed or power is lost. Moments are given by the caller: the library has no clock.
/// </remarks>
public sealed class InstrumentLog
{
    private readonly LogFile _file;

    private InstrumentLog(string path, string instrument, LogFile file) => (Path, Instrument, _file) = (path, instrument, file);

    /// <summary>Path of the file.</summary>
    public string Path { get; }

    /// <summary>Name of the instrument.</summary>
    public string Instrument { get; }

    /// <summary>Creates the log of an instrument; its first entry names it.</summary>
    /// <param name="path">Path of a file that does not exist yet, in a folder that does.</param>
    /// <param name="instrument">Name of the instrument.</param>
    /// <param name="recordedAt">The moment, with offset.</param>
    /// <param name="by">Who creates it.</param>
    /// <exception cref="InstrumentLogException">There is such a file already, or it cannot be written.</exception>
    /// <exception cref="ArgumentException">A name is empty or holds a line break.</exception>
    public static InstrumentLog Create(string path, string instrument, DateTimeOffset recordedAt, string by)
    {
        var file = FileAt(path);
        file.Create(_ => LogEntries.Row(null, new LoggedOpening(LogEntries.Checked(instrument, "name of an instrument")), recordedAt, by));
        return new(path, instrument, file);
    }

    /// <summary>Opens a log.</summary>
    /// <param name="path">Path of the file.</param>
    /// <exception cref="InstrumentLogException">There is no such file, it is no log, damaged, locked, or of a newer version; the message says what to do.</exception>
    public static InstrumentLog Open(string path) => Open(path, FileAt(path));

    internal static InstrumentLog Open(string path, TimeSpan patience, int? mostPages = null) => Open(path, FileAt(path, patience, mostPages));

    /// <summary>Records what happened.</summary>
    /// <param name="what">A check, adjustment, blank run, or correction.</param>
    /// <param name="recordedAt">The moment of recording, with offset: later than what happened, by days where it is entered late.</param>
    /// <param name="by">Who records it.</param>
    /// <returns>The entry; its findings say where its moment is not after that of the entry before, or before what happened.</returns>
    /// <exception cref="InstrumentLogException">It cannot be written; the log is as it was.</exception>
    /// <exception cref="ArgumentException">The check is of another instrument, a text is empty or holds a line break, a number is not finite, or a correction names no entry that can be corrected.</exception>
    public LogEntry Append(LoggedEvent what, DateTimeOffset recordedAt, string by)
    {
        LogEntries.Check(what, Instrument);
        LogRow? before = null;
        var row = _file.Append((last, find) =>
        {
            if (what is LoggedCorrection correction) LogEntries.CheckTarget(correction, find(correction.Of));
            before = last;
            return LogEntries.Row(last, what, recordedAt, by);
        });
        return LogEntries.Of(row, what, before);
    }

    /// <summary>Reads the whole log, verified, with its corrections applied.</summary>
    /// <exception cref="InstrumentLogException">It cannot be read. A log that was changed is read all the same and says so in its findings.</exception>
    public LogContents Read() => LogReading.Of(Instrument, _file.Rows());

    /// <summary>Holds every entry against its digest.</summary>
    /// <param name="noted">A digest of its last entry noted earlier, to see that nothing was cut off or written anew since; null for none.</param>
    /// <exception cref="InstrumentLogException">It cannot be read.</exception>
    public LogVerification Verify(string? noted = null)
    {
        var rows = _file.Rows();
        return LogChain.Verify(rows, LogJson.TryRead(rows), noted);
    }

    /// <summary>
    /// All entries as comma-separated values, the same bytes for the same entries everywhere: number, kind, moment, who, what a reader looks for in columns of its own,
    /// and at the end the content as it was digested, and the digest.
    /// </summary>
    /// <exception cref="InstrumentLogException">It cannot be read.</exception>
    public string ToCsv() => LogCsv.Write(_file.Rows());

    /// <inheritdoc/>
    public override string ToString() => $"log of {Instrument} in {Path}";

    private static InstrumentLog Open(string path, LogFile file) =>
        file.First() is { } row && LogJson.TryRead(row) is LoggedOpening opening ? new(path, opening.Instrument, file) : throw new InstrumentLogException(Invariant($"The instrument log '{path}' does not begin with its opening entry, so it was tampered with. Keep the file as it is, and go on with the last good copy."));

    private static LogFile FileAt(string path) => FileAt(path, TimeSpan.FromSeconds(10));

    private static LogFile FileAt(string path, TimeSpan patience, int? mostPages = null) => new(System.IO.Path.GetFullPath(path), patience, mostPages);
}
