using System.Globalization;

namespace HemoRheo.Benchmarks.Speed;

/// <summary>Files of curves to be fitted: <c>curve,shear_rate_per_s,stress_Pa,hct</c>.</summary>
internal static class WorkFile
{
    private static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];

    /// <summary>Every curve of a file, in the order of first mention.</summary>
    public static FlowCurve[] Read(string path)
    {
        var lines = File.ReadAllLines(path);
        if (lines.Length == 0 || !lines[0].StartsWith("curve,shear_rate_per_s,stress_Pa", StringComparison.Ordinal)) throw new InvalidDataException($"{path} must begin with the line curve,shear_rate_per_s,stress_Pa,hct.");
        return [.. lines.Skip(1).Where(line => line.Length > 0).Select(line => line.Split(',')).GroupBy(row => row[0])
            .Select(rows => FlowCurve.Of([.. rows.Select(row => Number(row[1]))], [.. rows.Select(row => Number(row[2]))], rows.Key))];
    }

    /// <summary>Invented curves: Quemada truths of blood from anaemic to thick, 12 points, noise 1 % and 0.3 mPa, fixed seed.</summary>
    public static string Write(string path, int curves)
    {
        using var file = new StreamWriter(path) { NewLine = "\n" };
        file.WriteLine("curve,shear_rate_per_s,stress_Pa,hct");
        for (var number = 1; number <= curves; number++)
        {
            var stream = RandomStream.Of(20261201, "work", number);
            var hematocrit = 0.3 + 0.25 * stream.Uniform();
            double[] truth = [0.0011 * Math.Exp(2.4 * hematocrit + 0.05 * stream.Normal()), 2.5 * Math.Exp(0.3 * stream.Normal()), 1 / (1 + Math.Exp(3.8 * hematocrit - 0.4 + 0.15 * stream.Normal()))];
            foreach (var rate in Rates)
            {
                var stress = FlowLaw.Quemada.Stress(ShearRate.FromReciprocalSeconds(rate), truth).Pascals * (1 + 0.01 * stream.Normal()) + 0.0003 * stream.Normal();
                file.WriteLine(string.Create(CultureInfo.InvariantCulture, $"c{number},{rate},{stress:G9},{hematocrit:F3}"));
            }
        }

        return $"{curves} curves";
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
