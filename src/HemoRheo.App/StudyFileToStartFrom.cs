using System.Text;

namespace HemoRheo.App;

/// <summary>Writes the commented study file to start from, never over another.</summary>
internal static class StudyFileToStartFrom
{
    /// <summary>What the person does next.</summary>
    /// <param name="path">Path of the file.</param>
    /// <param name="folder">The folder as it was given.</param>
    public static string WhatToDoNext(string path, string folder) => $"""
        {path} is written. Next:
          1. Make the folders exports and checks beside it, and lay the exports of blood and of checks there.
          2. Make samples.csv and people.csv beside it; the study file lists their columns.
          3. Put your own values into the study file: layouts as your exports are, instruments, geometries, fluids, counters, groups.
             Remove the layout you do not need.
          4. hemorheo {folder}
             Whatever does not fit is told with line and column; correct it and run again.

        """.ReplaceLineEndings("\n");

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
