using System.Globalization;

namespace HemoRheo.Notebooks.Tests;

/// <summary>The truth tables of the committed synthetic cohort.</summary>
internal static class Truth
{
    public static string Folder { get; } = Path.Combine(Repository.Root, "synthetic-cohort");

    /// <summary>Rows of a truth table, each by column.</summary>
    public static IReadOnlyList<IReadOnlyDictionary<string, string>> Rows(string table)
    {
        var lines = File.ReadAllLines(Path.Combine(Folder, "truth", table));
        var columns = lines[0].Split(',');
        return [.. lines.Skip(1).Select(line => columns.Zip(line.Split(',')).ToDictionary(pair => pair.First, pair => pair.Second))];
    }

    /// <summary>Samples that the truth table of faults names for one fault.</summary>
    public static IEnumerable<string> SamplesWith(string fault) => Rows("faults.csv").Where(row => row["what"] == fault).Select(row => row["where"]);

    public static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
