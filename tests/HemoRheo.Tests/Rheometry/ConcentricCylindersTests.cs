using System.Globalization;
using System.Text.RegularExpressions;

namespace HemoRheo.Tests.Rheometry;

/// <summary>Held against tests/ReferenceData/rheometry/concentric-cylinders.csv (mpmath, 50 digits).</summary>
public class ConcentricCylindersTests
{
    public static TheoryData<string, string, double> CheckPoints()
    {
        var points = new TheoryData<string, string, double>();
        foreach (var row in ReferenceTable.Read("rheometry", "concentric-cylinders.csv").Where(row => row["group"] == "concentric cylinders" && !row["quantity"].StartsWith("narrow-gap", StringComparison.Ordinal)))
        {
            points.Add(row["inputs"], row["quantity"], row.Number("value"));
        }

        return points;
    }

    [Theory]
    [MemberData(nameof(CheckPoints))]
    public void Agrees_with_the_check_point(string inputs, string quantity, double expected)
    {
        var geometry = GeometryOf(inputs);
        var (speed, viscosity) = (NumberAfter(inputs, "speed="), NumberAfter(inputs, "eta="));
        var torque = viscosity * speed * geometry.RatePerSpeed() / geometry.StressPerTorque();
        var actual = quantity switch
        {
            "torque with end factor" => torque,
            var q when q.StartsWith("shear rate at inner wall", StringComparison.Ordinal) => speed * geometry.InnerWallRatePerSpeed(),
            var q when q.StartsWith("shear rate at outer wall", StringComparison.Ordinal) => speed * geometry.OuterWallRatePerSpeed(),
            var q when q.StartsWith("representative shear rate", StringComparison.Ordinal) => speed * geometry.RatePerSpeed(),
            var q when q.StartsWith("stress at inner wall", StringComparison.Ordinal) => torque * geometry.InnerWallStressPerTorque(),
            var q when q.StartsWith("representative stress", StringComparison.Ordinal) => torque * geometry.StressPerTorque(),
            _ => throw new InvalidOperationException($"No relation for '{quantity}'."),
        };
        Assert.Equal(expected, actual, 1e-12 * Math.Abs(expected));
    }

    [Fact]
    public void Thirty_six_points_are_checked() => Assert.Equal(36, CheckPoints().Count);

    private static Geometry GeometryOf(string inputs)
    {
        var length = NumberAfter(inputs, "L=");
        var end = NumberAfter(inputs, "C_L=");
        if (inputs.StartsWith("ISO", StringComparison.Ordinal)) return new("iso", 0.0125, 0.0125 * 1.0847, length, end);
        return new("gap", NumberAfter(inputs, "R_i=") / 1000, NumberAfter(inputs, "R_e=") / 1000, length, end);
    }

    private static double NumberAfter(string inputs, string key) =>
        double.Parse(Regex.Match(inputs, $@"(?:^|[ ;]){Regex.Escape(key)}([0-9.eE+-]+)").Groups[1].Value, CultureInfo.InvariantCulture);
}
