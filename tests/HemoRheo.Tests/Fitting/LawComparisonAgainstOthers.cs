using System.Globalization;

namespace HemoRheo.Tests.Fitting;

/// <summary>Criteria, weights and tests of compared laws against R and SciPy.</summary>
public class LawComparisonAgainstOthers
{
    private static readonly ErrorModel Plain = ErrorModel.UpToScale(0, ShearStress.FromPascals(1));

    private static readonly Dictionary<string, double> R = File.ReadLines(Repository.Reference("law-comparison", "puromycin.r.csv")).Skip(1)
        .Select(line => line.Trim('"').Split("\",\"")).ToDictionary(row => row[0], row => Number(row[1]));

    private static readonly Dictionary<(string Curve, string Law, string Quantity), double> SciPy = File.ReadLines(Repository.Reference("law-comparison", "law-comparison.scipy.csv")).Skip(1)
        .Select(line => line.Split(',')).ToDictionary(row => ($"{row[0]}/{row[1]}", row[2], row[3]), row => Number(row[4]));

    public static TheoryData<string> Curves => [.. WeightedFits.Curves.Keys];

    /// <summary>Reaction rates as if they were stresses: scale estimated, so AICc counts it, as R does.</summary>
    [Fact]
    public void Puromycin_has_the_criteria_and_weights_of_R()
    {
        var comparison = Puromycin().Compare(Plain, Constant, Line, MichaelisMenten, Hill);
        foreach (var law in comparison.Laws)
        {
            Assert.Null(law.WhyNotCompared);
            var name = law.Law.Name;
            Assert.Equal(R[$"{name} k"], law.Parameters);
            Near(R[$"{name} RSS"], law.Fit.Fit.ChiSquare, 1e-9);
            Near(R[$"{name} AIC"], law.MinusTwiceLogLikelihood!.Value + 2 * law.Parameters, 1e-10);
            Near(R[$"{name} BIC"], law.MinusTwiceLogLikelihood.Value + Math.Log(12) * law.Parameters, 1e-10);
            Near(R[$"{name} AICc"], law.Criterion!.Value, 1e-10);
            Near(R[$"{name} Akaike weight (AICc)"], law.Weight!.Value, 1e-8);
        }

        Near(R["log likelihood"], -comparison.Laws[2].MinusTwiceLogLikelihood!.Value / 2, 1e-11);
        Assert.Equal(["constant"], comparison.Contradicted.Select(law => law.Law.Name));
        Assert.Null(comparison.Preferred);
        Assert.Contains("cannot tell line in log(conc), Michaelis-Menten and Hill apart", comparison.Verdict, StringComparison.Ordinal);
    }

    [Fact]
    public void Michaelis_Menten_within_Hill_has_the_F_test_of_R()
    {
        var test = NestedTest.Of(Puromycin().Fit(MichaelisMenten, Plain), Puromycin().Fit(Hill, Plain), NestingKind.Inside, "exponent 1")!;
        Assert.Equal((1, 9), (test.DegreesOfFreedom, test.ResidualDegreesOfFreedom));
        Near(R["F, Michaelis-Menten against Hill"], test.Statistic, 1e-8);
        Near(R["p, Michaelis-Menten against Hill"], test.Probability!.Value, 1e-8);
    }

    [Theory]
    [MemberData(nameof(Curves))]
    public void Casson_and_Quemada_have_the_likelihoods_tests_and_patterns_of_SciPy(string curve)
    {
        foreach (var (errors, scale) in new[] { (WeightedFits.Errors, "known"), (WeightedFits.Errors with { ScaleKnown = false }, "estimated") })
        {
            var comparison = WeightedFits.Curves[curve].Compare(errors, FlowLaw.Casson, FlowLaw.Quemada);
            foreach (var law in comparison.Laws)
            {
                double Expected(string quantity) => SciPy[(curve, law.Law.Name, quantity)];
                Near(Expected($"minus_twice_log {scale}"), law.MinusTwiceLogLikelihood!.Value, 1e-10);
                Near(Expected($"aicc {scale}"), law.Criterion!.Value, 1e-10);
                Near(Expected("correlation"), law.Residuals!.Correlation!.Value, 1e-7);
                Near(Expected("correlation expected"), law.Residuals.Expected!.Value, 1e-7);
                Near(Expected("correlation probability"), law.Residuals.Probability!.Value, 1e-7);
                Assert.Equal(Expected("correlation probability drawn"), law.Residuals.Probability.Value, 0.003);
            }

            var test = Assert.Single(comparison.Nested);
            var name = scale == "known" ? "nested chi-square" : "nested F";
            Near(SciPy[(curve, "Casson in Quemada", name)], test.Statistic, 1e-7);
            Near(SciPy[(curve, "Casson in Quemada", $"{name} probability")], test.Probability!.Value, 1e-7);
        }
    }

    private static FlowLaw Constant { get; } = FlowLaw.Custom("constant", (rate, p) => p[0] + 0 * rate, new LawParameter("level", "a", "1", Start: 100));

    private static FlowLaw Line { get; } = FlowLaw.Custom("line in log(conc)", (rate, p) => p[0] + p[1] * LaneDual.Log(rate), new LawParameter("level", "a", "1", Start: 100), new LawParameter("slope", "b", "1", Start: 10));

    private static FlowLaw MichaelisMenten { get; } = FlowLaw.Custom("Michaelis-Menten", (rate, p) => p[0] * rate / (p[1] + rate), new LawParameter("largest", "Vm", "1", Start: 200), new LawParameter("half", "K", "1", Start: 0.05));

    private static FlowLaw Hill { get; } = FlowLaw.Custom("Hill", (rate, p) => p[0] * LaneDual.Pow(rate, p[2]) / (LaneDual.Pow(p[1], p[2]) + LaneDual.Pow(rate, p[2])), new LawParameter("largest", "Vm", "1", Start: 210), new LawParameter("half", "K", "1", Start: 0.06), new LawParameter("exponent", "h", "1", Start: 1));

    private static FlowCurve Puromycin()
    {
        var rows = File.ReadLines(Repository.Reference("law-comparison", "puromycin.csv")).Skip(1).Select(line => line.Split(',')).ToArray();
        return FlowCurve.Of([.. rows.Select(row => Number(row[0]))], [.. rows.Select(row => Number(row[1]))]);
    }

    private static double Number(string text) => double.Parse(text, CultureInfo.InvariantCulture);

    private static void Near(double expected, double found, double relative) =>
        Assert.True(Math.Abs(found - expected) <= relative * Math.Abs(expected), $"{found:R}, expected {expected:R}");
}
