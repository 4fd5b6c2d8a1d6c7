namespace HemoRheo.Tests.Fitting;

/// <summary>How often intervals hold the truth: 200 curves of normal blood, so 95 % is 90.4 to 99.6 %. The full table comes from the benchmarks.</summary>
public class IntervalCoverageTests
{
    private const int Curves = 200;

    private static readonly double[] Truth = [0.0031, 2, 0.2];

    public static TheoryData<IntervalMethod, bool> Cases => [.. from method in Enum.GetValues<IntervalMethod>() from known in new[] { true, false } select (method, known)];

    [Theory]
    [MemberData(nameof(Cases))]
    public void Viscosities_and_parameters_of_Quemada_are_held_in_95_percent(IntervalMethod method, bool known)
    {
        var errors = WeightedFits.Errors with { ScaleKnown = known };
        var held = new int[Truth.Length + 1];
        for (var i = 0; i < Curves; i++)
        {
            var fit = Simulated.Noisy(RandomStream.Of(20261201, "interval coverage", i), FlowLaw.Quemada, 0.01, 0.0003, Truth).Fit((FlowLaw)FlowLaw.Quemada, errors);
            for (var k = 0; k < Truth.Length; k++)
            {
                held[k] += fit.Interval(fit.Law.Parameters[k], 0.95, method, new(Replicates: 150)).Allows(Truth[k]) ? 1 : 0;
            }

            var viscosity = FlowLaw.Quemada.Stress(1.PerSecond(), Truth).Pascals;
            held[^1] += fit.Interval(Measurand.Viscosity(1.PerSecond()), 0.95, method, new(Replicates: 150)).Allows(viscosity) ? 1 : 0;
        }

        Assert.All(held, count => Assert.InRange(count / (double)Curves, 0.904, 0.996));
    }
}
