using System.Globalization;

namespace HemoRheo.App;

/// <summary>
/// A results folder that is replaced whole: the new one is filled under a temporary name beside it, then takes its place.
/// Whatever interrupts a run, the folder holds either the previous results or the new ones.
/// </summary>
internal sealed class OutputFolder
{
    /// <summary>Name of the record of a run, which marks a folder as results of this program.</summary>
    public const string RecordName = "run.json";

    private readonly Action<string, string> move;

    /// <summary>A results folder.</summary>
    /// <param name="path">Where results go.</param>
    /// <param name="studyFolder">The study's folder, which results must never replace.</param>
    public OutputFolder(string path, string studyFolder) : this(path, studyFolder, Directory.Move)
    {
    }

    internal OutputFolder(string path, string studyFolder, Action<string, string> move)
    {
        Path = System.IO.Path.TrimEndingDirectorySeparator(System.IO.Path.GetFullPath(path));
        this.move = move;
        RefuseWhatIsNotOurs(studyFolder);
        PutBackWhatAnInterruptedSwapLeft();
        RefuseFilesOfSomebodyElse();
    }

    /// <summary>Full path.</summary>
    public string Path { get; }

    /// <summary>The previous run's record; null where there is none.</summary>
    public string? PreviousRecord()
    {
        var file = System.IO.Path.Combine(Path, RecordName);
        return File.Exists(file) ? File.ReadAllText(file) : null;
    }

    /// <summary>Fills a new folder and puts it in place of the old one. When filling fails or is cancelled, the old one stays as it was.</summary>
    /// <param name="fill">Writes everything into the folder it is given.</param>
    public void Replace(Action<string> fill)
    {
        var fresh = FreeName("tmp");
        try
        {
            Directory.CreateDirectory(fresh);
            using (var list = WrittenFiles.Begin(fresh))
            {
                fill(fresh);
                WrittenFiles.End(list, fresh);
            }
            RefuseFilesOfSomebodyElse();
            Swap(fresh);
            RemoveWhatKilledRunsLeft();
        }
        finally
        {
            if (Directory.Exists(fresh)) Directory.Delete(fresh, recursive: true);
        }
    }

    private void Swap(string fresh)
    {
        if (!Directory.Exists(Path))
        {
            move(fresh, Path);
            return;
        }
        var old = FreeName("old");
        move(Path, old);
        try
        {
            move(fresh, Path);
        }
        catch
        {
            move(old, Path);
            throw;
        }
        Directory.Delete(old, recursive: true);
    }

    private void RefuseWhatIsNotOurs(string studyFolder)
    {
        if (File.Exists(Path)) throw new CouldNotRunException($"\"{Path}\" is a file; results need a folder.");
        var study = System.IO.Path.TrimEndingDirectorySeparator(System.IO.Path.GetFullPath(studyFolder)) + System.IO.Path.DirectorySeparatorChar;
        if (study.StartsWith(Path + System.IO.Path.DirectorySeparatorChar, StringComparison.Ordinal))
        {
            throw new CouldNotRunException($"Results are replaced whole at every run, and \"{Path}\" holds the study. Choose a folder of its own.");
        }
        if (Directory.Exists(Path) && Directory.EnumerateFileSystemEntries(Path).Any() && !File.Exists(System.IO.Path.Combine(Path, RecordName)))
        {
            throw new CouldNotRunException($"\"{Path}\" holds other files than results of this program, and results are replaced whole at every run. Choose a new or empty folder.");
        }
    }

    private void RefuseFilesOfSomebodyElse()
    {
        if (!Directory.Exists(Path) || WrittenFiles.FirstOfSomebodyElse(Path) is not { } file) return;
        throw new CouldNotRunException($"\"{file}\" in \"{Path}\" was not written by this program, and results are replaced whole at every run. Move it elsewhere, or choose another folder with --output.");
    }

    private void RemoveWhatKilledRunsLeft()
    {
        foreach (var left in Directory.EnumerateDirectories(System.IO.Path.GetDirectoryName(Path)!, System.IO.Path.GetFileName(Path) + ".tmp-*").Where(WrittenFiles.IsLeft).ToArray())
        {
            Directory.Delete(left, recursive: true);
        }
    }

    private void PutBackWhatAnInterruptedSwapLeft()
    {
        var parent = System.IO.Path.GetDirectoryName(Path);
        if (parent is null || !Directory.Exists(parent) || Directory.Exists(Path)) return;
        var left = Directory.EnumerateDirectories(parent, System.IO.Path.GetFileName(Path) + ".old-*")
            .Where(folder => File.Exists(System.IO.Path.Combine(folder, RecordName)))
            .Order(StringComparer.Ordinal)
            .FirstOrDefault();
        if (left is not null) Directory.Move(left, Path);
    }

    private string FreeName(string kind)
    {
        var number = 1;
        string Name() => Path + "." + kind + "-" + number.ToString(CultureInfo.InvariantCulture);
        while (Directory.Exists(Name())) number++;
        return Name();
    }
}
