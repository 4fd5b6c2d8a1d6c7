using static System.FormattableString;

namespace HemoRheo;

/// <summary>Makes one signal of successive checks that break a rule.</summary>
internal static class ChartSignals
{
    internal static Items<ChartSignal> Of(Items<ChartPoint> points, ChartBaseline? baseline) => Enum.GetValues<ChartRule>()
        .SelectMany(rule => OfRule(rule, points, baseline))
        .OrderBy(signal => signal.First.At)
        .ToItems();

    private static IEnumerable<ChartSignal> OfRule(ChartRule rule, Items<ChartPoint> points, ChartBaseline? baseline)
    {
        for (var i = 0; i < points.Count; i++)
        {
            if (!points[i].Breaks.Contains(rule)) continue;
            var first = i;
            while (i + 1 < points.Count && Continues(points[first], points[i + 1], rule)) i++;
            yield return Signal(rule, points[first], i - first + 1, baseline);
        }
    }

    private static bool Continues(ChartPoint first, ChartPoint next, ChartRule rule) =>
        next.Breaks.Contains(rule) && Upwards(first, rule) == Upwards(next, rule) && first.Average is null == next.Average is null;

    private static bool Upwards(ChartPoint point, ChartRule rule) => rule == ChartRule.WeightedAverage ? point.Average > point.AverageLimits?.Upper : point.Check.Error.X > Middle(point);

    private static double Middle(ChartPoint point) => (point.Limits!.Value.Lower + point.Limits.Value.Upper) / 2;

    private static ChartSignal Signal(ChartRule rule, ChartPoint first, int checks, ChartBaseline? baseline)
    {
        var provisional = first.Average is null;
        var alarm = provisional ? ChartFalseAlarms.Provisional : ChartFalseAlarms.Of(rule, baseline!.Checks);
        var (observed, limits) = rule == ChartRule.WeightedAverage ? (first.Average!.Value, first.AverageLimits!.Value) : (first.Check.Error.X, first.Limits!.Value);
        var upwards = Upwards(first, rule);
        var (kind, what) = rule switch
        {
            ChartRule.BeyondLimits => (CalibrationFindings.ChartBeyondLimits, "is"),
            ChartRule.TwoOfThree => (CalibrationFindings.ChartTwoOfThree, "is the second of three beyond two sigma,"),
            _ => (CalibrationFindings.ChartWeightedAverage, "brings the weighted average to"),
        };
        var more = checks == 1 ? "" : Invariant($"; {checks} checks in a row");
        var message = Invariant($"{Capital(first.Check)} {what} {Percent(observed):+0.00;-0.00} %; {(provisional ? "provisional " : "")}limits {Percent(limits.Lower):+0.00;-0.00} to {Percent(limits.Upper):+0.00;-0.00} %{more}. False alarms: {alarm}.");
        return new(rule, first.Check, checks, upwards, provisional, alarm, kind.At(first.Check.Where, message, Percent(observed), Percent(upwards ? limits.Upper : limits.Lower)));
    }

    private static string Capital(ChartedCheck check) => $"C{check.ToString()[1..]}";

    private static double Percent(double ln) => 100 * (Math.Exp(ln) - 1);
}
