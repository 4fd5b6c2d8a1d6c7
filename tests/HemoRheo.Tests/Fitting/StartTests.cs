namespace HemoRheo.Tests.Fitting;

/// <summary>A fit that depends on where it starts says so, and one that runs off ends soon.</summary>
public class StartTests
{
    /// <summary>Readings that no line describes, their errors a hundredth of what they would have to be: two minima, the nearer one given.</summary>
    [Fact]
    public void A_curve_with_two_minima_gives_the_nearer_one_and_says_so()
    {
        var fit = HardCurves.Of(2450).Fit(FlowLaw.Bingham, WeightedFits.Errors);
        var finding = Assert.Single(fit.Findings, finding => finding.Code == "several-minima");
        Assert.True(finding.Observed > finding.Limit, finding.Message);
    }

    [Fact]
    public void A_finding_about_starts_outlives_the_correlation_of_readings()
    {
        var fit = HardCurves.Of(2450).Fit((FlowLaw)FlowLaw.Bingham, WeightedFits.Errors).WithCorrelation(0.3);
        Assert.Contains(fit.Findings, finding => finding.Code == "several-minima");
    }

    /// <summary>Curves of Casson show no plateau at low shear: the fit ends by numbers within the limit of flow laws, on either path.</summary>
    [Theory]
    [InlineData("Carreau")]
    [InlineData("Cross")]
    [InlineData("Carreau-Yasuda")]
    public void A_parameter_that_runs_off_ends_the_fit_soon(string name)
    {
        var stream = RandomStream.Of(20261201, "runs off", 1);
        for (var i = 0; i < 20; i++)
        {
            var fit = Simulated.Noisy(stream, FlowLaw.Casson, 0.01, 0.0003, 0.005, 0.0034).Fit(FlowLaw.Named(name), WeightedFits.Errors);
            Assert.InRange(fit.Convergence.Iterations, 1, 270);
            Assert.True(fit.Usable || fit.Findings.Any(finding => finding.Code == "not-identifiable"), fit.ToString());
        }
    }
}
