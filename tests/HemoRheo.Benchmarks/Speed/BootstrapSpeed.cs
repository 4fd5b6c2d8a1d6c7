using System.Diagnostics;
using System.Globalization;

namespace HemoRheo.Benchmarks.Speed;

/// <summary>One curve of 12 points drawn anew from its fit and fitted again, 2,000 times, on one thread.</summary>
/// <remarks>Method: an invented curve (300 to 0.7 1/s, 1 % and 0.3 mPa); drawing and fitting are timed together by a stopwatch, since 2,000 fits are too short for the processor clock; the best of 200 rounds after two seconds of warming up.</remarks>
internal static class BootstrapSpeed
{
    private const int Replicates = 2000;
    private const int Rounds = 200;

    private static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];

    public static IEnumerable<string> Run()
    {
        foreach (var law in (FlowLaw[])[FlowLaw.Casson, FlowLaw.Quemada])
        {
            var fit = Curve().Fit(law, ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003)));
            double[] natural = [.. fit.Parameters.Select(parameter => parameter.Estimate)];
            double[] stresses = [.. Rates.Select(rate => law.Stress(ShearRate.FromReciprocalSeconds(rate), natural).Pascals)];
            double[] estimates = [];
            void Refit()
            {
                var stream = RandomStream.Of(20261201, "bootstrap", 1);
                estimates = Refits.Of(fit, Replicates, (_, drawn) =>
                {
                    for (var i = 0; i < drawn.Length; i++) drawn[i] = stresses[i] * (1 + 0.01 * stream.Normal()) + 0.0003 * stream.Normal();
                });
            }

            var watch = Stopwatch.StartNew();
            while (watch.ElapsedMilliseconds < 2000) Refit();
            var best = double.PositiveInfinity;
            for (var round = 0; round < Rounds; round++)
            {
                watch.Restart();
                Refit();
                best = Math.Min(best, watch.Elapsed.TotalMilliseconds);
            }

            yield return string.Create(CultureInfo.InvariantCulture, $"bootstrap {law.Name.ToLowerInvariant()} {Replicates} refits in {best:F2} ms; {estimates.Count(double.IsNaN)} estimates are missing");
        }
    }

    private static FlowCurve Curve()
    {
        var stream = RandomStream.Of(20261201, "bootstrap", 0);
        return FlowCurve.Of(Rates, [.. Rates.Select(rate => FlowLaw.Quemada.Stress(ShearRate.FromReciprocalSeconds(rate), 0.0031, 2.5, 0.2).Pascals * (1 + 0.01 * stream.Normal()) + 0.0003 * stream.Normal())]);
    }
}
