namespace HemoRheo;

/// <summary>Finds the files that a study's lists of paths name, in path order; links out of the study's folder are refused.</summary>
internal static class ExportFolder
{
    /// <summary>The files, as full paths, and findings for what could not be reached.</summary>
    public static List<string> Find(Study study, Items<string> paths, List<Finding> findings)
    {
        var files = new SortedSet<string>(StringComparer.Ordinal);
        var seen = new HashSet<string>(StringComparer.Ordinal);
        foreach (var path in paths) Add(study, Path.GetFullPath(path, study.Folder), files, seen, findings);
        return [.. files];
    }

    private static void Add(Study study, string path, SortedSet<string> files, HashSet<string> seen, List<Finding> findings)
    {
        var where = new Where(FolderPath.Shown(study.Folder, path));
        if (FolderPath.LeadsOut(study.Folder, path))
        {
            findings.Add(ExportFindings.PathLeadsOut.At(where with { File = FolderPath.Below(study.Folder, path) ? where.File : null }, "Found a path or link that leads out of the study's folder, expected a file inside it; nothing was read from it."));
        }
        else if (Directory.Exists(path))
        {
            if (!seen.Add(FolderPath.Real(path)!)) return;
            try
            {
                foreach (var entry in Directory.EnumerateFileSystemEntries(path)) Add(study, entry, files, seen, findings);
            }
            catch (UnauthorizedAccessException)
            {
                findings.Add(ExportFindings.FileNotReadable.At(where, "The folder could not be opened."));
            }
        }
        else if (File.Exists(path))
        {
            files.Add(path);
        }
        else
        {
            findings.Add(ExportFindings.FileNotReadable.At(where, "Found no file here, expected the one that the study file or a link names."));
        }
    }
}
