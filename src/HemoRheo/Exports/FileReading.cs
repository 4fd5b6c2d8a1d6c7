namespace HemoRheo;

/// <summary>What one file gave: a line of the table of files, and the recordings that began in it.</summary>
internal sealed record FileReading(string Path, string Digest, string? Layout, FileFindings Findings, List<RecordingDraft> Drafts)
{
    /// <summary>The file as the table of files shows it.</summary>
    public ExportFile AsFile()
    {
        var used = Drafts.Where(draft => !draft.SetAside).ToArray();
        return new(Path, Digest, Layout, used.Length, used.Sum(draft => draft.Readings.Count), Findings.All().ToItems());
    }
}
