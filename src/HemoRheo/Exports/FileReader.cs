using System.IO.Enumeration;

namespace HemoRheo;

/// <summary>Reads one export file by the layout that its name asks for.</summary>
internal static class FileReader
{
    public static FileReading Read(Study study, string path, RecordingKind kind)
    {
        var shown = FolderPath.Shown(study.Folder, path);
        var findings = new FileFindings(shown);
        var name = Path.GetFileName(path);
        var fitting = study.Layouts.Where(layout => layout.Files.Any(pattern => FileSystemName.MatchesSimpleExpression(pattern, name, ignoreCase: false))).ToArray();
        if (fitting.Length == 0) findings.Refuse(ExportFindings.NoLayoutFits, null, null, $"Found no layout for this file name, expected one of {string.Join(", ", study.Layouts.SelectMany(layout => layout.Files))}.");
        if (fitting.Length > 1) findings.Refuse(ExportFindings.TwoLayoutsFit, null, null, $"Found {fitting.Length} layouts for this file name ({string.Join(", ", fitting.Select(layout => layout.Name))}), expected one.");
        var layout = fitting.Length == 1 ? fitting[0] : null;
        return Opened(path, shown, layout?.Encoding ?? "utf-8", layout?.Name, findings, lines => layout switch
        {
            null => [],
            { Shape: LayoutShape.Rows } => new RowsReader(layout, kind, findings).Read(lines),
            _ => new BlocksReader(layout, kind, findings).Read(lines),
        });
    }

    /// <summary>Opens a file, reads it and digests it; a file that cannot be read is a finding.</summary>
    public static FileReading Opened(string path, string shown, string encoding, string? layout, FileFindings findings, Func<TextLines, List<RecordingDraft>> read)
    {
        if (!RegularFile.Is(path))
        {
            findings.Refuse(ExportFindings.FileNotReadable, null, null, "Found a pipe, socket or device, or nothing, expected a file; nothing was read from it.");
            return new(shown, "", layout, findings, []);
        }

        try
        {
            using var lines = new TextLines(new FileStream(path, FileMode.Open, FileAccess.Read, FileShare.Read, bufferSize: 0), shown, encoding);
            var drafts = read(lines);
            return new(shown, lines.Digest(), layout, findings, drafts);
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            findings.Refuse(ExportFindings.FileNotReadable, null, null, "The file could not be opened or read.");
            return new(shown, "", layout, findings, []);
        }
    }
}
