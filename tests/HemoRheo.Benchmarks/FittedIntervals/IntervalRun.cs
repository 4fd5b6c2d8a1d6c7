using System.Globalization;

namespace HemoRheo.Benchmarks.FittedIntervals;

/// <summary>Coverage of the intervals of one fit by every method, over simulated curves of named truths.</summary>
internal static class IntervalRun
{
    private const int FewerCurves = 10;
    private const int Replicates = 500;

    private static readonly IntervalMethod[] Methods = Enum.GetValues<IntervalMethod>();

    /// <summary>A table in the form of a page: one row a truth, law, quantity, scale and method.</summary>
    /// <param name="curves">Curves for Wald and profile likelihood; a tenth of them for the bootstraps.</param>
    public static IEnumerable<string> Run(int curves)
    {
        yield return string.Create(CultureInfo.InvariantCulture, $"{curves} curves of 12 points, noise 1 % and 0.3 mPa; bootstraps: {curves / FewerCurves} curves, {Replicates} refits");
        yield return "";
        yield return "| truth | law | quantity | error sizes | method | covered | one-sided | not identifiable | no answer | median width |";
        yield return "|---|---|---|---|---|---|---|---|---|---|";
        foreach (var one in IntervalCase.All)
        {
            foreach (var known in new[] { true, false })
            {
                var tallies = Tally(one, known, curves);
                foreach (var (quantity, k) in one.Quantities.Select((quantity, k) => (quantity, k)))
                {
                    var shown = quantity.Function(one.Draw(0).Fit(one.Fitted, IntervalCase.Errors(known))).Shown;
                    foreach (var method in Methods)
                    {
                        yield return $"| {one.Name} | {one.Fitted} | {quantity.Name}, {shown} | {(known ? "known" : "up to scale")} | {method} | {tallies[k, (int)method].ToText(double.IsFinite(quantity.Value), shown)} |";
                    }
                }
            }
        }
    }

    private static IntervalTally[,] Tally(IntervalCase one, bool known, int curves)
    {
        var total = Empty(one);
        Parallel.For(0, curves, () => Empty(one), (number, _, tallies) => Count(one, known, number, number < curves / FewerCurves, tallies), tallies =>
        {
            lock (total)
            {
                for (var k = 0; k < total.GetLength(0); k++)
                {
                    foreach (var method in Methods) total[k, (int)method].Add(tallies[k, (int)method]);
                }
            }
        });
        return total;
    }

    private static IntervalTally[,] Count(IntervalCase one, bool known, int number, bool bootstraps, IntervalTally[,] tallies)
    {
        const double Level = 0.95;
        var fit = one.Draw(number).Fit(one.Fitted, IntervalCase.Errors(known));
        var quantities = one.Quantities.Select(quantity => (Function: quantity.Function(fit), quantity.Value)).ToArray();
        foreach (var method in Methods)
        {
            var drawn = method is IntervalMethod.ParametricBootstrap or IntervalMethod.ResidualBootstrap;
            if (drawn && !bootstraps) continue;
            var refused = drawn && BootstrapInterval.Refusal(fit, quantities[0].Function, Level, method) is not null;
            var refits = drawn && !refused ? BootstrapInterval.Refitted(fit, method, new(Replicates: Replicates)) : [];
            for (var k = 0; k < quantities.Length; k++)
            {
                var (function, truth) = quantities[k];
                tallies[k, (int)method].Add(drawn && !refused ? BootstrapInterval.From(fit, function, Level, method, refits) : Intervals.Of(fit, function, Level, method, null), truth);
            }
        }

        return tallies;
    }

    private static IntervalTally[,] Empty(IntervalCase one)
    {
        var tallies = new IntervalTally[one.Quantities.Count, Methods.Length];
        for (var k = 0; k < tallies.GetLength(0); k++)
        {
            foreach (var method in Methods) tallies[k, (int)method] = new();
        }

        return tallies;
    }
}
