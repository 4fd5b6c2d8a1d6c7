namespace HemoRheo.Tests.Fitting;

/// <summary>Invented curves with noise of a known size.</summary>
internal static class Simulated
{
    public static double[] Rates { get; } = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];

    public static FlowCurve Exact(FlowLaw law, params double[] truth) => FlowCurve.Of(Rates, [.. Rates.Select(rate => Stress(law, rate, truth))]);

    /// <summary>A curve whose readings scatter by (relative stress) and a floor, independently.</summary>
    public static FlowCurve Noisy(RandomStream stream, FlowLaw law, double relative, double floor, params double[] truth) =>
        FlowCurve.Of(Rates, [.. Rates.Select(rate => Stress(law, rate, truth) * (1 + relative * stream.Normal()) + floor * stream.Normal())]);

    private static double Stress(FlowLaw law, double rate, double[] truth) => law.Stress(ShearRate.FromReciprocalSeconds(rate), truth).Pascals;
}
