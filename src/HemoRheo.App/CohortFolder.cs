using System.Text;
using HemoRheo.App.Synthetic;

namespace HemoRheo.App;

/// <summary>Writes the synthetic cohort into a folder, never over files that differ unless that is asked for.</summary>
internal static class CohortFolder
{
    private static readonly UTF8Encoding Utf8 = new(encoderShouldEmitUTF8Identifier: false);

    /// <summary>Writes all files.</summary>
    /// <param name="folder">The folder; made where it is not there.</param>
    /// <param name="seed">The seed.</param>
    /// <param name="replace">Whether files of the same names may be replaced.</param>
    /// <returns>How many files the cohort has.</returns>
    public static int Write(string folder, long seed, bool replace)
    {
        var files = SyntheticCohort.Files(seed);
        if (!replace && files.FirstOrDefault(file => Differs(folder, file)) is { } first)
        {
            throw new CouldNotRunException($"\"{first.Path}\" is in \"{folder}\" already and would change. Choose a new folder, or add --replace.");
        }
        foreach (var file in files)
        {
            var path = PathOf(folder, file);
            Directory.CreateDirectory(Path.GetDirectoryName(path)!);
            File.WriteAllBytes(path, Utf8.GetBytes(file.Text));
        }
        return files.Count;
    }

    private static bool Differs(string folder, SyntheticFile file)
    {
        var path = PathOf(folder, file);
        return File.Exists(path) && !File.ReadAllBytes(path).AsSpan().SequenceEqual(Utf8.GetBytes(file.Text));
    }

    private static string PathOf(string folder, SyntheticFile file) => Path.Combine(folder, file.Path.Replace('/', Path.DirectorySeparatorChar));
}
