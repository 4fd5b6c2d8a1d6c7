using System.Globalization;

namespace HemoRheo.Notebooks;

/// <summary>What a point says when the pointer is on it: its numbers, why it is set aside, and the line of the file it came from.</summary>
internal static class PointWords
{
    public static string Of(FlowPoint point, IEnumerable<Finding> findings)
    {
        var lines = new List<string>
        {
            string.Create(CultureInfo.InvariantCulture, $"point {point.Number}: {Rounding.Digits(point.Rate.ReciprocalSeconds, 4)} 1/s, {Rounding.Digits(point.Stress.Millipascals, 4)} mPa, {Rounding.Digits(point.ApparentViscosity.MillipascalSeconds, 4)} mPa·s"),
        };
        if (point.Reading is { } reading)
        {
            if (reading.Temperature is { } temperature) lines.Add(string.Create(CultureInfo.InvariantCulture, $"{temperature:0.00} °C"));
            lines.Add(reading.Where.ToString());
        }

        lines.AddRange(findings.Select(finding => $"{Words.Of(finding.Severity)}: {finding.Message}"));
        return string.Join('\n', lines);
    }
}
