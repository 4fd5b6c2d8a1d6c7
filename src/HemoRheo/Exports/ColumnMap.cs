namespace HemoRheo;

/// <summary>Which column of a header row holds what.</summary>
internal sealed class ColumnMap
{
    private readonly (LayoutField Field, int Column)[] _columns;

    private ColumnMap((LayoutField, int)[] columns, int count) => (_columns, Count) = (columns, count);

    /// <summary>Number of fields of the header row.</summary>
    public int Count { get; }

    /// <summary>Finds every declared column by its exact header text. Null, with the file refused, where one is missing, stands twice or has another unit.</summary>
    public static ColumnMap? Of(IEnumerable<LayoutField> declared, List<string> headers, int line, FileFindings findings)
    {
        var columns = new List<(LayoutField, int)>();
        foreach (var field in declared)
        {
            var at = headers.IndexOf(field.Header);
            if (at < 0) RefuseMissing(field, headers, line, findings);
            else if (headers.IndexOf(field.Header, at + 1) is var again and >= 0)
                findings.Refuse(ExportFindings.ColumnTwice, line, again + 1, $"Found the column \"{field.Header}\" twice (columns {at + 1} and {again + 1}), expected it once.");
            else columns.Add((field, at));
        }

        if (findings.Refused) return null;
        var read = columns.Select(column => column.Item2).ToHashSet();
        var others = headers.Where((_, at) => !read.Contains(at)).ToArray();
        if (others.Length > 0) findings.Add(ExportFindings.ColumnsNotRead, line, null, $"Columns not read: {string.Join(", ", others.Select(header => $"\"{header}\""))}.");
        return new([.. columns], headers.Count);
    }

    /// <summary>Puts the fields of a row where they belong.</summary>
    public void Put(List<string> fields, int line, FieldTexts into)
    {
        foreach (var (field, column) in _columns) into.Put(field.Meaning, fields[column], line, column + 1);
    }

    private static void RefuseMissing(LayoutField field, List<string> headers, int line, FileFindings findings)
    {
        var name = HeaderUnit.Name(field.Header);
        var same = headers.FindIndex(header => HeaderUnit.Spelling(header) is not null && HeaderUnit.Name(header) == name);
        if (same >= 0 && field.Unit is not null)
        {
            var spelling = HeaderUnit.Spelling(headers[same])!;
            if (UnitTable.FindAll(spelling).Count == 0)
                findings.Refuse(ExportFindings.UnknownUnit, line, same + 1, $"Found the unknown unit \"{spelling}\" in the header \"{headers[same]}\", expected \"{field.Header}\"{(UnitTable.Nearest(spelling, field.Unit.Quantity) is { } unit ? $"; the nearest spelling is \"{unit}\"" : "")}.");
            else
                findings.Refuse(ExportFindings.HeaderUnitDiffers, line, same + 1, $"Found the header \"{headers[same]}\", expected \"{field.Header}\" in {field.Unit}.");
            return;
        }

        var near = Spelling.Nearest(field.Header, headers);
        findings.Refuse(ExportFindings.ColumnMissing, line, null, $"Found no column \"{field.Header}\" ({field.Meaning.Word()}){(near is null ? "" : $"; the nearest header is \"{near}\"")}.");
    }
}
