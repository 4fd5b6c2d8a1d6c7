namespace HemoRheo.Benchmarks;

/// <summary>One simulated sample: what was measured, and the truth.</summary>
internal sealed record SimulatedSample(
    string Id,
    DateTimeOffset At,
    double Hematocrit,
    double PlasmaPascalSeconds,
    double PlasmaCelsius,
    IReadOnlyList<(double[] Stresses, double Celsius)> Loadings,
    IReadOnlyDictionary<(double Rate, bool Standard), double> Truth);
