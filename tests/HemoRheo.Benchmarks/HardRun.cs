using System.Diagnostics;
using System.Globalization;
using HemoRheo.Tests.Fitting;

namespace HemoRheo.Benchmarks;

/// <summary>Hard curves, the nine laws in turn, one law a curve: how each ended, how many are usable, and how often another start finds a lower sum of squares than a usable fit has.</summary>
internal static class HardRun
{
    private const int Block = 20_000;
    private const double Lower = 1e-6;

    private static readonly ErrorModel Errors = ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003));

    public static IEnumerable<string> Run(int curves)
    {
        var counts = new SortedDictionary<string, int>(StringComparer.Ordinal);
        var watch = Stopwatch.StartNew();
        for (var from = 0; from < curves; from += Block)
        {
            var block = new string[Math.Min(Block, curves - from)][];
            Parallel.For(0, block.Length, i => block[i] = Ended(from + i));
            foreach (var key in block.SelectMany(keys => keys)) counts[key] = counts.GetValueOrDefault(key) + 1;
        }

        yield return string.Create(CultureInfo.InvariantCulture, $"{curves} curves in {watch.Elapsed.TotalSeconds:F0} s, other starts of the usable ones included");
        foreach (var (key, count) in counts) yield return string.Create(CultureInfo.InvariantCulture, $"{count,8}  {key}");
    }

    private static string[] Ended(int number)
    {
        var law = FlowLaw.All[number % FlowLaw.All.Count];
        var curve = HardCurves.Of(number);
        try
        {
            var fit = curve.Fit(law, Errors);
            if (HardCurves.Fault(fit) is { } fault) return [$"fault: {fault}: {number} {law.Name}"];
            var usable = fit.Usable ? "usable" : "not usable";
            string[] keys = [$"all {usable}", $"law {law.Name}: {usable}", $"law {law.Name}: ends by {fit.Convergence.Reason}", .. fit.Findings.Select(finding => finding.Code).Distinct().Select(code => $"finding {code}")];
            return fit.Usable ? [.. keys, .. OtherStart(law, curve, fit, number)] : keys;
        }
        catch (Exception thrown)
        {
            return [$"fault: throws {thrown.GetType().Name} {thrown.Message}: {number} {law.Name}"];
        }
    }

    private static IEnumerable<string> OtherStart(FlowLaw law, FlowCurve curve, FittedLaw fit, int number)
    {
        var data = CurveData.Of(curve, law, Errors);
        var lowest = OtherStarts.Reached(law, data, Fits.StartOf(law, data)).Select(minimum => OtherStarts.Distance(law, data, minimum)).DefaultIfEmpty(double.PositiveInfinity).Min();
        var own = OtherStarts.Distance(law, data, new([.. fit.Scaled], [], [], [], fit.Fit.ChiSquare, fit.Convergence, null));
        var lower = own - lowest > Lower * (1 + own);
        if (lower) yield return $"law {law.Name}: usable, yet another start is lower";
        if (lower) yield return string.Create(CultureInfo.InvariantCulture, $"lower: {number} {law.Name}: {own:G8} and {lowest:G8}");
    }
}
