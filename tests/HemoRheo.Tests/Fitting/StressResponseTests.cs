namespace HemoRheo.Tests.Fitting;

/// <summary>The response to a constant stress: what a torque zero off by that much does to the estimates.</summary>
public class StressResponseTests
{
    /// <summary>Exact data, so that weights do not move the estimates: refits with 1e-7 Pa more and less show the response to first order.</summary>
    [Theory]
    [InlineData("Newtonian", 0.0035)]
    [InlineData("Casson", 0.005, 0.0034)]
    [InlineData("Quemada", 0.0031, 2.5, 0.2)]
    public void It_is_what_refitting_shows(string name, params double[] truth)
    {
        var law = FlowLaw.Named(name);
        var curve = Simulated.Exact(law, truth);
        var response = curve.Fit(law, WeightedFits.Errors).StressResponse;
        var (up, down) = (Shifted(curve, 1e-7).Fit(law, WeightedFits.Errors), Shifted(curve, -1e-7).Fit(law, WeightedFits.Errors));
        for (var k = 0; k < truth.Length; k++) Assert.Equal((up.Scaled[k] - down.Scaled[k]) / 2e-7, response[k], 2e-4 * Math.Abs(response[k]));
    }

    private static FlowCurve Shifted(FlowCurve curve, double by) =>
        curve with { Points = curve.Points.Select(point => point with { Stress = ShearStress.FromPascals(point.Stress.Pascals + by) }).ToItems() };
}
