namespace HemoRheo.App;

/// <summary>Where an instrument's log lies.</summary>
/// <param name="Path">Full path.</param>
/// <param name="Named">Whether the command line names it.</param>
internal sealed record LogPlace(string Path, bool Named)
{
    /// <summary>The log that the command line names, or the one beside the study file.</summary>
    /// <param name="named">Full path from the command line; null for none.</param>
    /// <param name="study">The study.</param>
    /// <param name="instrument">Name of the instrument.</param>
    public static LogPlace Of(string? named, Study study, string instrument)
    {
        if (named is not null) return new(named, true);
        var beside = System.IO.Path.Combine(study.Folder, $"checks-of-{Plain(instrument)}.log");
        return new FileInfo(beside).LinkTarget is null
            ? new(beside, false)
            : throw new CouldNotRunException($"\"{beside}\" is a link, and a log outside the study's folder is used only where it is named: --log <file>");
    }

    /// <summary>The contents of the log; null where none is named and none lies beside the study file.</summary>
    public LogContents? ReadIfThere() => Named || File.Exists(Path) ? InstrumentLog.Open(Path).Read() : null;

    /// <summary>The log, which must be there.</summary>
    public InstrumentLog Open() => Named || File.Exists(Path)
        ? InstrumentLog.Open(Path)
        : throw new CouldNotRunException($"There is no log \"{Path}\" yet. \"hemorheo check record\" begins it; a log elsewhere is named with --log <file>");

    private static string Plain(string name) => string.Concat(name.Select(letter => char.IsAsciiLetterOrDigit(letter) || letter is '-' ? letter : '_'));
}
