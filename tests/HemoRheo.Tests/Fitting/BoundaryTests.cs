namespace HemoRheo.Tests.Fitting;

/// <summary>A law whose parameter runs to its bound ends at the simpler law, and says so.</summary>
public class BoundaryTests
{
    [Fact]
    public void Quemada_on_an_exact_Casson_curve_ends_at_ratio_zero_with_Casson_numbers()
    {
        var fit = Simulated.Exact(FlowLaw.Casson, 0.006, 0.0035).Fit(FlowLaw.Quemada, WeightedFits.Errors);
        Held(fit, 2, "Casson describes this curve");
        Assert.Equal(0.0035, fit.Values.HighShearViscosity.PascalSeconds, 1e-12);
        Assert.Equal(0.006 / 0.0035, fit.Values.CriticalRate.ReciprocalSeconds, 1e-9);
        Assert.Equal(0, fit.Values.Ratio);
    }

    [Fact]
    public void Casson_on_an_exact_Newtonian_curve_ends_without_a_yield_stress()
    {
        var fit = Simulated.Exact(FlowLaw.Newtonian, 0.0013).Fit(FlowLaw.Casson, WeightedFits.Errors);
        Held(fit, 0, "Newtonian describes this curve");
        Assert.Equal(0.0013, fit.Values.CassonViscosity.PascalSeconds, 1e-14);
        Assert.Equal(0, fit.Values.YieldStress.Pascals);
    }

    [Fact]
    public void Bingham_on_an_exact_Newtonian_curve_ends_without_a_yield_stress()
    {
        var fit = Simulated.Exact(FlowLaw.Newtonian, 0.0013).Fit(FlowLaw.Bingham, WeightedFits.Errors);
        Held(fit, 0, "Newtonian describes this curve");
        Assert.Equal(0.0013, fit.Values.PlasticViscosity.PascalSeconds, 1e-14);
    }

    [Fact]
    public void Herschel_Bulkley_on_an_exact_power_law_ends_without_a_yield_stress()
    {
        var fit = Simulated.Exact(FlowLaw.PowerLaw, 0.014, 0.78).Fit(FlowLaw.HerschelBulkley, WeightedFits.Errors);
        Held(fit, 0, "Power law describes this curve");
        Assert.Equal(0.014, fit.Values.Consistency, 1e-12);
        Assert.Equal(0.78, fit.Values.FlowIndex, 1e-11);
    }

    /// <summary>Curves made without a high-shear viscosity: laws that have one end at zero, with the other numbers right.</summary>
    [Theory]
    [InlineData("Carreau", 0.05, 0.0, 2.9, 0.6)]
    [InlineData("Cross", 0.05, 0.0, 1.1, 0.5)]
    public void Laws_of_two_viscosities_may_end_without_the_one_at_high_shear(string name, params double[] truth)
    {
        var law = FlowLaw.Named(name);
        var fit = Simulated.Exact(law, truth).Fit(law, WeightedFits.Errors);
        Held(fit, 1, "the same law without a high-shear viscosity describes this curve");
        for (var k = 0; k < truth.Length; k++) Assert.Equal(truth[k], fit.Parameters[k].Estimate, 1e-8);
    }

    /// <summary>On noisy Casson curves r = 0 is the best fit about half the time; then stresses, covariance and chi-square are Casson's own.</summary>
    [Fact]
    public void Quemada_on_noisy_Casson_curves_is_always_usable_and_at_its_boundary_is_Casson()
    {
        var stream = RandomStream.Of(20261201, "boundary", 1);
        var atBoundary = 0;
        for (var i = 0; i < 400; i++)
        {
            var curve = Simulated.Noisy(stream, FlowLaw.Casson, 0.01, 0.0003, 0.005 * Math.Exp(0.25 * stream.Normal()), 0.0033);
            var quemada = curve.Fit(FlowLaw.Quemada, WeightedFits.Errors);
            var casson = curve.Fit(FlowLaw.Casson, WeightedFits.Errors);
            Assert.True(quemada.Usable, quemada.ToString());
            Assert.True(quemada.Fit.ChiSquare <= casson.Fit.ChiSquare * (1 + 1e-3));
            if (!quemada.Parameters[2].AtBound) continue;
            atBoundary++;
            Assert.Equal(casson.Fit.ChiSquare, quemada.Fit.ChiSquare, 1e-8);
            Assert.Equal(casson.Values.CassonViscosity.PascalSeconds, quemada.Values.HighShearViscosity.PascalSeconds, 1e-11);
            Assert.Equal(casson.Covariance[3], quemada.Covariance[0], 1e-9);
        }

        Assert.InRange(atBoundary, 120, 280);
    }

    private static void Held(FittedLaw fit, int parameter, string words)
    {
        Assert.True(fit.Usable, fit.ToString());
        var finding = Assert.Single(fit.Findings);
        Assert.Equal("law-at-boundary", finding.Code);
        Assert.Contains(words, finding.Message, StringComparison.Ordinal);
        var size = fit.Parameters.Count;
        Assert.True(fit.Parameters[parameter].AtBound);
        Assert.Equal("held at its bound", fit.Parameters[parameter].WhyNoError);
        for (var k = 0; k < size; k++)
        {
            Assert.Equal(0, fit.Covariance[parameter * size + k]);
            Assert.Equal(0, fit.Covariance[k * size + parameter]);
            Assert.Equal(k == parameter, fit.Parameters[k].StandardError is null);
        }

        Assert.Equal(0, fit.StressResponse[parameter]);
        Assert.Equal(Simulated.Rates.Length - size + 1, fit.Fit.DegreesOfFreedom);
    }
}
