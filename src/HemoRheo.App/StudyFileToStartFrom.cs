using System.Text;

namespace HemoRheo.App;

/// <summary>Writes the commented study file to start from, never over another.</summary>
internal static class StudyFileToStartFrom
{
    /// <summary>Writes it.</summary>
    /// <param name="folder">The folder; made where it is not there.</param>
    /// <returns>Path of the file.</returns>
    public static string Write(string folder)
    {
        var path = Path.Combine(folder, StudyLocation.FileName);
        if (File.Exists(path)) throw new CouldNotRunException($"There is a {StudyLocation.FileName} in \"{folder}\" already. It was not touched.");
        Directory.CreateDirectory(folder);
        using var file = new FileStream(path, FileMode.CreateNew, FileAccess.Write);
        file.Write(Encoding.UTF8.GetBytes(Study.Template()));
        return path;
    }
}
