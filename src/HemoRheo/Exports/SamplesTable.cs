namespace HemoRheo;

/// <summary>Reads the samples table.</summary>
internal static class SamplesTable
{
    /// <summary>The columns it may have. That of persons is required where no layout has a field for them.</summary>
    public static Items<TableColumn> Columns(Study study) =>
    [
        new("sample", Required: true),
        new("person", Required: !study.Layouts.Any(layout => layout.Fields.Any(field => field.Meaning == FieldMeaning.Person))),
        new("visit"),
        new("drawn_at"),
        new("hematocrit", Quantity.Fraction),
        new("counter"),
        new("plasma_viscosity", Quantity.Viscosity),
        new("plasma_temperature", Quantity.Temperature),
        new("plasma_instrument"),
        new("plasma_measured_at"),
        new("fibrinogen", Quantity.Concentration),
        new("instrument"),
        new("geometry"),
        new("started_at"),
    ];

    public static List<SampleRow> Of(List<TableRow> rows, Study study, FileFindings findings)
    {
        var values = new TableValues(findings);
        return [.. values.Identified(rows, "sample").Select(row => Row(row, study, values))];
    }

    private static SampleRow Row(TableRow row, Study study, TableValues values)
    {
        var sample = row["sample"]!;
        var where = new Where(values.Findings.File, Line: row.Line, Sample: sample);
        var hematocrit = HematocritOf(row, values, where);
        var counter = values.Declared(row, "counter", study.Counters.Select(counter => counter.Name), sample);
        if (hematocrit is not null && row["counter"] is null)
            values.Findings.Add(ExportFindings.SampleWithoutCounter.At(where, "Found a hematocrit without counter, expected the name of one of [[counters]]."));
        var visit = values.Whole(row, "visit", sample);
        var record = new SampleRecord(
            sample,
            row["person"] ?? "",
            visit ?? 1,
            values.Time(row, "drawn_at", sample),
            hematocrit,
            counter,
            values.Amount(row, "plasma_viscosity", viscosity => viscosity > 0, "a viscosity greater than 0", sample) is { } viscosity ? Viscosity.FromPascalSeconds(viscosity) : null,
            values.Amount(row, "plasma_temperature", degrees => degrees is > 0 and < 100, "a temperature between 0 and 100 °C", sample) is { } degrees ? Temperature.FromDegreesCelsius(degrees) : null,
            row["plasma_instrument"],
            values.Time(row, "plasma_measured_at", sample),
            values.Amount(row, "fibrinogen", fibrinogen => fibrinogen >= 0, "0 or more", sample),
            where);
        return new(
            record,
            row["person"],
            row.At(values.Findings.File, "person").Column,
            visit,
            values.Declared(row, "instrument", study.Instruments.Select(instrument => instrument.Name), sample),
            values.Declared(row, "geometry", study.Geometries.Select(geometry => geometry.Name), sample),
            values.Time(row, "started_at", sample));
    }

    private static Hematocrit? HematocritOf(TableRow row, TableValues values, Where where)
    {
        if (row["hematocrit"] is not { } text)
        {
            values.Findings.Add(ExportFindings.SampleWithoutHematocrit.At(row.At(values.Findings.File, "hematocrit") with { Sample = where.Sample }, "Found no hematocrit for the sample, expected a number in a column such as hematocrit [L/L]; values cannot be moved to the standard hematocrit."));
            return null;
        }

        var (_, column, unit) = row.Fields["hematocrit"];
        if (NumberText.Read(text, TableReader.DecimalSign, out var number) == NumberFault.None && !(unit!.ToSi(number) is >= 0.01 and < 1))
        {
            var other = unit.Factor == 1 ? "per cent" : "L/L";
            var hint = unit.Factor == 1 ? number is >= 1 and < 100 : number is > 0 and < 1;
            values.Findings.Add(ExportFindings.HematocritImpossible.At(
                where with { Column = column },
                $"Found a hematocrit of {text} in a column of {unit}, expected {(unit.Factor == 1 ? "0.01 to 1" : "1 to 100")}{(hint ? $"; it may be meant in {other}" : "")}. It was withheld, not rescaled.",
                number));
            return null;
        }

        return values.Amount(row, "hematocrit", _ => true, "", where.Sample) is { } fraction ? Hematocrit.FromLiterPerLiter(fraction) : null;
    }
}
