namespace HemoRheo;

/// <summary>Reads the people table.</summary>
internal static class PeopleTable
{
    /// <summary>The columns it may have.</summary>
    public static Items<TableColumn> Columns { get; } = [new("person", Required: true), new("group", Required: true)];

    public static List<Person> Of(List<TableRow> rows, Study study, FileFindings findings)
    {
        var values = new TableValues(findings);
        var people = new List<Person>();
        foreach (var row in values.Identified(rows, "person"))
        {
            var group = values.Declared(row, "group", study.Groups.Select(group => group.Code), null);
            if (row["group"] is null) findings.Add(ExportFindings.NameUndeclared.At(row.At(findings.File, "group"), "Found a person without group; the row was set aside."));
            if (group is not null) people.Add(new(row["person"]!, group, new(findings.File, Line: row.Line)));
        }

        return people;
    }
}
