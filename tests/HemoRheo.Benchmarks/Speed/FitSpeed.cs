using System.Diagnostics;
using System.Globalization;

namespace HemoRheo.Benchmarks.Speed;

/// <summary>Fits a second on one thread.</summary>
/// <remarks>
/// The laws that describe such blood: one of two viscosities is not told by these rates, and a fit that looks for what is not there takes about a hundred times longer.
/// Method: 4,000 invented curves of 12 points (300 to 0.7 1/s, noise 1 % and 0.3 mPa, Quemada truth, fixed seed), fitted in one thread from their own first guess to full convergence.
/// After two seconds of warming up, seven rounds are timed by the processor time of the process, so that other programs do not count, and the best one is reported.
/// "solver" is the lanes alone (guess, iterations, covariance, response, residuals); "fits" adds the records a user gets, with parameters, lack of fit and findings; "alone" fits curve by curve.
/// </remarks>
internal static class FitSpeed
{
    private const int Curves = 4000;
    private const int Rounds = 7;

    private static readonly double[] Rates = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];
    private static readonly ErrorModel Errors = ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003));

    public static string Measure()
    {
        var curves = Enumerable.Range(1, Curves).Select(Invented).ToArray();
        var lines = new List<string> { "law          solver        fits       alone   per second, one thread; iterations a curve" };
        foreach (var law in (FlowLaw[])[FlowLaw.Newtonian, FlowLaw.Casson, FlowLaw.Quemada])
        {
            var data = curves.Select(curve => CurveData.Of(curve, law, Errors)).ToArray();
            var iterations = Fits.OfAll(curves, law, Errors).Average(fit => fit.Convergence.Iterations);
            lines.Add(string.Create(
                CultureInfo.InvariantCulture,
                $"{law.Name,-10}{PerSecond(() => Solve(law, data)),9:N0}{PerSecond(() => Fits.OfAll(curves, law, Errors)),12:N0}{PerSecond(() => Alone(law, curves)),12:N0}   {iterations:F1}"));
        }

        return string.Join(Environment.NewLine, lines);
    }

    private static FlowCurve Invented(int number)
    {
        var stream = RandomStream.Of(20261201, "speed", number);
        double[] truth = [0.0031 * Math.Exp(0.06 * stream.Normal()), 2.5 * Math.Exp(0.3 * stream.Normal()), 1 / (1 + Math.Exp(1.27 + 0.15 * stream.Normal()))];
        return FlowCurve.Of(Rates, [.. Rates.Select(rate => FlowLaw.Quemada.Stress(ShearRate.FromReciprocalSeconds(rate), truth).Pascals * (1 + 0.01 * stream.Normal()) + 0.0003 * stream.Normal())]);
    }

    private static void Solve(FlowLaw law, CurveData[] data)
    {
        for (var i = 0; i < data.Length; i += Lane.Count)
        {
            var group = data.AsSpan(i, Lane.Count);
            LaneGroup.Outcomes(law, group, [Fits.StartOf(law, group[0]), Fits.StartOf(law, group[1]), Fits.StartOf(law, group[2]), Fits.StartOf(law, group[3])]);
        }
    }

    private static void Alone(FlowLaw law, FlowCurve[] curves)
    {
        foreach (var curve in curves) curve.Fit(law, Errors);
    }

    private static double PerSecond(Action work)
    {
        var process = Process.GetCurrentProcess();
        var warm = Stopwatch.StartNew();
        while (warm.ElapsedMilliseconds < 2000) work();
        var best = double.PositiveInfinity;
        for (var round = 0; round < Rounds; round++)
        {
            process.Refresh();
            var before = process.TotalProcessorTime;
            work();
            process.Refresh();
            best = Math.Min(best, (process.TotalProcessorTime - before).TotalSeconds);
        }

        return Curves / best;
    }
}
