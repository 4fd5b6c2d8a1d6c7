using System.Diagnostics;

namespace HemoRheo.Tests.Architecture;

/// <summary>The files that belong to the repository: those git tracks, or, in a copy without git, those its ignore list does not name.</summary>
internal static class Tracked
{
    private static readonly string[] TextEndings = [".cs", ".md", ".toml", ".csv", ".txt", ".json", ".props", ".targets", ".csproj", ".sln", ".yml", ".config", ".ipynb", ".py", ".R", ".html", ".svg", ".css", ".js", ".editorconfig", ".gitignore", ".gitattributes", ".sh"];

    /// <summary>Paths below the root, with forward slashes.</summary>
    public static IReadOnlyList<string> Paths { get; } = [.. (FromGit() ?? FromFolders()).Where(path => File.Exists(Path.Combine(Repository.Root, path))).Order(StringComparer.Ordinal)];

    public static bool IsText(string path) => TextEndings.Contains(Path.GetExtension(path)) || !Path.GetFileName(path).Contains('.', StringComparison.Ordinal);

    private static IEnumerable<string>? FromGit()
    {
        if (!Path.Exists(Path.Combine(Repository.Root, ".git"))) return null;
        try
        {
            using var git = Process.Start(new ProcessStartInfo("git", ["-c", "safe.directory=*", "-C", Repository.Root, "ls-files", "-z"]) { RedirectStandardOutput = true, RedirectStandardError = true })!;
            var paths = git.StandardOutput.ReadToEnd();
            git.WaitForExit();
            return git.ExitCode == 0 ? paths.Split('\0', StringSplitOptions.RemoveEmptyEntries) : null;
        }
        catch (System.ComponentModel.Win32Exception)
        {
            return null;
        }
    }

    private static IEnumerable<string> FromFolders()
    {
        var ignored = File.ReadLines(Path.Combine(Repository.Root, ".gitignore")).Where(line => line.EndsWith('/')).Select(line => line.Trim('/')).Append(".git").ToHashSet();
        return Directory.EnumerateFiles(Repository.Root, "*", SearchOption.AllDirectories).Select(Sources.Short).Where(path => !path.Split('/').Any(ignored.Contains));
    }
}
