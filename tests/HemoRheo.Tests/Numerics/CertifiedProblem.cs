using System.Globalization;
using System.Text.RegularExpressions;

namespace HemoRheo.Tests.Numerics;

/// <summary>A nonlinear problem of the NIST Statistical Reference Datasets, read from its own file.</summary>
internal sealed partial class CertifiedProblem
{
    private CertifiedProblem(string path)
    {
        Name = Path.GetFileNameWithoutExtension(path);
        var lines = File.ReadAllLines(path);
        foreach (var line in lines)
        {
            if (ParameterLine().Match(line) is { Success: true } parameter)
            {
                Start1.Add(Number(parameter.Groups[1].Value));
                Start2.Add(Number(parameter.Groups[2].Value));
                Certified.Add(Number(parameter.Groups[3].Value));
                Deviations.Add(Number(parameter.Groups[4].Value));
            }
            else if (SumLine().Match(line) is { Success: true } sum)
            {
                SumOfSquares = Number(sum.Groups[1].Value);
            }
        }

        var data = lines.Skip(60).Select(line => line.Split(' ', StringSplitOptions.RemoveEmptyEntries)).Where(fields => fields.Length >= 2).Select(fields => fields.Select(Number).ToArray()).ToArray();
        Y = [.. data.Select(row => Name == "Nelson" ? Math.Log(row[0]) : row[0])];
        Predictors = [.. Enumerable.Range(1, data[0].Length - 1).Select(j => data.Select(row => row[j]).ToArray())];
    }

    /// <summary>The names of all 27, from lower to higher difficulty.</summary>
    public static IReadOnlyList<string> Names { get; } =
    [
        "Misra1a", "Chwirut2", "Chwirut1", "Lanczos3", "Gauss1", "Gauss2", "DanWood", "Misra1b",
        "Kirby2", "Hahn1", "Nelson", "MGH17", "Lanczos1", "Lanczos2", "Gauss3", "Misra1c", "Misra1d", "Roszman1", "ENSO",
        "MGH09", "Thurber", "BoxBOD", "Rat42", "MGH10", "Eckerle4", "Rat43", "Bennett5",
    ];

    public string Name { get; }

    public List<double> Start1 { get; } = [];

    public List<double> Start2 { get; } = [];

    public List<double> Certified { get; } = [];

    public List<double> Deviations { get; } = [];

    public double SumOfSquares { get; }

    /// <summary>The response as the model states it: the logarithm of the data for Nelson.</summary>
    public double[] Y { get; }

    public double[][] Predictors { get; }

    /// <summary>A problem from a folder of files.</summary>
    public static CertifiedProblem Read(string folder, string name) => new(Path.Combine(folder, name + ".dat"));

    /// <summary>Correct significant digits, at most 11, which is how many are certified.</summary>
    public static double Digits(double found, double certified) =>
        double.IsNaN(found) ? 0 : Math.Clamp(-Math.Log10(Math.Abs(found - certified) / Math.Abs(certified)), 0, 11);

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^\s*b\d+ =\s+(\S+)\s+(\S+)\s+(\S+)\s+(\S+)\s*$")]
    private static partial Regex ParameterLine();

    [GeneratedRegex(@"^Residual Sum of Squares:\s+(\S+)\s*$")]
    private static partial Regex SumLine();
}
