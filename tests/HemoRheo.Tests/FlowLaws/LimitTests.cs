namespace HemoRheo.Tests.FlowLaws;

/// <summary>Where one law becomes another: from the formulas, worked by hand.</summary>
public class LimitTests
{
    private static readonly double[] Rates = [0, 0.01, 0.3, 1, 7, 60, 450, 3000];

    [Fact]
    public void Herschel_Bulkley_with_index_one_is_Bingham() => Same(FlowLaw.Bingham, [0.012, 0.0041], FlowLaw.HerschelBulkley, [0.012, 0.0041, 1]);

    [Fact]
    public void Herschel_Bulkley_without_yield_stress_is_the_power_law() => Same(FlowLaw.PowerLaw, [0.013, 0.81], FlowLaw.HerschelBulkley, [0, 0.013, 0.81]);

    [Fact]
    public void The_power_law_with_index_one_is_Newtonian() => Same(FlowLaw.Newtonian, [0.0037], FlowLaw.PowerLaw, [0.0037, 1]);

    [Fact]
    public void Bingham_and_Casson_without_yield_stress_are_Newtonian()
    {
        Same(FlowLaw.Newtonian, [0.0037], FlowLaw.Bingham, [0, 0.0037]);
        Same(FlowLaw.Newtonian, [0.0037], FlowLaw.Casson, [0, 0.0037]);
    }

    [Fact]
    public void Carreau_Yasuda_with_transition_two_is_Carreau() => Same(FlowLaw.Carreau, [0.056, 0.0034, 3.3, 0.36], FlowLaw.CarreauYasuda, [0.056, 0.0034, 3.3, 2, 0.36]);

    [Fact]
    public void Carreau_Yasuda_with_transition_one_less_index_is_Cross() => Same(FlowLaw.Cross, [0.056, 0.0034, 1.2, 0.75], FlowLaw.CarreauYasuda, [0.056, 0.0034, 1.2, 0.75, 0.25]);

    [Fact]
    public void Laws_of_two_viscosities_are_Newtonian_where_these_are_equal()
    {
        Same(FlowLaw.Newtonian, [0.0037], FlowLaw.Carreau, [0.0037, 0.0037, 2, 0.4]);
        Same(FlowLaw.Newtonian, [0.0037], FlowLaw.Cross, [0.0037, 0.0037, 2, 0.9]);
        Same(FlowLaw.Newtonian, [0.0037], FlowLaw.CarreauYasuda, [0.0037, 0.0037, 2, 1.1, 0.4]);
    }

    /// <summary>With no high-shear viscosity and time constant x rate far above 1 the square root of 1 is lost: K = 0.05 x 1000^(0.6 - 1).</summary>
    [Fact]
    public void Carreau_far_beyond_its_time_constant_is_a_power_law()
    {
        foreach (var rate in (double[])[10, 100, 1000])
        {
            var expected = FlowLaw.PowerLaw.Stress(rate.PerSecond(), 0.05 * Math.Pow(1000, -0.4), 0.6).Pascals;
            Assert.Equal(expected, FlowLaw.Carreau.Stress(rate.PerSecond(), 0.05, 0, 1000, 0.6).Pascals, 1e-8 * expected);
        }
    }

    private static void Same(FlowLaw expected, double[] withThese, FlowLaw found, double[] andThese)
    {
        foreach (var rate in Rates)
        {
            var stress = expected.Stress(rate.PerSecond(), withThese).Pascals;
            Assert.Equal(stress, found.Stress(rate.PerSecond(), andThese).Pascals, 1e-13 * stress);
        }
    }
}
