namespace HemoRheo.Benchmarks.SimulatedCharts;

/// <summary>A check with twelve readings and five contributions, as a log keeps it.</summary>
internal static class InventedLoggedCheck
{
    public static readonly DateTimeOffset Start = new(2026, 3, 2, 9, 0, 0, TimeSpan.FromHours(1));

    public static LoggedCheck Of(string name, DateTimeOffset at, double error, int filling = 1)
    {
        Value value = new(error, [
            new(new(SourceKind.Certificate, "oil, lot 7"), -0.002),
            new(new(SourceKind.FluidBeta, "oil"), 0.0036),
            new(new(SourceKind.Thermometer, "R1"), 0.0022),
            new(new(SourceKind.Fit, $"{name}/{filling}/0"), 0.0031),
            new(new(SourceKind.Day, FormattableString.Invariant($"R1/{at:yyyy-MM-dd}")), 0.0029, "checks of R1", 19),
        ]);
        var readings = Enumerable.Range(1, 12).Select(i => new LoggedReading(0.7 * Math.Pow(1.73, i), 1e-7 * Math.Pow(1.73, i), error + 0.001 * (i - 6)));
        return new("R1", name, filling, at, "oil", "lot 7", new(37), new(0.0048 * Math.Exp(error)), new(0.0048), value, 0.03, CheckOutcome.Passes, 0.999, readings.ToItems(), $"checks/{name}.csv", new string('a', 64));
    }
}
