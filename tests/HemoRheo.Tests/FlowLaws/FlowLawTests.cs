namespace HemoRheo.Tests.FlowLaws;

/// <summary>Finding laws, limits of laws, and misuse.</summary>
public class FlowLawTests
{
    [Fact]
    public void A_law_is_found_by_its_name_in_any_case() => Assert.Same(FlowLaw.Casson, FlowLaw.Named("casson"));

    [Fact]
    public void A_wrong_name_is_answered_with_the_names_there_are()
    {
        var refused = Assert.Throws<ArgumentException>(() => FlowLaw.Named("Casson-Quemada"));
        Assert.Contains("no flow law named 'Casson-Quemada'; the laws are Newtonian, Power law, Bingham, Casson, Herschel-Bulkley, Quemada, Carreau, Cross, Carreau-Yasuda.", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_wrong_number_of_parameters_is_answered_with_the_parameters_there_are()
    {
        var refused = Assert.Throws<ArgumentException>(() => FlowLaw.Casson.Stress(100.PerSecond(), 0.005));
        Assert.Contains("2 parameters (yield stress in Pa, Casson viscosity in Pa.s); 1 were given", refused.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void A_rate_below_zero_is_refused() => Assert.Throws<ArgumentOutOfRangeException>(() => FlowLaw.Newtonian.Stress((-1).PerSecond(), 0.001));

    /// <summary>(sqrt 0.01 + sqrt(0.0036 x 100))^2 = (0.1 + 0.6)^2 = 0.49; at rate zero the yield stress.</summary>
    [Fact]
    public void Casson_has_hand_worked_values()
    {
        Assert.Equal(0.49, FlowLaw.Casson.Stress(100.PerSecond(), 0.01, 0.0036).Pascals, 1e-15);
        Assert.Equal(0.01, FlowLaw.Casson.Stress(0.PerSecond(), 0.01, 0.0036).Pascals, 1e-17);
    }

    /// <summary>s = sqrt(8/2) = 2, (1 + 2)/(0.25 + 2) = 4/3, 8 x 0.009 x 16/9 = 0.128; r = 1 is a constant viscosity.</summary>
    [Fact]
    public void Quemada_has_hand_worked_values()
    {
        Assert.Equal(0.128, FlowLaw.Quemada.Stress(8.PerSecond(), 0.009, 2, 0.25).Pascals, 1e-15);
        Assert.Equal(0.072, FlowLaw.Quemada.Stress(8.PerSecond(), 0.009, 2, 1).Pascals, 1e-16);
    }

    /// <summary>At r = 0 Quemada is Casson with yield stress eta gamma_c: with 0.004 Pa.s and 4 1/s that is 0.016 Pa.</summary>
    [Fact]
    public void Quemada_at_ratio_zero_is_Casson()
    {
        foreach (var rate in (double[])[0.1, 1, 10, 100, 1000])
        {
            var at = ShearRate.FromReciprocalSeconds(rate);
            Assert.Equal(FlowLaw.Casson.Stress(at, 0.016, 0.004).Pascals, FlowLaw.Quemada.Stress(at, 0.004, 4, 0).Pascals, 1e-14);
        }
    }

    [Fact]
    public void Scaled_parameters_come_back_and_a_bound_is_minus_infinity()
    {
        double[] natural = [0.0031, 2.5, 0.22];
        var back = FlowLaw.Quemada.ToNatural(FlowLaw.Quemada.ToScaled(natural));
        for (var k = 0; k < natural.Length; k++) Assert.Equal(natural[k], back[k], 1e-14 * natural[k]);
        Assert.Equal(double.NegativeInfinity, FlowLaw.Quemada.Parameters[2].ToScaled(0));
        Assert.Equal(0, FlowLaw.Quemada.Parameters[2].ToNatural(double.NegativeInfinity));
    }
}
