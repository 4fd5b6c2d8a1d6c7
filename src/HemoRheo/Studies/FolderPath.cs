namespace HemoRheo;

/// <summary>Paths below a folder, with links followed: nothing outside the folder is reached.</summary>
internal static class FolderPath
{
    private const int MostLinks = 40;

    /// <summary>The full path with every link followed, folder by folder; null where a chain of links has no end.</summary>
    public static string? Real(string path)
    {
        var links = 0;
        return Real(Path.GetFullPath(path), ref links);
    }

    /// <summary>Whether a path, once links are followed, lies in the folder or below it.</summary>
    public static bool LeadsOut(string folder, string path) => Real(path) is not { } real || Real(folder) is not { } home || !Below(home, real);

    /// <summary>Whether a full path lies in the folder or below it, by its text alone.</summary>
    public static bool Below(string folder, string path)
    {
        var home = Path.TrimEndingDirectorySeparator(folder);
        return path == home || path.StartsWith(Path.EndsInDirectorySeparator(home) ? home : home + Path.DirectorySeparatorChar, StringComparison.Ordinal);
    }

    /// <summary>A path below the folder, with forward slashes.</summary>
    public static string Shown(string folder, string path) => Path.GetRelativePath(folder, path).Replace('\\', '/');

    private static string? Real(string path, ref int links)
    {
        var parent = Path.GetDirectoryName(path);
        if (parent is null) return path;
        var home = Real(parent, ref links);
        if (home is null) return null;
        var whole = Path.Combine(home, Path.GetFileName(path));
        var target = Target(whole);
        if (target is null) return whole;
        return ++links > MostLinks ? null : Real(Path.GetFullPath(target, home), ref links);
    }

    private static string? Target(string path) => Directory.Exists(path) ? new DirectoryInfo(path).LinkTarget : new FileInfo(path).LinkTarget;
}
