using System.Globalization;

namespace HemoRheo.Benchmarks.Pooled;

/// <summary>Studies of Quemada and of Casson blood fitted by both laws: what the comparison of all curves says, and what intervals of the fit are worth with the part of the law and without.</summary>
internal static class PooledLawsRun
{
    private static readonly FlowLaw[] Laws = [FlowLaw.Casson, FlowLaw.Quemada];
    private static readonly double[] StandardRates = [1, 10, 100];

    public static IEnumerable<string> Run(int studies)
    {
        yield return $"{studies} studies; per cent of studies by what is said; then, where the laws are not parted, coverage of the fit's 95 % intervals at 1, 10, 100 1/s without the part of the law and with it";
        yield return "truth    noise  rho  curves   Casson only  Quemada only  Casson, Quemada at its boundary  not parted  other    size of the part, %   Casson's values: without | with   Quemada's values: without | with";
        foreach (var correlation in (double[])[0, 0.6])
        {
            foreach (var casson in (bool[])[false, true])
            {
                foreach (var (noise, curves) in new[] { (0.01, 20), (0.03, 20), (0.03, 8), (0.03, 4), (0.03, 2), (0.03, 1), (0.06, 4), (0.06, 2) }) yield return Line(studies, casson, noise, curves, correlation);
            }
        }
    }

    private static string Line(int studies, bool casson, double noise, int curves, double correlation)
    {
        var said = new int[5];
        var held = new int[2, 2, StandardRates.Length];
        var size = new double[StandardRates.Length];
        for (var number = 0; number < studies; number++)
        {
            var simulated = new SimulatedCurves(number, noise, correlation);
            var drawn = casson ? simulated.Casson(curves) : simulated.Quemada(curves);
            var plain = Laws.Select(law => Fits.OfAll([.. drawn.Select(item => item.Curve)], law, simulated.Errors())).ToArray();
            var found = CorrelationPool.Of(CorrelationPool.Asked([.. Laws.Zip(plain, (law, own) => (law, own.Where(fit => fit.Usable).ToArray()))]), null);
            var fits = plain.Select(law => law.Select(fit => found.Value > 0 ? fit.WithCorrelation(found.Value, found.StandardError) : fit).Select(fit => fit.Usable ? fit : null).ToArray()).ToArray();
            var comparison = PooledComparing.Of([.. Laws.Zip(fits)], Laws.Zip(fits, (law, own) => LawJudgment.Judge(law, [.. own.OfType<FittedLaw>()])).ToDictionary(law => law.Law));
            var boundary = comparison.Laws.Any(law => law.Standing == LawStanding.AtBoundary);
            var what = comparison.Preferred is { } preferred ? preferred == "Quemada" ? 1 : boundary ? 2 : 0 : comparison.NotParted.Count == 2 ? 3 : 4;
            said[what]++;
            if (what == 3) Count(drawn, fits, held, size);
        }

        string Share(int law, int with) => string.Join(" ", Enumerable.Range(0, StandardRates.Length).Select(r => Percent(held[law, with, r], said[3] * curves)));
        var sizes = string.Join(" ", size.Select(sum => (100 * sum / Math.Max(1, said[3])).ToString("F2", CultureInfo.InvariantCulture)));
        return string.Create(CultureInfo.InvariantCulture, $"{(casson ? "Casson" : "Quemada"),-8}{100 * noise,4:F0} %  {correlation,3:F1}  {curves,6}   {string.Join("  ", said.Select(count => Percent(count, studies)))}    {sizes}   {Share(0, 0)} | {Share(0, 1)}   {Share(1, 0)} | {Share(1, 1)}");
    }

    private static void Count((FlowCurve Curve, Func<double, double> LogViscosity)[] drawn, FittedLaw?[][] fits, int[,,] held, double[] size)
    {
        for (var r = 0; r < StandardRates.Length; r++)
        {
            var at = StandardRates[r].PerSecond();
            var both = Enumerable.Range(0, drawn.Length).Where(i => fits.All(law => law[i] is not null)).ToArray();
            double Mean(int law) => both.Average(i => fits[law][i]!.ApparentViscosity(at).Value.X);
            var half = both.Length == 0 ? 0 : (Mean(1) - Mean(0)) / 2 / Math.Sqrt(3);
            size[r] += Math.Abs(half);
            for (var law = 0; law < 2; law++)
            {
                var part = new Contribution(new(SourceKind.Law, ""), law == 0 ? half : -half);
                for (var i = 0; i < drawn.Length; i++)
                {
                    if (fits[law][i] is not { } fit) continue;
                    var (value, truth) = (fit.ApparentViscosity(at).Value, drawn[i].LogViscosity(StandardRates[r]));
                    if (value.Interval().Contains(truth)) held[law, 0, r]++;
                    if (value.With(part).Interval().Contains(truth)) held[law, 1, r]++;
                }
            }
        }
    }

    private static string Percent(int count, int of) => of == 0 ? "    -" : string.Create(CultureInfo.InvariantCulture, $"{100.0 * count / of,5:F1}");
}
