using System.Globalization;
using System.Text.RegularExpressions;

namespace HemoRheo.Tests.Hematocrits;

/// <summary>Source of expected viscosities: tests/ReferenceData/hematocrit/check-points.csv, computed with mpmath.</summary>
public sealed partial class StandardHematocritRuleTests
{
    private static readonly Counter Exact = new("counter", 0, 0);

    [Fact]
    public void Power_rule_gives_the_check_points()
    {
        var rows = ReferenceTable.Read("hematocrit", "check-points.csv").Where(row => row["relation"].StartsWith("Matrai", StringComparison.Ordinal)).ToArray();
        Assert.Equal(5, rows.Length);
        foreach (var row in rows)
        {
            var n = Numbers(row["inputs"]);
            var moved = StandardHematocritRule.ByPlasma(Value.Exact(Math.Log(n[0])), Value.Exact(Math.Log(n[1])), "S", new(n[2]), new(n[3]), Exact);
            Assert.Equal(row.Number("value"), Math.Exp(moved.X), 1e-12 * row.Number("value"));
        }
    }

    [Fact]
    public void Slope_rule_gives_the_check_points()
    {
        var rows = ReferenceTable.Read("hematocrit", "check-points.csv").Where(row => row["relation"].StartsWith("log-linear", StringComparison.Ordinal)).ToArray();
        Assert.Equal(3, rows.Length);
        foreach (var row in rows)
        {
            var n = Numbers(row["inputs"]);
            var slope = new HematocritSlope("Casson", Measurand.Viscosity(10.PerSecond()), n[1], 0, double.PositiveInfinity, n[1], 100, null);
            var moved = StandardHematocritRule.BySlope(Value.Exact(Math.Log(n[0])), slope, "S", new(n[2]), new(n[3]), Exact);
            Assert.Equal(row.Number("value"), Math.Exp(moved.X), 1e-12 * row.Number("value"));
        }
    }

    [Fact]
    public void Contributions_are_the_change_when_hematocrit_is_raised_by_its_uncertainty()
    {
        var counter = new Counter("counter", 1e-6, 2e-6);
        var (native, plasma) = (Value.Exact(Math.Log(4.5)), Value.Exact(Math.Log(1.25)));
        Value At(double hematocrit, Counter by) => StandardHematocritRule.ByPlasma(native, plasma, "S", new(hematocrit), new(0.45), by);
        var value = At(0.40, counter);
        var raised = At(0.40 + 1e-6, Exact).X - At(0.40 - 1e-6, Exact).X;
        Assert.Equal(raised / 2, value.Part(SourceKind.Hematocrit)!.Value, 1e-9 * Math.Abs(raised));
        Assert.Equal(raised, value.Part(SourceKind.Counter)!.Value, 1e-9 * Math.Abs(raised));
    }

    private static double[] Numbers(string inputs) => [.. InputNumber().Matches(inputs).Select(match => double.Parse(match.Groups[1].Value, CultureInfo.InvariantCulture))];

    [GeneratedRegex(@"=\s*([0-9.]+)")]
    private static partial Regex InputNumber();
}
