namespace HemoRheo.App;

/// <summary>Finds the study file that a run is about.</summary>
internal static class StudyLocation
{
    /// <summary>Name of a study file.</summary>
    public const string FileName = "study.toml";
    private const string SyntheticFolder = "synthetic-cohort";

    /// <summary>The study file of a folder, or the file itself where one is named.</summary>
    public static string Of(string folderOrFile)
    {
        if (File.Exists(folderOrFile)) return Path.GetFullPath(folderOrFile);
        if (!Directory.Exists(folderOrFile)) throw new CouldNotRunException($"There is no folder \"{folderOrFile}\". Give the folder that holds your {FileName}.");
        var file = Path.Combine(Path.GetFullPath(folderOrFile), FileName);
        return File.Exists(file)
            ? file
            : throw new CouldNotRunException($"There is no {FileName} in \"{folderOrFile}\". \"hemorheo new {folderOrFile}\" writes one to start from.");
    }

    /// <summary>The synthetic cohort's study file, found upward from the first folder that leads to it.</summary>
    public static string OfSyntheticCohort(params IReadOnlyList<string> from)
    {
        foreach (var start in from)
        {
            for (var folder = new DirectoryInfo(start); folder is not null; folder = folder.Parent)
            {
                var file = Path.Combine(folder.FullName, SyntheticFolder, FileName);
                if (File.Exists(file)) return file;
            }
        }
        throw new CouldNotRunException($"There is no {SyntheticFolder}/{FileName} above this folder. Give the folder of a study: hemorheo <folder>");
    }
}
