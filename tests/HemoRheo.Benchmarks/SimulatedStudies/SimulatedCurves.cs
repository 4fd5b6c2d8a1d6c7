using MathNet.Numerics.Distributions;
using MathNet.Numerics.Random;

namespace HemoRheo.Benchmarks;

/// <summary>Curves of a study whose readings are correlated along the ramp, with the truth beside them. The model is written here from its definition and shares no code with the library.</summary>
/// <param name="number">Number of the study, which seeds it.</param>
/// <param name="relative">Relative standard deviation of a reading.</param>
/// <param name="correlation">Correlation of neighboring readings.</param>
internal sealed class SimulatedCurves(int number, double relative, double correlation)
{
    public const double Floor = 0.0003;

    public static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];

    private readonly Random _random = new Xoshiro256StarStar(20261201 + 7919 * number, false);

    /// <summary>The error model with the simulated sizes.</summary>
    public ErrorModel Errors(bool known = true) => new(relative, ShearStress.FromPascals(Floor), known);

    /// <summary>Curves of Casson blood and the logarithms of their true viscosities.</summary>
    public (FlowCurve Curve, Func<double, double> LogViscosity)[] Casson(int curves) => Drawn(curves, () =>
    {
        var (yieldStress, viscosity) = (0.005 * Math.Exp(Normal.Sample(_random, 0, 0.4)), 0.0033 * Math.Exp(Normal.Sample(_random, 0, 0.1)));
        return rate => Math.Pow(Math.Sqrt(yieldStress) + Math.Sqrt(viscosity * rate), 2);
    });

    /// <summary>Curves of Quemada blood and the logarithms of their true viscosities.</summary>
    public (FlowCurve Curve, Func<double, double> LogViscosity)[] Quemada(int curves) => Drawn(curves, () =>
    {
        var (high, critical, r) = (0.0031 * Math.Exp(Normal.Sample(_random, 0, 0.06)), 2.5 * Math.Exp(Normal.Sample(_random, 0, 0.3)), 0.22 * Math.Exp(Normal.Sample(_random, 0, 0.15)));
        return rate => rate * high * Math.Pow((1 + Math.Sqrt(rate / critical)) / (r + Math.Sqrt(rate / critical)), 2);
    });

    private (FlowCurve Curve, Func<double, double> LogViscosity)[] Drawn(int curves, Func<Func<double, double>> truth) => [.. Enumerable.Range(0, curves).Select(i =>
    {
        var stress = truth();
        var error = 0.0;
        var read = Rates.Select((rate, k) =>
        {
            error = k == 0 ? Normal.Sample(_random, 0, 1) : correlation * error + Math.Sqrt(1 - correlation * correlation) * Normal.Sample(_random, 0, 1);
            var size = relative * stress(rate);
            return stress(rate) + Math.Sqrt(size * size + Floor * Floor) * error;
        });
        return (FlowCurve.Of(Rates, [.. read], $"curve {i}"), (Func<double, double>)(rate => Math.Log(stress(rate) / rate)));
    })];
}
