namespace HemoRheo;

/// <summary>Reading what a study names.</summary>
public static class StudyExports
{
    /// <summary>
    /// Reads every export and table of a study. Nothing is guessed, repaired or dropped: what cannot be used is a finding with file, line and column,
    /// and a file that cannot be read is one too.
    /// </summary>
    /// <param name="study">An opened study.</param>
    public static StudyReadings ReadExports(this Study study)
    {
        var loose = new List<Finding>();
        var tables = StudyTables.Read(study);
        var blood = ExportFolder.Find(study, study.Files.Exports, loose);
        var checks = ExportFolder.Find(study, study.Files.Checks, loose);
        var blanks = ExportFolder.Find(study, study.Files.Blanks, loose);
        var twice = blood.Intersect(checks).Concat(blood.Concat(checks).Intersect(blanks)).ToHashSet();
        List<FileReading> files =
        [
            .. blood.Except(twice).Select(path => FileReader.Read(study, path, RecordingKind.Blood)),
            .. checks.Except(twice).Select(path => FileReader.Read(study, path, RecordingKind.Check)),
            .. blanks.Except(twice).Select(path => FileReader.Read(study, path, RecordingKind.Blank)),
            .. twice.Select(path => InTwoLists(study, path)),
        ];
        tables = SampleMetadata.Complete(tables, files);
        var recordings = new RecordingJoin(study, tables).Complete(files);
        loose.AddRange(Unmatched(study, tables, files));
        if (blood.Count == 0)
            loose.AddRange(study.Files.Exports.Where(path => Directory.Exists(Path.GetFullPath(path, study.Folder))).Select(path => ExportFindings.NoExports.At(new(path), "Found no file in this folder, expected exports of blood.")));
        var shown = files.Concat(tables.Files).Select(file => file.AsFile()).OrderBy(file => file.Path, StringComparer.Ordinal).ToItems();
        return new(
            study,
            shown,
            recordings.Where(recording => recording.Kind == RecordingKind.Blood).OrderBy(recording => recording.Sample, StringComparer.Ordinal).ThenBy(recording => recording.Loading).ToItems(),
            ByTime(recordings, RecordingKind.Check),
            tables.Samples.Select(row => row.Record).OrderBy(record => record.Sample, StringComparer.Ordinal).ToItems(),
            tables.People.OrderBy(person => person.Id, StringComparer.Ordinal).ToItems(),
            shown.SelectMany(file => file.Findings).Concat(loose).ToItems())
        {
            Blanks = ByTime(recordings, RecordingKind.Blank),
        };
    }

    private static Items<Recording> ByTime(List<Recording> recordings, RecordingKind kind) =>
        recordings.Where(recording => recording.Kind == kind).OrderBy(recording => recording.StartedAt).ThenBy(recording => recording.Sample, StringComparer.Ordinal).ToItems();

    private static FileReading InTwoLists(Study study, string path)
    {
        var findings = new FileFindings(FolderPath.Shown(study.Folder, path));
        findings.Refuse(ExportFindings.FileInBothLists, null, null, "Found this file in more than one of exports, checks and blanks, expected it in one of them.");
        return FileReader.Opened(path, findings.File, "utf-8", null, findings, _ => []);
    }

    private static IEnumerable<Finding> Unmatched(Study study, StudyTables tables, List<FileReading> files)
    {
        var drafts = files.SelectMany(file => file.Drafts).ToList();
        var blood = drafts.Where(draft => draft.Kind == RecordingKind.Blood).Select(draft => draft.Sample).ToHashSet();
        var others = drafts.Where(draft => draft.Kind != RecordingKind.Blood).Select(draft => draft.Sample).ToHashSet();
        var people = tables.People.Select(person => person.Id).ToHashSet();
        var measured = tables.Samples.Select(row => row.Record.Person).ToHashSet();
        foreach (var row in tables.Samples.Where(row => !blood.Contains(row.Record.Sample)))
            yield return ExportFindings.SampleWithoutRecording.At(row.Record.Where, "Found no recording of this sample in the exports.");
        foreach (var row in tables.Checks.Where(row => !others.Contains(row.Check)))
            yield return ExportFindings.CheckWithoutRecording.At(row.Where, "Found no recording of this check in the exports.");
        if (study.Files.People is null) yield break;
        foreach (var row in tables.Samples.Where(row => !people.Contains(row.Record.Person)))
            yield return ExportFindings.PersonNotInTable.At(row.Record.Where, $"Found no usable row of the people table {study.Files.People} for this sample's person.");
        foreach (var person in tables.People.Where(person => !measured.Contains(person.Id)))
            yield return ExportFindings.PersonNotMeasured.At(person.Where, "Found no sample of this person.");
    }
}
