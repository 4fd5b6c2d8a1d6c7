namespace HemoRheo;

/// <summary>The tables of a study as read.</summary>
internal sealed record StudyTables(List<SampleRow> Samples, List<Person> People, List<CheckRow> Checks, List<FileReading> Files)
{
    public static StudyTables Read(Study study)
    {
        var files = new List<FileReading>();
        List<TRow> Table<TRow>(string? path, string name, Items<TableColumn> columns, Func<List<TableRow>, Study, FileFindings, List<TRow>> of)
        {
            if (path is null) return [];
            var rows = new List<TRow>();
            var full = Path.GetFullPath(path, study.Folder);
            var findings = new FileFindings(FolderPath.Shown(study.Folder, full));
            if (FolderPath.LeadsOut(study.Folder, full))
            {
                findings.Refuse(ExportFindings.PathLeadsOut, null, null, "Found a link that leads out of the study's folder, expected a file inside it; nothing was read from it.");
                files.Add(new(findings.File, "", null, findings, []));
                return rows;
            }

            files.Add(FileReader.Opened(full, findings.File, "utf-8", name, findings, lines =>
            {
                rows = of(TableReader.Read(lines, columns, study.Files.AllowedColumns, findings), study, findings);
                return [];
            }));
            return rows;
        }

        return new(
            Table(study.Files.Samples, "samples table", SamplesTable.Columns(study), SamplesTable.Of),
            Table(study.Files.People, "people table", PeopleTable.Columns, PeopleTable.Of),
            Table(study.Files.CheckTable, "check table", CheckTable.Columns, CheckTable.Of),
            files);
    }
}
