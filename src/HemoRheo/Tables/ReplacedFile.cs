using System.Text;

namespace HemoRheo;

/// <summary>Writes a file whole or not at all: under a temporary name in the same folder, then renamed over the old one. An interrupted write leaves the old file as it was.</summary>
public static class ReplacedFile
{
    /// <summary>What a file is called while it is being written: its name with this at the end.</summary>
    public const string Unfinished = ".unfinished";

    /// <summary>Writes text as UTF-8 without a byte order mark.</summary>
    /// <param name="path">Path of the file; its folder exists.</param>
    /// <param name="text">The text.</param>
    /// <exception cref="IOException">It cannot be written; the old file is as it was.</exception>
    public static void Write(string path, string text) => Write(path, new UTF8Encoding(encoderShouldEmitUTF8Identifier: false).GetBytes(text));

    /// <summary>Writes bytes.</summary>
    /// <param name="path">Path of the file; its folder exists.</param>
    /// <param name="bytes">The bytes.</param>
    /// <exception cref="IOException">It cannot be written; the old file is as it was.</exception>
    public static void Write(string path, ReadOnlySpan<byte> bytes)
    {
        var unfinished = path + Unfinished;
        File.Delete(unfinished);
        try
        {
            using (var stream = new FileStream(unfinished, FileMode.CreateNew, FileAccess.Write, FileShare.None))
            {
                stream.Write(bytes);
                stream.Flush(flushToDisk: true);
            }

            File.Move(unfinished, path, overwrite: true);
        }
        catch
        {
            File.Delete(unfinished);
            throw;
        }
    }
}
