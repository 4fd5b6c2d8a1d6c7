using System.Formats.Tar;

namespace HemoRheo;

/// <summary>Tells files from pipes, sockets and devices, whose opening could wait for ever.</summary>
internal static class RegularFile
{
    /// <summary>Whether a path is a file with a length and an end. The file is not opened.</summary>
    public static bool Is(string path)
    {
        if (FolderPath.Real(path) is not { } real) return false;
        var file = new FileInfo(real);
        if (!file.Exists) return false;
        if (file.Length > 0) return true;

        // Pipes have length 0, as empty files have. The archive writer asks the system for the kind of an entry, and does not open a pipe.
        try
        {
            using var archive = new MemoryStream();
            using (var writer = new TarWriter(archive, TarEntryFormat.Pax, leaveOpen: true)) writer.WriteEntry(real, "entry");
            archive.Position = 0;
            using var reader = new TarReader(archive);
            return reader.GetNextEntry() is { EntryType: TarEntryType.RegularFile };
        }
        catch (IOException)
        {
            return false;
        }
    }
}
