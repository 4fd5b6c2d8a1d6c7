namespace HemoRheo.Tests.Fitting;

/// <summary>A law with more numbers than the curve can tell is refused with the reason, not answered with a number that looks fine.</summary>
public class IdentifiabilityTests
{
    public static TheoryData<string> LawsOfTwoViscosities => ["Carreau", "Cross", "Carreau-Yasuda"];

    /// <summary>With one constant viscosity a second viscosity, a time constant and an exponent mean nothing.</summary>
    [Theory]
    [MemberData(nameof(LawsOfTwoViscosities))]
    public void Laws_of_two_viscosities_are_not_usable_on_an_exact_Newtonian_curve(string name) =>
        Refused(Simulated.Exact(FlowLaw.Newtonian, 0.0013).Fit(FlowLaw.Named(name), WeightedFits.Errors));

    /// <summary>A power law has neither viscosity: the one at low shear runs away with the time constant.</summary>
    [Theory]
    [MemberData(nameof(LawsOfTwoViscosities))]
    public void Laws_of_two_viscosities_are_not_usable_on_an_exact_power_law(string name) =>
        Refused(Simulated.Exact(FlowLaw.PowerLaw, 0.014, 0.78).Fit(FlowLaw.Named(name), WeightedFits.Errors));

    /// <summary>Casson's viscosity has no bound at low shear, so the low-shear viscosity of Cross runs away on curves of Casson; 40 noisy ones.</summary>
    [Fact]
    public void A_low_shear_viscosity_that_the_rates_do_not_show_is_refused_or_far_from_certain()
    {
        var stream = RandomStream.Of(20261201, "no plateau", 1);
        for (var i = 0; i < 40; i++)
        {
            var fit = Simulated.Noisy(stream, FlowLaw.Casson, 0.01, 0.0003, 0.005, 0.0033).Fit(FlowLaw.Cross, WeightedFits.Errors);
            if (fit.Usable) Assert.True(fit.Parameters[0].StandardError > 0.3 * fit.Parameters[0].Estimate, fit.ToString());
            else Assert.Contains(fit.Findings, finding => finding.Code is "not-identifiable" or "not-converged");
        }
    }

    private static void Refused(FittedLaw fit)
    {
        Assert.False(fit.Usable, fit.ToString());
        var finding = Assert.Single(fit.Findings, finding => finding.Severity == Severity.Fault);
        Assert.Equal("not-identifiable", finding.Code);
        Assert.All(fit.Parameters, parameter => Assert.True(parameter.StandardError is null ? parameter.WhyNoError is not null : fit.Convergence.Converged));
    }
}
