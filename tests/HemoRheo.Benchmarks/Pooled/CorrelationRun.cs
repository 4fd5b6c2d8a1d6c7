using System.Globalization;

namespace HemoRheo.Benchmarks.Pooled;

/// <summary>Studies whose readings are correlated: how well the correlation is found, and what intervals and tests of fit are worth without it and with it.</summary>
internal static class CorrelationRun
{
    private const int Curves = 24;
    private static readonly double[] StandardRates = [1, 10, 100];

    public static IEnumerable<string> Run(int studies)
    {
        yield return $"{studies} studies of {Curves} Casson curves of {SimulatedCurves.Rates.Length} points, noise 1 % and 0.3 mPa";
        yield return "rho   estimate   scatter  std error   used   coverage at 1, 10, 100 1/s: ignoring it | estimated, by the rule | true rho known     mean chi-square   false alarms at 0.05 and 0.001: ignoring it | knowing it   pooled at 0.05, 0.001   pattern below 0.001 ignoring | knowing";
        foreach (var known in (bool[])[true, false])
        {
            yield return known ? "sizes of the errors known" : "scale estimated by each fit";
            foreach (var correlation in (double[])[0, 0.1, 0.2, 0.3, 0.6, 0.8]) yield return Line(studies, correlation, known);
        }
    }

    private static string Line(int studies, double correlation, bool known)
    {
        var held = new int[3, StandardRates.Length];
        var (alarms, pooled, pattern) = (new int[6], new int[2], new int[2]);
        var estimates = new List<double>();
        double errors = 0, chiSquare = 0;
        var (used, fitted) = (0, 0);
        for (var number = 0; number < studies; number++)
        {
            var simulated = new SimulatedCurves(number, 0.01, correlation);
            var truth = simulated.Casson(Curves);
            var plain = Fits.OfAll([.. truth.Select(item => item.Curve)], FlowLaw.Casson, simulated.Errors(known));
            var found = CorrelationPool.Estimate(plain)!.Value;
            estimates.Add(found.Correlation);
            errors += found.Error;
            var rule = found.Probability < 0.01 ? found.Correlation : 0;
            if (rule > 0) used++;
            var ruled = plain.Select(fit => rule > 0 ? fit.WithCorrelation(rule, found.Error) : fit).ToArray();
            var knowing = plain.Select(fit => fit.WithCorrelation(correlation)).ToArray();
            for (var i = 0; i < plain.Length; i++, fitted++)
            {
                for (var r = 0; r < StandardRates.Length; r++)
                {
                    var x = truth[i].LogViscosity(StandardRates[r]);
                    var at = StandardRates[r].PerSecond();
                    foreach (var (which, fit) in new[] { plain[i], ruled[i], knowing[i] }.Index()) if (fit.ApparentViscosity(at).Value.Interval().Contains(x)) held[which, r]++;
                }

                chiSquare += plain[i].Fit.ChiSquare;
                if (plain[i].Fit.Probability < 0.05) alarms[0]++;
                if (plain[i].Fit.Probability < 0.001) alarms[1]++;
                if (knowing[i].Fit.Probability < 0.05) alarms[4]++;
                if (knowing[i].Fit.Probability < 0.001) alarms[5]++;
                if (ruled[i].Fit.Probability < 0.05) alarms[2]++;
                if (ruled[i].Fit.Probability < 0.001) alarms[3]++;
            }

            var judged = LawJudgment.Judge(FlowLaw.Casson, ruled);
            if (judged.Probability < 0.05) pooled[0]++;
            if (judged.Probability < 0.001) pooled[1]++;
            if (LawJudgment.Judge(FlowLaw.Casson, plain).PatternProbability < 0.01) pattern[0]++;
            if (judged.PatternProbability < 0.01) pattern[1]++;
        }

        var mean = estimates.Average();
        var scatter = Math.Sqrt(estimates.Sum(x => (x - mean) * (x - mean)) / (studies - 1));
        string Share(int which) => string.Join(" ", Enumerable.Range(0, StandardRates.Length).Select(r => Percent(held[which, r], fitted)));
        return string.Create(CultureInfo.InvariantCulture, $"{correlation,3:F1}   {mean,8:F3}  {scatter,8:F3}   {errors / studies,8:F3}   {Percent(used, studies)}   {Share(0)} | {Share(1)} | {Share(2)}   {chiSquare / fitted,6:F2}   {Percent(alarms[0], fitted)} {100.0 * alarms[1] / fitted:F3} | {Percent(alarms[2], fitted)} {100.0 * alarms[3] / fitted:F3} | {Percent(alarms[4], fitted)} {100.0 * alarms[5] / fitted:F3}   {Percent(pooled[0], studies)} {100.0 * pooled[1] / studies:F2}   {Percent(pattern[0], studies)} | {Percent(pattern[1], studies)}");
    }

    private static string Percent(int count, int of) => string.Create(CultureInfo.InvariantCulture, $"{100.0 * count / of,5:F1}");
}
