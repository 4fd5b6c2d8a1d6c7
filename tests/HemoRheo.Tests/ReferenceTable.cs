using System.Globalization;
using nietras.SeparatedValues;

namespace HemoRheo.Tests;

/// <summary>A CSV file of reference data, row by row, fields by their header.</summary>
internal static class ReferenceTable
{
    internal static IReadOnlyList<IReadOnlyDictionary<string, string>> Read(params string[] parts)
    {
        using var reader = Sep.New(',').Reader(options => options with { Unescape = true }).FromFile(Repository.Reference(parts));
        var header = reader.Header.ColNames;
        var rows = new List<IReadOnlyDictionary<string, string>>();
        foreach (var row in reader)
        {
            var fields = new Dictionary<string, string>();
            foreach (var name in header) fields[name] = row[name].ToString();
            rows.Add(fields);
        }

        return rows;
    }

    internal static double Number(this IReadOnlyDictionary<string, string> row, string column) => double.Parse(row[column], CultureInfo.InvariantCulture);
}
