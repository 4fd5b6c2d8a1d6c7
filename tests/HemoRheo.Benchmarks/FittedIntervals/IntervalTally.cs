using System.Globalization;

namespace HemoRheo.Benchmarks.FittedIntervals;

/// <summary>What the intervals of one quantity by one method said.</summary>
internal sealed class IntervalTally
{
    private readonly List<double> _widths = [];
    private readonly int[] _kinds = new int[5];
    private int _held;

    public void Add(FitInterval interval, double truth)
    {
        _kinds[(int)interval.Kind]++;
        if (interval.Kind == IntervalKind.NoAnswer) return;
        if (interval.Allows(truth)) _held++;
        if (interval.Kind == IntervalKind.Closed) _widths.Add(interval.Upper!.Value - interval.Lower!.Value);
    }

    /// <summary>Joins counts of other curves.</summary>
    public void Add(IntervalTally other)
    {
        for (var k = 0; k < _kinds.Length; k++) _kinds[k] += other._kinds[k];
        _held += other._held;
        _widths.AddRange(other._widths);
    }

    /// <summary>Per cent of answers that allow the truth, per cent one-sided, not identifiable and without an answer of all, and the median width of the closed ones in a shown unit.</summary>
    /// <param name="known">Whether the truth has such a number.</param>
    /// <param name="shown">The unit.</param>
    public string ToText(bool known, Unit shown)
    {
        var all = _kinds.Sum();
        var answers = all - _kinds[(int)IntervalKind.NoAnswer];
        double Share(int count) => 100.0 * count / Math.Max(1, all);
        _widths.Sort();
        var covered = !known || answers == 0 ? "-" : string.Create(CultureInfo.InvariantCulture, $"{100.0 * _held / answers:F1}");
        var width = _widths.Count == 0 ? "-" : Rounding.Digits(shown.FromSi(_widths[_widths.Count / 2]), 3);
        return string.Create(CultureInfo.InvariantCulture, $"{covered} | {Share(_kinds[(int)IntervalKind.AtMost] + _kinds[(int)IntervalKind.AtLeast]):F1} | {Share(_kinds[(int)IntervalKind.NotIdentifiable]):F1} | {Share(_kinds[(int)IntervalKind.NoAnswer]):F1} | {width}");
    }
}
