using System.Globalization;

namespace HemoRheo.Benchmarks.Laws;

/// <summary>How often comparisons of laws and flow-behavior classes of single curves are right and wrong, over simulated curves of known truth.</summary>
internal static class LawSimulations
{
    private static readonly double[] Usual = [300, 200, 130, 100, 50, 30, 20, 11, 5, 2.5, 1.2, 0.7];
    private static readonly double[] Low = [300, 200, 100, 50, 20, 10, 5, 2, 1, 0.5, 0.2, 0.1];

    private static readonly (string Name, FlowLaw Law, double[] Numbers)[] Truths =
    [
        ("Newtonian plasma, 1.3 mPa.s", FlowLaw.Newtonian, [0.0013]),
        ("Newtonian oil, 5 mPa.s", FlowLaw.Newtonian, [0.005]),
        ("slightly thinning, slope 0.99", FlowLaw.PowerLaw, [0.005, 0.99]),
        ("at the margin, slope 0.9788", FlowLaw.PowerLaw, [0.005, 0.9788]),
        ("thinning, slope 0.95", FlowLaw.PowerLaw, [0.005, 0.95]),
        ("power law, slope 0.6", FlowLaw.PowerLaw, [0.02, 0.6]),
        ("thickening, slope 1.03", FlowLaw.PowerLaw, [0.004, 1.03]),
        ("Casson, 0.2 mPa and 3 mPa.s", FlowLaw.Casson, [0.0002, 0.003]),
        ("Casson, 5 mPa and 3.3 mPa.s", FlowLaw.Casson, [0.005, 0.0033]),
        ("Casson, 20 mPa and 4 mPa.s", FlowLaw.Casson, [0.02, 0.004]),
        ("Herschel-Bulkley, 17.5 mPa", FlowLaw.HerschelBulkley, [0.0175, 0.00897, 0.8601]),
        ("Quemada, ratio 0.2", FlowLaw.Quemada, [0.003, 2, 0.2]),
        ("Quemada, plateau from a tenth of 0.1 1/s", FlowLaw.Quemada, [0.0033, 1.5, 0.0816]),
        ("Carreau, 56 and 3.45 mPa.s", FlowLaw.Carreau, [0.056, 0.00345, 3.313, 0.3568]),
        ("Cross, 56 and 3.45 mPa.s", FlowLaw.Cross, [0.056, 0.00345, 1.007, 1.028]),
    ];

    private static readonly FlowLaw[] Candidates = [FlowLaw.Newtonian, FlowLaw.PowerLaw, FlowLaw.Bingham, FlowLaw.Casson, FlowLaw.HerschelBulkley, FlowLaw.Quemada];

    /// <summary>All tables.</summary>
    /// <param name="curves">Simulated curves a row.</param>
    public static IEnumerable<string> Run(int curves)
    {
        yield return $"{curves} curves a row, 12 readings each, floor 0.3 mPa; per cent of curves\n";
        yield return "Nested tests at 5 %, scale known / estimated";
        foreach (var line in Nested(curves)) yield return line;
        yield return "\nVerdicts of comparisons among Newtonian, Power law, Bingham, Casson, Herschel-Bulkley, Quemada: another law preferred / truth contradicted / truth preferred / several possible";
        foreach (var line in Verdicts(curves)) yield return line;
        yield return "\nPower, the truth being Quemada (3 mPa.s, 2 1/s, ratio 0.2): Casson contradicted / Casson within 6 units / nested test at 5 % / residual correlation at 5 %";
        foreach (var line in Power(curves)) yield return line;
        yield return "\nFlow-behavior class: Newtonian / thinning / thickening / undecided; yield stress present / absent / undecided";
        foreach (var line in Classes(curves)) yield return line;
    }

    private static IEnumerable<string> Nested(int curves)
    {
        foreach (var nesting in Nesting.All)
        {
            var numbers = nesting.Simple == FlowLaw.Newtonian ? [0.005] : nesting.Simple == FlowLaw.PowerLaw ? [0.02, 0.7] : nesting.Simple == FlowLaw.Carreau ? [0.056, 0.00345, 3.313, 0.3568] : (double[])[0.005, 0.0033];
            string Rejected(bool known)
            {
                var errors = Errors(0.01, known);
                var drawn = Drawn(curves, nesting.Simple, numbers, Low, 0.01, $"{nesting.Simple}");
                var (simple, general) = (Fits.OfAll(drawn, nesting.Simple, errors), Fits.OfAll(drawn, nesting.General, errors));
                var tests = simple.Zip(general).Where(pair => pair.First.Usable && pair.Second.Usable).Select(pair => NestedTest.Of(pair.First, pair.Second, nesting.Kind, nesting.Where)!).ToArray();
                return $"{Share(tests, test => test.Probability <= 0.05)} of {tests.Length}";
            }

            yield return $"{nesting.Simple} within {nesting.General} ({nesting.Kind}): {Rejected(true)} / {Rejected(false)}";
        }
    }

    private static IEnumerable<string> Verdicts(int curves)
    {
        foreach (var noise in (double[])[0.01, 0.03])
        {
            foreach (var (name, law, numbers) in Truths.Where(truth => Candidates.Contains(truth.Law)))
            {
                var found = Drawn(curves, law, numbers, Usual, noise, name).Select(curve => curve.Compare(Errors(noise, true), Candidates)).ToArray();
                yield return $"{name}, noise {noise:P0}: {Share(found, it => it.Preferred is { } one && one != law)} / {Share(found, it => it.Contradicted.Any(one => one.Law == law))} / {Share(found, it => it.Preferred == law)} / {Share(found, it => it.Possible.Count > 1)}";
            }
        }
    }

    private static IEnumerable<string> Power(int curves)
    {
        foreach (var noise in (double[])[0.005, 0.01, 0.02, 0.03, 0.05])
        {
            var found = Drawn(curves, FlowLaw.Quemada, [0.003, 2, 0.2], Usual, noise, "power").Select(curve => curve.Compare(Errors(noise, true), FlowLaw.Casson, FlowLaw.Quemada)).ToArray();
            yield return $"noise {noise:P1}: {Share(found, it => it.Laws[0].Against is not null)} / {Share(found, it => it.Laws[0].Difference <= 6)} / {Share(found, it => it.Nested.Count > 0 && it.Nested[0].Probability <= 0.05)} / {Share(found, it => it.Laws[0].Residuals?.Probability <= 0.05)}";
        }
    }

    private static IEnumerable<string> Classes(int curves)
    {
        foreach (var (rates, range) in new[] { (Usual, "0.7 to 300 1/s"), (Low, "0.1 to 300 1/s") })
        {
            foreach (var known in (bool[])[true, false])
            {
                yield return $"-- {range}, noise 1 %, scale {(known ? "known" : "estimated")}";
                foreach (var (name, law, numbers) in Truths)
                {
                    var found = Drawn(curves, law, numbers, rates, 0.01, name).Select(curve => curve.FlowBehavior(Errors(0.01, known))).ToArray();
                    var classes = new[] { FlowClass.Newtonian, FlowClass.ShearThinning, FlowClass.ShearThickening, FlowClass.Undecided }.Select(one => Share(found, it => it.Class == one));
                    var answers = new[] { YieldStressAnswer.Present, YieldStressAnswer.NoSign, YieldStressAnswer.Undecided }.Select(one => Share(found, it => it.YieldStress == one));
                    yield return $"{name}: {string.Join(" / ", classes)}; {string.Join(" / ", answers)}";
                }
            }
        }
    }

    private static ErrorModel Errors(double relative, bool known) => new(relative, ShearStress.FromPascals(0.0003), known);

    private static FlowCurve[] Drawn(int count, FlowLaw law, double[] numbers, double[] rates, double noise, string name) => [.. Enumerable.Range(1, count).Select(i =>
    {
        var stream = RandomStream.Of(20261201, $"{name} {noise.ToString(CultureInfo.InvariantCulture)} {rates[^1].ToString(CultureInfo.InvariantCulture)}", i);
        return FlowCurve.Of(rates, [.. rates.Select(rate => law.Stress(new(rate), numbers).Pascals * (1 + noise * stream.Normal()) + 0.0003 * stream.Normal())]);
    })];

    private static string Share<T>(IReadOnlyCollection<T> found, Func<T, bool> asked) => (100.0 * found.Count(asked) / Math.Max(1, found.Count)).ToString("F1", CultureInfo.InvariantCulture);
}
