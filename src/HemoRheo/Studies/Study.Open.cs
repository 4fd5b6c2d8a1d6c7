using System.Security.Cryptography;

namespace HemoRheo;

public sealed partial record Study
{
    private const int LargestStudyFile = 4 * 1024 * 1024;

    /// <summary>Opens a study file and checks everything it says; the data it names are not read yet.</summary>
    /// <param name="path">Path of the study file (TOML, UTF-8).</param>
    /// <exception cref="FileNotFoundException">There is no such file.</exception>
    /// <exception cref="StudyFileException">The file has faults; the exception lists every one with line, column, what was found, what was expected and what to do.</exception>
    public static Study Open(string path)
    {
        var full = Path.GetFullPath(path);
        var fileName = Path.GetFileName(full);
        if (!File.Exists(full)) throw new FileNotFoundException($"There is no study file \"{fileName}\" in that folder. Give the path of a study file, or make one with Study.Template().", fileName);
        var faults = new StudyFileFaults(fileName);
        if (new FileInfo(full).Length > LargestStudyFile) faults.Add(1, 1, "a file of more than 4 MiB", "a study file", "give the path of the study file, not of data");
        faults.ThrowIfAny();
        var bytes = File.ReadAllBytes(full);
        var text = StudyText.Decoded(bytes, faults);
        faults.ThrowIfAny();
        return new StudyFileReader(Path.GetDirectoryName(full)!, fileName, Convert.ToHexStringLower(SHA256.HashData(bytes))).Read(text);
    }
}
