namespace HemoRheo;

/// <summary>
/// Control chart of the ln errors of an instrument's checks, each with its uncertainty: individual checks with three-sigma limits, two of three beyond two sigma,
/// and an exponentially weighted average for slow drift. Every adjustment of the instrument starts it anew.
/// </summary>
/// <param name="Instrument">Name of the instrument.</param>
/// <param name="Segments">The chart between adjustments, by time; at least one.</param>
/// <remarks>
/// The limits rest on the first checks since the adjustment that did not fail. Until there are as many as asked for, the chart is provisional:
/// each check from the sixth is held against mean and scatter of those before it, with Student's t for as rare a false alarm as three sigma,
/// t(n - 1) s sqrt(1 + 1/n) after n checks; the other two rules wait. Source of that: Hawkins 1987, The Statistician 36:299-315 (self-starting charts).
/// A chart says whether the instrument changed, not whether it is right: that is what the check's own verdict says.
/// </remarks>
public sealed record ControlChart(string Instrument, Items<ChartSegment> Segments)
{
    /// <summary>Fewest checks a baseline may have.</summary>
    public const int LeastBaseline = 20;

    /// <summary>Width of the limits of one check, in sigma.</summary>
    public const double Width = 3;

    /// <summary>Width beyond which two of three checks signal, in sigma.</summary>
    public const double WarningWidth = 2;

    /// <summary>Weight (lambda) of a new check in the exponentially weighted average.</summary>
    public const double Weight = 0.2;

    /// <summary>Width (L) of the limits of the weighted average, in its own sigma: mean run length 500 with the limits fully grown, 494 from the start.</summary>
    public const double WeightedWidth = 2.962;

    /// <summary>The chart since the last adjustment.</summary>
    public ChartSegment Current => Segments[^1];

    /// <summary>Findings of all segments.</summary>
    public Items<Finding> Findings => Segments.SelectMany(segment => segment.Findings).ToItems();

    /// <summary>Makes the chart.</summary>
    /// <param name="instrument">Name of the instrument.</param>
    /// <param name="checks">One check a filling, in any order.</param>
    /// <param name="adjusted">Moments at which the instrument was adjusted; a check at that very moment comes after it.</param>
    /// <param name="baseline">How many checks the limits rest on, at least 20.</param>
    /// <exception cref="ArgumentOutOfRangeException">A baseline of fewer than 20 checks was asked for.</exception>
    /// <exception cref="ArgumentException">The error of a check is not a finite number.</exception>
    public static ControlChart Of(string instrument, IEnumerable<ChartedCheck> checks, IEnumerable<DateTimeOffset> adjusted, int baseline = LeastBaseline)
    {
        if (baseline < LeastBaseline) throw new ArgumentOutOfRangeException(nameof(baseline), baseline, $"A control chart needs a baseline of at least {LeastBaseline} checks; with fewer it makes provisional limits by itself.");
        var sorted = checks.OrderBy(check => check.At).ToArray();
        if (Array.Find(sorted, check => !double.IsFinite(check.Error.X)) is { } wrong) throw new ArgumentException($"The error of {wrong} is no finite number; a check that gives no error cannot be charted.", nameof(checks));

        var starts = adjusted.Distinct().Order().Cast<DateTimeOffset?>().Prepend(null).ToArray();
        var segments = starts.Select((from, i) =>
        {
            var until = i + 1 < starts.Length ? starts[i + 1] : null;
            var own = sorted.Where(check => (from is null || check.At >= from) && (until is null || check.At < until)).ToArray();
            return ChartSegments.Of(from, own, baseline);
        });
        return new(instrument, segments.Where((segment, i) => segment.Points.Count > 0 || i == starts.Length - 1).ToItems());
    }

    /// <inheritdoc/>
    public override string ToString() => $"control chart of {Instrument}: {Current}";
}
