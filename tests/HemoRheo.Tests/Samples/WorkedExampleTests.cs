using System.Globalization;

namespace HemoRheo.Tests.Samples;

/// <summary>Source of every expected number: tests/ReferenceData/worked-example, computed by its model.py (NumPy, SciPy).</summary>
public sealed class WorkedExampleTests(WorkedExampleStudy example) : IClassFixture<WorkedExampleStudy>
{
    private static readonly SourceKind[] Kinds =
    [
        SourceKind.Fit, SourceKind.Loading, SourceKind.Calibration, SourceKind.Day, SourceKind.Certificate, SourceKind.FluidBeta,
        SourceKind.Thermometer, SourceKind.BloodBeta, SourceKind.Hematocrit, SourceKind.Counter, SourceKind.Plasma,
    ];

    [Fact]
    public void Every_value_and_every_part_of_its_budget_is_that_of_the_independent_program()
    {
        var rows = WorkedExampleStudy.Rows("expected.csv");
        Assert.Equal(72, rows.Count);
        foreach (var row in rows) AssertLine(row, Find(row["law"], row["sample"], Number(row["shear_rate_per_s"]), row["value"] == "standard"));
    }

    [Fact]
    public void Differences_means_and_ratios_are_those_of_the_independent_program()
    {
        var rows = WorkedExampleStudy.Rows("expected-combinations.csv");
        Assert.Equal(28, rows.Count);
        foreach (var row in rows) AssertLine(row, Combination(row["law"], row["combination"]));
    }

    [Fact]
    public void Verdicts_and_probabilities_are_those_of_the_independent_program()
    {
        var rows = WorkedExampleStudy.Rows("expected-verdicts.csv");
        Assert.Equal(18, rows.Count);
        foreach (var row in rows)
        {
            var limits = new Interval(Math.Log(Number(row["lower_limit_mPa_s"]) / 1000), Math.Log(Number(row["upper_limit_mPa_s"]) / 1000));
            var verdict = Verdict.Of(Find(row["law"], row["sample"], Number(row["shear_rate_per_s"]), true), limits);
            Assert.Equal(row["verdict"], verdict.Outcome.ToString().ToLowerInvariant());
            Close(Number(row["p_below"]), verdict.Below, 1e-5, "p_below");
            Close(Number(row["p_within"]), verdict.Within, 1e-5, "p_within");
            Close(Number(row["p_above"]), verdict.Above, 1e-5, "p_above");
        }
    }

    [Fact]
    public void Nothing_of_the_example_is_set_aside()
    {
        Assert.Equal(6, example.Analyzed.Samples.Count);
        Assert.All(example.Analyzed.Samples.SelectMany(sample => sample.Loadings), loading => Assert.Empty(loading.Curve.SetAside));
        Assert.All(example.Analyzed.Samples, sample => Assert.True(sample.Status == InstrumentStatus.InOrder, sample.Loadings[0].Standing.Reason));
    }

    private Value Find(string law, string sample, double rate, bool standard) => example.Analyzed.Samples
        .First(result => result.Sample == sample)
        .Find(law, Measurand.Viscosity(rate.PerSecond()), standard ? HematocritBasis.StandardByPlasma : HematocritBasis.Native)!.Value;

    private Value Combination(string law, string name)
    {
        var samples = example.Analyzed.Samples.Select(sample => sample.Sample).ToArray();
        if (name.StartsWith("ratio", StringComparison.Ordinal))
        {
            var standard = name.EndsWith("standard", StringComparison.Ordinal);
            return Find(law, samples[0], 1, standard) - Find(law, samples[0], 100, standard);
        }

        var rate = Number(name[(name.IndexOf('@', StringComparison.Ordinal) + 1)..]);
        var moved = name.Contains("standard", StringComparison.Ordinal);
        return name.StartsWith("two samples", StringComparison.Ordinal)
            ? Find(law, samples[0], rate, moved) - Find(law, samples[^1], rate, moved)
            : Value.Mean([.. samples.Select(sample => Find(law, sample, rate, moved))]);
    }

    private static void AssertLine(IReadOnlyDictionary<string, string> row, Value value)
    {
        var what = string.Join(' ', row.Take(4).Select(cell => cell.Value));
        Close(Number(row["ln_value"]), value.X, 1e-7, $"{what} ln_value");
        if (row.TryGetValue("viscosity_mPa_s", out var shown)) Close(Number(shown), 1000 * Math.Exp(value.X), 1e-7, $"{what} viscosity");
        Close(Number(row["u_ln"]), value.StandardUncertainty, 1e-5, $"{what} u_ln");
        Close(Number(row["degrees_of_freedom"]), value.DegreesOfFreedom, 1e-5, $"{what} degrees of freedom");
        Close(Number(row["lower_95"]), value.Interval().Lower, 1e-5, $"{what} lower");
        Close(Number(row["upper_95"]), value.Interval().Upper, 1e-5, $"{what} upper");
        foreach (var kind in Kinds)
        {
            var expected = row[$"c_{kind.Words().Replace(' ', '_')}"];
            var part = value.Part(kind);
            if (expected.Length == 0) Assert.Null(part);
            else Close(Number(expected), part!.Value, 1e-5, $"{what} {kind}");
        }
    }

    // Numbers that cancel to zero are printed as 0: an absolute 1e-9 stands beside the relative tolerance.
    private static void Close(double expected, double actual, double relative, string what) =>
        Assert.True(Math.Abs(expected - actual) <= relative * Math.Abs(expected) + 1e-9, $"{what}: expected {expected:R}, is {actual:R}");

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);
}
