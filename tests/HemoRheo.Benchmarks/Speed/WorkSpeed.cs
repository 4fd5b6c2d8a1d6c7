using System.Diagnostics;
using System.Globalization;
using MathNet.Numerics.LinearAlgebra;
using MathNet.Numerics.LinearAlgebra.Double;

namespace HemoRheo.Benchmarks.Speed;

/// <summary>The lane engine beside MathNet.Numerics' Levenberg-Marquardt on the curves of a file.</summary>
/// <remarks>
/// Method: one thread; both fit the same curves from the same starts (the law's own first guess) on the same parameter scale, with weights fixed from the data (1 % and 0.3 mPa); neither computes a covariance.
/// Both are warmed for three seconds, then timed in turn by the processor time of the process, five rounds each of at least half a second, and the best round counts.
/// Sums of squares are computed alike from the estimates of both; sums within 1e-9 of each other are a tie. Bytes are those the lane engine allocates in one pass over all curves once warm.
/// </remarks>
internal static class WorkSpeed
{
    private const int Rounds = 5;
    private const double Tie = 1e-9;

    private static readonly ErrorModel Errors = ErrorModel.Known(0.01, ShearStress.FromPascals(0.0003));

    public static IEnumerable<string> Run(string path)
    {
        MathNet.Numerics.Control.UseSingleThread();
        var curves = WorkFile.Read(path);
        foreach (var law in (FlowLaw[])[FlowLaw.Casson, FlowLaw.Quemada])
        {
            foreach (var line in Run(law, curves)) yield return line;
        }
    }

    private static IEnumerable<string> Run(FlowLaw law, FlowCurve[] all)
    {
        var name = law.Name.ToLowerInvariant();
        CurveData[] curves = [.. all.Select(curve => CurveData.Of(curve, law, Errors)).Where(curve => curve.Fault is null).Select(Fixed)];
        if (curves.Length < all.Length) yield return Words($"{all.Length - curves.Length} of {all.Length} curves have too few points, or stresses not above zero, and are left out");
        if (curves.Length == 0) yield break;
        var size = law.Parameters.Count;
        double[] starts = [.. curves.SelectMany(curve => Fits.StartOf(law, curve))];
        var (estimates, sums, converged) = (new double[starts.Length], new double[curves.Length], new bool[curves.Length]);
        void Ours() => BareFits.Of(law, curves, starts, estimates, sums, converged);

        Vector<double>[][] theirs = [.. curves.Select((curve, i) => (Vector<double>[])
            [new DenseVector(curve.Rates), new DenseVector([.. curve.Stresses.Zip(curve.Deviations!, (y, s) => y / s)]), new DenseVector(starts[(i * size)..((i + 1) * size)])])];
        var found = new double[curves.Length][];
        void Theirs()
        {
            for (var i = 0; i < theirs.Length; i++) found[i] = MathNetFits.Fit(law, theirs[i][0], theirs[i][1], curves[i].Deviations!, theirs[i][2]);
        }

        Warm(Ours);
        Warm(Theirs);
        double ours = 0, peers = 0;
        for (var round = 0; round < Rounds; round++)
        {
            ours = Math.Max(ours, curves.Length * PerSecond(Ours));
            peers = Math.Max(peers, curves.Length * PerSecond(Theirs));
        }

        var before = GC.GetAllocatedBytesForCurrentThread();
        Ours();
        var bytes = GC.GetAllocatedBytesForCurrentThread() - before;
        int lower = 0, higher = 0;
        for (var i = 0; i < curves.Length; i++)
        {
            var a = SumOf(law, curves[i], estimates.AsSpan(i * size, size));
            var b = SumOf(law, curves[i], found[i]);
            if (!(b <= a * (1 + Tie))) lower++;
            else if (!(a <= b * (1 + Tie))) higher++;
        }

        double n = curves.Length;
        yield return Words($"HemoRheo {name} {ours:F0} curves/s");
        yield return Words($"MathNet {name} {peers:F0} curves/s");
        yield return Words($"ratio {name} {ours / peers:F1}");
        yield return Words($"{name}: lower sum of squares: HemoRheo {100 * lower / n:F2} %, MathNet {100 * higher / n:F2} %, equal {100 * (n - lower - higher) / n:F2} %; HemoRheo converged on {100 * converged.Count(x => x) / n:F2} %");
        yield return Words($"{name}: bytes allocated a curve by the lane engine once warm: {bytes / n:G3}");
    }

    private static CurveData Fixed(CurveData curve) => new(curve.Rates, curve.Stresses, curve.Errors) { Deviations = [.. curve.Stresses.Select(y => Math.Sqrt(Errors.Relative * y * (Errors.Relative * y) + Errors.Floor.Pascals * Errors.Floor.Pascals))] };

    private static double SumOf(FlowLaw law, CurveData curve, ReadOnlySpan<double> scaled)
    {
        var natural = law.ToNatural(scaled);
        double sum = 0;
        for (var i = 0; i < curve.Rates.Length; i++)
        {
            var residual = (curve.Stresses[i] - law.Stress(ShearRate.FromReciprocalSeconds(curve.Rates[i]), natural).Pascals) / curve.Deviations![i];
            sum += residual * residual;
        }

        return sum;
    }

    private static void Warm(Action work)
    {
        var watch = Stopwatch.StartNew();
        while (watch.ElapsedMilliseconds < 3000) work();
    }

    /// <summary>Passes a second of processor time.</summary>
    private static double PerSecond(Action work)
    {
        var process = Process.GetCurrentProcess();
        var passes = 0;
        process.Refresh();
        var before = process.TotalProcessorTime;
        var spent = TimeSpan.Zero;
        while (spent.TotalSeconds < 0.5)
        {
            work();
            passes++;
            process.Refresh();
            spent = process.TotalProcessorTime - before;
        }

        return passes / spent.TotalSeconds;
    }

    private static string Words(FormattableString words) => words.ToString(CultureInfo.InvariantCulture);
}
