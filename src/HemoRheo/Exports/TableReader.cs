namespace HemoRheo;

/// <summary>Reads the tables of a study: comma, decimal point, UTF-8, one header row; columns by exact name with the unit in brackets.</summary>
internal static class TableReader
{
    public const char DecimalSign = '.';

    /// <summary>The rows; none, with findings, where the table was refused.</summary>
    public static List<TableRow> Read(TextLines lines, Items<TableColumn> known, Items<string> allowed, FileFindings findings)
    {
        var rows = new List<TableRow>();
        var fields = new List<string>();
        List<(string Name, int Column, Unit? Unit)>? header = null;
        var count = 0;
        while (!findings.Refused && lines.TryRead(out var line))
        {
            if (string.IsNullOrWhiteSpace(line.Text)) continue;
            if (!FieldSplitter.Split(line.Text, ',', fields))
            {
                findings.Refuse(ExportFindings.QuoteNotClosed, line.Number, null, "Found a quote that is not closed, or text after a closing quote.");
            }
            else if (header is null)
            {
                (header, count) = (Header(fields, known, allowed, line.Number, findings), fields.Count);
            }
            else if (fields.Count != count)
            {
                findings.Add(ExportFindings.FieldCountDiffers, line.Number, Math.Min(fields.Count, count) + 1, $"Found {fields.Count} fields, expected {count}; the row was kept out.");
            }
            else
            {
                rows.Add(new(line.Number, header.ToDictionary(column => column.Name, column => (fields[column.Column], column.Column + 1, column.Unit))));
            }
        }

        if (lines.Fault is { } fault) findings.Refuse(fault);
        else if (header is null && !findings.Refused) findings.Refuse(ExportFindings.FileEmpty, 1, 1, "Found no text, expected a header row.");
        return findings.Refused ? [] : rows;
    }

    private static List<(string Name, int Column, Unit? Unit)> Header(List<string> fields, Items<TableColumn> known, Items<string> allowed, int line, FileFindings findings)
    {
        var header = new List<(string, int, Unit?)>();
        for (var at = 0; at < fields.Count; at++)
        {
            var name = HeaderUnit.BeforeBrackets(fields[at]);
            var column = known.FirstOrDefault(column => column.Name == name);
            if (column is not null && header.Any(earlier => earlier.Item1 == name))
                findings.Refuse(ExportFindings.TableColumnTwice, line, at + 1, $"Found the column {name} a second time.");
            else if (column is not null)
                Add(column, fields[at], at, line, header, findings);
            else if (allowed.Contains(fields[at]) || allowed.Contains(name))
                findings.Add(ExportFindings.ColumnsNotRead, line, at + 1, $"The column \"{name}\" is allowed and not read.");
            else if (DirectIdentifier.IsLike(name))
                findings.Refuse(ExportFindings.DirectIdentifierColumn, line, at + 1, $"Found the column \"{name}\", which looks like a direct identifier of people; the table was refused.");
            else
                findings.Add(ExportFindings.TableColumnUnknown, line, at + 1, $"Found the unknown column \"{name}\"{(Spelling.Nearest(name, known.Select(other => other.Name)) is { } near ? $"; did you mean {near}?" : "")}; it was not read.");
        }

        foreach (var missing in known.Where(column => column.Required && !header.Any(there => there.Item1 == column.Name)))
            RefuseMissing(missing, fields, line, findings);
        return header;
    }

    private static void RefuseMissing(TableColumn missing, List<string> fields, int line, FileFindings findings)
    {
        var semicolons = fields.Count == 1 && fields[0].Contains(';', StringComparison.Ordinal);
        var near = Spelling.Nearest(missing.Name, fields.Select(HeaderUnit.BeforeBrackets));
        var column = semicolons ? 0 : fields.FindIndex(field => HeaderUnit.BeforeBrackets(field) == near);
        var why = semicolons ? "; the fields are separated by semicolons, expected commas" : near is null ? "" : $"; the nearest header is \"{near}\"";
        findings.Refuse(ExportFindings.TableColumnMissing, line, column < 0 ? null : column + 1, $"Found no column {missing.Name}, expected it in the header row{why}.");
    }

    private static void Add(TableColumn column, string text, int at, int line, List<(string, int, Unit?)> header, FileFindings findings)
    {
        var spelling = HeaderUnit.Bracketed(text);
        if (column.Quantity is not { } quantity)
        {
            header.Add((column.Name, at, null));
            return;
        }

        var unit = spelling is null ? null : UnitTable.Find(spelling, quantity);
        if (unit is not null) header.Add((column.Name, at, unit));
        else if (spelling is null) findings.Add(ExportFindings.TableColumnUnit, line, at + 1, $"Found the header \"{text}\" without a unit, expected one of {string.Join(", ", UnitTable.SpellingsOf(quantity).Select(known => $"{column.Name} [{known}]"))}; the column was not read.");
        else findings.Add(ExportFindings.TableColumnUnit, line, at + 1, $"Found the unknown unit \"{spelling}\" in the header \"{text}\", expected one of {string.Join(", ", UnitTable.SpellingsOf(quantity))}; the column was not read.");
    }
}
