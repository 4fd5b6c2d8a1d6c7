using System.Globalization;

namespace HemoRheo.Tests.Fitting;

/// <summary>The weighted fits of tests/ReferenceData/weighted-fits: curves, and SciPy's numbers for them.</summary>
internal static class WeightedFits
{
    public static ErrorModel Errors { get; } = ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003));

    public static Dictionary<string, FlowCurve> Curves { get; } = Rows("readings.csv")
        .GroupBy(row => $"{row[0]}/{row[1]}")
        .ToDictionary(rows => rows.Key, rows => FlowCurve.Of([.. rows.Select(row => Number(row[3]))], [.. rows.Select(row => Number(row[4]))], rows.Key));

    /// <summary>By curve, law and quantity.</summary>
    public static ILookup<(string Curve, string Law, string Quantity), double> Expected { get; } = Rows("weighted-fits.scipy.csv")
        .ToLookup(row => ($"{row[0]}/{row[1]}", row[2], row[3]), row => Number(row[5]));

    private static IEnumerable<string[]> Rows(string file) => File.ReadLines(Repository.Reference("weighted-fits", file)).Skip(1).Select(line => line.Split(','));

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
