namespace HemoRheo.Tests.Fitting;

/// <summary>Data without errors give back what they were made from.</summary>
public class JointExactTests
{
    private static readonly double[] Logs = [0.03, -0.05, 0.02];

    public static TheoryData<string, double[]> Laws => new()
    {
        { "Newtonian", [0.0035] },
        { "Casson", [0.005, 0.0034] },
        { "Quemada", [0.0031, 2.5, 0.2] },
        { "Power law", [0.014, 0.78] },
        { "Bingham", [0.02, 0.0036] },
        { "Herschel-Bulkley", [0.008, 0.009, 0.86] },
        { "Carreau", [0.05, 0.0036, 2.9, 0.4] },
        { "Cross", [0.05, 0.0036, 1.1, 0.95] },
    };

    [Theory]
    [MemberData(nameof(Laws))]
    public void Loadings_of_every_law_give_back_its_parameters_and_their_factors(string name, double[] truth)
    {
        var law = FlowLaw.Named(name);
        var fit = Logs.Select(f => Scaled(Simulated.Exact(law, truth), f)).ToArray().FitLoadings(law, WeightedFits.Errors);
        Assert.True(fit.Usable, fit.ToString());
        for (var k = 0; k < truth.Length; k++) Assert.Equal(1, fit[law.Parameters[k].Name].Estimate / truth[k], 1e-10);
        for (var l = 0; l < Logs.Length; l++) Assert.Equal(Math.Exp(Logs[l]), fit.Factors[l].Factor, 1e-10);
        if (truth.Length > 1) Assert.InRange(fit.Joint.Compatibility!.Probability, 0.999, 1);
        else Assert.Null(fit.Joint.Compatibility);
    }

    [Fact]
    public void Loadings_that_are_alike_have_factors_of_one()
    {
        var curve = Simulated.Exact(FlowLaw.Casson, 0.005, 0.0034);
        var fit = new[] { curve, curve, curve }.FitLoadings(FlowLaw.Casson, WeightedFits.Errors);
        Assert.True(fit.Usable, fit.ToString());
        Assert.All(fit.Factors, factor => Assert.Equal(1, factor.Factor, 1e-10));
        Assert.Contains(fit.Findings, finding => finding.Code == "loading-scatter-hidden");
    }

    [Fact]
    public void A_series_with_a_shared_critical_rate_gives_back_all_numbers()
    {
        double[][] truths = [[0.0021, 2.5, 0.4], [0.0031, 2.5, 0.2], [0.0047, 2.5, 0.12]];
        var fit = truths.Select(truth => Simulated.Exact(FlowLaw.Quemada, truth)).ToArray().FitTogether(FlowLaw.Quemada, ["critical rate"], WeightedFits.Errors);
        Assert.True(fit.Usable, fit.ToString());
        Assert.Equal(1, fit["critical rate"].Estimate / 2.5, 1e-10);
        for (var l = 0; l < truths.Length; l++)
        {
            Assert.Equal(1, fit["high-shear viscosity", l].Estimate / truths[l][0], 1e-10);
            Assert.Equal(1, fit["ratio", l].Estimate / truths[l][2], 1e-10);
        }
    }

    [Fact]
    public void A_dilution_series_gives_back_structure_critical_rate_and_plasma()
    {
        var fit = Dilution(3.2, [0.25, 0.35, 0.45, 0.55]);
        Assert.True(fit.Usable, fit.ToString());
        Assert.Equal(1, fit["structure parameter at rest"].Estimate / 3.2, 1e-10);
        Assert.Equal(1, fit["structure parameter at high shear"].Estimate / 1.75, 1e-10);
        Assert.Equal(1, fit["critical rate"].Estimate / 2.5, 1e-10);
        Assert.Equal(1, fit["plasma viscosity"].Estimate / 0.0012, 1e-10);
    }

    /// <summary>k0 = 2 / 0.5 makes a yield stress at hematocrit 0.5, the highest of the series.</summary>
    [Fact]
    public void A_dilution_series_with_a_yield_stress_at_its_highest_hematocrit_ends_at_its_bound_and_says_so()
    {
        var fit = Dilution(4, [0.2, 0.35, 0.5]);
        Assert.True(fit.Usable, fit.ToString());
        Assert.True(fit["structure parameter at rest"].AtBound);
        Assert.Equal(4, fit["structure parameter at rest"].Estimate, 1e-12);
        Assert.Equal(1, fit["structure parameter at high shear"].Estimate / 1.75, 1e-9);
        Assert.Contains(fit.Findings, finding => finding.Code == "law-at-boundary" && finding.Message.Contains("yield stress at the highest hematocrit", StringComparison.Ordinal));
    }

    /// <summary>At one hematocrit the plasma viscosity cannot be told from the structure.</summary>
    [Fact]
    public void A_series_of_one_hematocrit_is_not_identifiable()
    {
        var fit = Dilution(3.2, [0.4, 0.4, 0.4]);
        Assert.False(fit.Usable, fit.ToString());
        Assert.Contains(fit.Findings, finding => finding.Code is "not-identifiable");
    }

    private static JointFit Dilution(double atRest, double[] hematocrits) => hematocrits
        .Select(h => FlowCurve.Of(Simulated.Rates, [.. Simulated.Rates.Select(rate => Stress(rate, h, atRest))], FormattableString.Invariant($"H {h}")))
        .ToArray().FitDilution([.. hematocrits.Select(Hematocrit.FromLiterPerLiter)], WeightedFits.Errors);

    private static double Stress(double rate, double h, double atRest)
    {
        var s = Math.Sqrt(rate / 2.5);
        return rate * 0.0012 / Math.Pow(1 - h / 2 * (atRest + 1.75 * s) / (1 + s), 2);
    }

    private static FlowCurve Scaled(FlowCurve curve, double log) =>
        curve with { Points = curve.Points.Select(point => point with { Stress = new(Math.Exp(log) * point.Stress.Pascals) }).ToItems() };
}
