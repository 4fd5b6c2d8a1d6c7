using System.Globalization;
using System.Text.RegularExpressions;

namespace HemoRheo.Tests.Numerics;

/// <summary>A problem of the NIST Statistical Reference Datasets, read from its own file.</summary>
internal sealed partial class CertifiedProblem
{
    private CertifiedProblem(string name)
    {
        var lines = File.ReadAllLines(Repository.Reference("nist-strd", name + ".dat"));
        foreach (var line in lines)
        {
            var parameter = ParameterLine().Match(line);
            if (!parameter.Success) continue;
            Start1.Add(Number(parameter.Groups[1].Value));
            Start2.Add(Number(parameter.Groups[2].Value));
            Certified.Add(Number(parameter.Groups[3].Value));
            Deviations.Add(Number(parameter.Groups[4].Value));
        }

        var data = lines.Skip(60).Select(line => line.Split(' ', StringSplitOptions.RemoveEmptyEntries)).Where(fields => fields.Length == 2).ToArray();
        Y = [.. data.Select(fields => Number(fields[0]))];
        X = [.. data.Select(fields => Number(fields[1]))];
    }

    public List<double> Start1 { get; } = [];

    public List<double> Start2 { get; } = [];

    public List<double> Certified { get; } = [];

    public List<double> Deviations { get; } = [];

    public double[] X { get; }

    public double[] Y { get; }

    public static CertifiedProblem Read(string name) => new(name);

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    [GeneratedRegex(@"^\s*b\d+ =\s+(\S+)\s+(\S+)\s+(\S+)\s+(\S+)\s*$")]
    private static partial Regex ParameterLine();
}
