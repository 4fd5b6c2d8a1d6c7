using System.Globalization;

namespace HemoRheo;

/// <summary>Values of the rows of one table; what cannot be read is withheld with a finding.</summary>
internal sealed class TableValues(FileFindings findings)
{
    public FileFindings Findings { get; } = findings;

    public double? Amount(TableRow row, string column, Func<double, bool> possible, string expected, string? sample)
    {
        if (row[column] is not { } text) return null;
        var where = row.At(Findings.File, column) with { Sample = sample };
        var unit = row.Fields[column].Unit!;
        switch (NumberText.Read(text, TableReader.DecimalSign, out var number))
        {
            case NumberFault.None when possible(unit.ToSi(number)):
                return unit.ToSi(number);
            case NumberFault.None:
                Findings.Add(ExportFindings.ValueImpossible.At(where, $"Found {column} {text} {unit}, expected {expected}; it was withheld.", number));
                return null;
            case NumberFault.OtherDecimalSign:
                Findings.Add(ExportFindings.TableValueNotRead.At(where, $"Found {column} \"{text}\" with a decimal comma, expected a decimal point; it was withheld."));
                return null;
            default:
                Findings.Add(ExportFindings.TableValueNotRead.At(where, $"Found a {column} that is not a finite number; it was withheld."));
                return null;
        }
    }

    public DateTimeOffset? Time(TableRow row, string column, string? sample)
    {
        if (row[column] is not { } text) return null;
        var moment = TimeText.Read(text, row.At(Findings.File, column) with { Sample = sample }, column, out var finding);
        if (finding is not null) Findings.Add(finding);
        return moment;
    }

    /// <summary>A whole number from 1; null, with a finding, where the text is none.</summary>
    public int? Whole(TableRow row, string column, string? sample)
    {
        if (row[column] is not { } text) return null;
        if (int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out var number) && number > 0) return number;
        Findings.Add(ExportFindings.TableValueNotRead.At(row.At(Findings.File, column) with { Sample = sample }, $"Found a {column} that is not a whole number from 1; it was withheld."));
        return null;
    }

    /// <summary>A name that the study declares; null, with a finding, where it does not.</summary>
    public string? Declared(TableRow row, string column, IEnumerable<string> declared, string? sample)
    {
        if (row[column] is not { } text) return null;
        if (declared.Contains(text)) return text;
        var near = Spelling.Nearest(text, declared);
        Findings.Add(ExportFindings.NameUndeclared.At(row.At(Findings.File, column) with { Sample = sample }, $"Found a {column} that the study file does not declare{(near is null ? "" : $"; did you mean \"{near}\"?")}; it was withheld."));
        return null;
    }

    /// <summary>The rows that have an identifier of their own; rows without one, and all rows that share one, are set aside with findings.</summary>
    public List<TableRow> Identified(List<TableRow> rows, string column)
    {
        foreach (var row in rows.Where(row => row[column] is null))
            Findings.Add(ExportFindings.IdentifierMissing.At(row.At(Findings.File, column), $"Found a row without {column}, expected an identifier; it was set aside."));
        var named = rows.Where(row => row[column] is not null).ToList();
        foreach (var row in named.Where(row => !Identifier.IsPlain(row[column]!)))
            Findings.Add(ExportFindings.IdentifierUnusual.At(row.At(Findings.File, column), Identifier.Expected));
        var groups = named.GroupBy(row => row[column]!).ToList();
        foreach (var same in groups.Where(same => same.Count() > 1))
            foreach (var row in same)
                Findings.Add(ExportFindings.RowTwice.At(row.At(Findings.File, column), $"Found one {column} on the lines {string.Join(", ", same.Select(other => other.Line))}, expected each once; all of them were set aside."));
        return [.. groups.Where(same => same.Count() == 1).Select(same => same.Single())];
    }
}
