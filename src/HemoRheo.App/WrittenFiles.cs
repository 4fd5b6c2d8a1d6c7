using System.Text;

namespace HemoRheo.App;

/// <summary>The list of what a run wrote into its results folder. It marks the folder as ours, and all that it does not name as somebody else's.</summary>
internal static class WrittenFiles
{
    /// <summary>Name of the list.</summary>
    public const string Name = "written-files.txt";

    /// <summary>Begins a list in an empty folder. As long as the stream is open, the folder is being filled.</summary>
    public static FileStream Begin(string folder) => new(Path.Combine(folder, Name), FileMode.CreateNew, FileAccess.Write, FileShare.None);

    /// <summary>Writes the list of all files of the folder.</summary>
    public static void End(FileStream list, string folder) =>
        list.Write(Encoding.UTF8.GetBytes(string.Concat(Below(folder).Where(path => path != Name).Select(path => path + "\n"))));

    /// <summary>The first file, in path order, that no run wrote; null where there is none.</summary>
    public static string? FirstOfSomebodyElse(string folder)
    {
        var list = Path.Combine(folder, Name);
        HashSet<string> ours = [Name, OutputFolder.RecordName, .. File.Exists(list) ? File.ReadAllLines(list) : []];
        return Below(folder).FirstOrDefault(path => !ours.Contains(path));
    }

    /// <summary>Whether a folder was begun by a run that is no longer there to end it.</summary>
    public static bool IsLeft(string folder)
    {
        var list = Path.Combine(folder, Name);
        if (!File.Exists(list)) return false;
        try
        {
            using var free = new FileStream(list, FileMode.Open, FileAccess.Write, FileShare.None);
            return true;
        }
        catch (Exception inUse) when (inUse is IOException or UnauthorizedAccessException)
        {
            return false;
        }
    }

    private static IEnumerable<string> Below(string folder) =>
        Directory.EnumerateFiles(folder, "*", SearchOption.AllDirectories).Select(path => Path.GetRelativePath(folder, path).Replace('\\', '/')).Order(StringComparer.Ordinal);
}
