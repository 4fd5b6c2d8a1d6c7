namespace HemoRheo.Tests.Fitting;

/// <summary>The response to a constant stress: what a torque zero off by that much does to the estimates.</summary>
public class StressResponseTests
{
    /// <summary>Exact data, so that weights do not move the estimates: refits with 1e-7 Pa more and less show the response to first order. A true response of zero shows as rounding, 2e-15 over 2e-7.</summary>
    [Theory]
    [InlineData("Newtonian", 0.0035)]
    [InlineData("Casson", 0.005, 0.0034)]
    [InlineData("Quemada", 0.0031, 2.5, 0.2)]
    [InlineData("Power law", 0.014, 0.78)]
    [InlineData("Bingham", 0.02, 0.0036)]
    [InlineData("Herschel-Bulkley", 0.008, 0.009, 0.86)]
    [InlineData("Carreau", 0.05, 0.0036, 2.9, 0.4)]
    [InlineData("Cross", 0.05, 0.0036, 1.1, 0.95)]
    public void It_is_what_refitting_shows(string name, params double[] truth)
    {
        var law = FlowLaw.Named(name);
        var curve = Simulated.Exact(law, truth);
        var response = curve.Fit(law, WeightedFits.Errors).StressResponse;
        var (up, down) = (Shifted(curve, 1e-7).Fit(law, WeightedFits.Errors), Shifted(curve, -1e-7).Fit(law, WeightedFits.Errors));
        for (var k = 0; k < truth.Length; k++) Assert.Equal((up.Scaled[k] - down.Scaled[k]) / 2e-7, response[k], 2e-4 * Math.Abs(response[k]) + 1e-8);
    }

    private static FlowCurve Shifted(FlowCurve curve, double by) =>
        curve with { Points = curve.Points.Select(point => point with { Stress = ShearStress.FromPascals(point.Stress.Pascals + by) }).ToItems() };
}
