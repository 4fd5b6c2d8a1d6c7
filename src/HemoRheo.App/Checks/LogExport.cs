namespace HemoRheo.App;

/// <summary>Writes a log out as comma-separated values, and holds it against its digests.</summary>
internal sealed class LogExport(TextWriter output)
{
    /// <summary>Writes all entries to a file, whole or not at all.</summary>
    public int Write(CheckRequest request, string file)
    {
        var log = CheckedStudy.OpenLog(request);
        if (Path.GetFullPath(log.Path) == file) throw new CouldNotRunException($"\"{file}\" is the log itself. Name another file.");
        ReplacedFile.Write(file, log.ToCsv());
        output.Write($"all entries of the {Plain.Text(log.ToString())} are in {Plain.Text(file)}\n");
        return Told(log.Verify(), false);
    }

    /// <summary>Holds every entry against its digest.</summary>
    /// <param name="request">Which log.</param>
    /// <param name="noted">A digest noted outside; null for none.</param>
    /// <param name="strict">Whether the exit code tells that the log was changed.</param>
    public int Verify(CheckRequest request, string? noted, bool strict) => Told(CheckedStudy.OpenLog(request).Verify(noted), strict);

    private int Told(LogVerification verification, bool strict)
    {
        output.Write($"{Plain.Text(verification.ToString())}\n");
        if (!verification.Sound) output.Write($"{CalibrationFindings.LogBroken.WhatToDo}\n");
        return strict && !verification.Sound ? ExitCode.NeedsAPerson : ExitCode.Done;
    }
}
