namespace HemoRheo.Benchmarks.SimulatedCharts;

/// <summary>How well changes are dated: weekly checks, a change at a moment of its own between two checks, the chart looked at when it first signals or some checks later.</summary>
/// <param name="Charts">Charts that signaled after the change and not before.</param>
/// <param name="Held">Of these, those whose interval of the true shape holds the true moment.</param>
/// <param name="HeldEither">Those where the true moment does not lie before the earliest one that the chart names.</param>
/// <param name="RightShape">Those where the true shape describes the checks better.</param>
/// <param name="MeanDays">Mean length of the interval, days.</param>
/// <param name="MeanChecks">Mean number of checks from the change to the first signal.</param>
internal sealed record SimulatedChanges(int Charts, int Held, int HeldEither, int RightShape, double MeanDays, double MeanChecks)
{
    private const double Sigma = 0.005;
    private const int Longest = 200;
    private static readonly DateTimeOffset Start = new(2026, 3, 2, 9, 0, 0, TimeSpan.FromHours(1));

    /// <summary>Simulates charts.</summary>
    /// <param name="shape">Step or drift.</param>
    /// <param name="size">Size in sigma; of a drift, in sigma a check.</param>
    /// <param name="steady">Checks before the change, the baseline included.</param>
    /// <param name="after">Checks looked at after the first signal.</param>
    /// <param name="charts">How many.</param>
    /// <param name="seed">Seed.</param>
    /// <param name="baseline">Checks in the baseline.</param>
    public static SimulatedChanges Of(ChangeShape shape, double size, int steady, int after, int charts, long seed, int baseline = ControlChart.LeastBaseline)
    {
        var (counted, held, either, right, days, run) = (0, 0, 0, 0, 0.0, 0.0);
        for (var i = 0; i < charts; i++)
        {
            var random = RandomStream.Of(seed, FormattableString.Invariant($"{shape}/{size}/{steady}/{after}"), i);
            var moment = steady - 1 + random.Uniform();
            var checks = new ChartedCheck[steady + Longest];
            for (var k = 0; k < checks.Length; k++)
            {
                var shift = k < moment ? 0 : shape == ChangeShape.Step ? size : size * (k - moment);
                checks[k] = new($"C{k}", Start.AddDays(7 * k), Value.Exact(Sigma * (random.Normal() + shift)), "oil, lot 7", CheckOutcome.Passes);
            }

            var first = Array.FindIndex([.. ControlChart.Of("R1", checks, [], baseline).Current.Points], point => point.Breaks.Count > 0);
            if (first < moment || first < 0) continue;
            var changes = ControlChart.Of("R1", checks.Take(first + 1 + after), [], baseline).Current.Changes!;
            var (own, truth) = (shape == ChangeShape.Step ? changes.Step : changes.Drift, Start.AddDays(7 * moment));
            counted++;
            run += first - moment;
            if (own.Earliest <= truth && truth <= own.Latest) held++;
            if (changes.Earliest <= truth) either++;
            if (changes.Better.Shape == shape) right++;
            days += (own.Latest - own.Earliest).TotalDays;
        }

        return new(counted, held, either, right, days / counted, run / counted);
    }
}
