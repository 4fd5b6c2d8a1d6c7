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

    public static string Of(InstrumentCheck check) => string.Create(CultureInfo.InvariantCulture, $"{check.Name}, {check.At:yyyy-MM-dd HH:mm}\n{check.Fluid.Name}: measured {Rounding.Digits(check.Measured.MillipascalSeconds, 4)}, expected {Rounding.Digits(check.Expected.MillipascalSeconds, 4)} mPa·s\n{Words.Of(check.Outcome)}, probability within the limit {check.ProbabilityWithin:0.000}");

    public static string Of(ChartPoint point)
    {
        var (check, interval) = (point.Check, point.Check.Error.Interval().Select(error => 100 * (Math.Exp(error) - 1)));
        var words = string.Create(CultureInfo.InvariantCulture, $"{check.Name}, {check.At:yyyy-MM-dd HH:mm}\n{check.Fluid}: {100 * (Math.Exp(check.Error.X) - 1):+0.00;-0.00} % (95 % interval {interval.Lower:+0.00;-0.00} to {interval.Upper:+0.00;-0.00} %)\n{Words.Of(check.Outcome)}");
        return point.Breaks.Count == 0 ? words : $"{words}\nsignals: {string.Join(", ", point.Breaks.Select(rule => rule.Words()))}";
    }

    public static string Of(string sample, JudgedValue value)
    {
        var lines = new List<string> { value.Value.ToString() };
        if (sample.Length > 0) lines.Insert(0, $"sample {sample}");
        lines.Add(value.Verdict is { } verdict
            ? string.Create(CultureInfo.InvariantCulture, $"{Words.Of(verdict.Outcome)}: below {verdict.Below:0.000}, within {verdict.Within:0.000}, above {verdict.Above:0.000}")
            : $"not judged: {value.WhyNotJudged}");
        if (value.Marked) lines.Add("marked: the instrument was not in order");
        return string.Join('\n', lines);
    }
}
