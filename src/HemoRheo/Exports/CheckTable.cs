namespace HemoRheo;

/// <summary>Reads the check table.</summary>
internal static class CheckTable
{
    /// <summary>The columns it may have.</summary>
    public static Items<TableColumn> Columns { get; } = [new("check", Required: true), new("fluid"), new("instrument"), new("geometry"), new("started_at")];

    public static List<CheckRow> Of(List<TableRow> rows, Study study, FileFindings findings)
    {
        var values = new TableValues(findings);
        return [.. values.Identified(rows, "check").Select(row => new CheckRow(
            row["check"]!,
            values.Declared(row, "fluid", study.Fluids.Select(fluid => fluid.Name), row["check"]),
            values.Declared(row, "instrument", study.Instruments.Select(instrument => instrument.Name), row["check"]),
            values.Declared(row, "geometry", study.Geometries.Select(geometry => geometry.Name), row["check"]),
            values.Time(row, "started_at", row["check"]),
            new(findings.File, Line: row.Line, Sample: row["check"])))];
    }
}
