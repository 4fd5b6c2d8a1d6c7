using static System.FormattableString;

namespace HemoRheo;

/// <summary>Slopes of log stress over log rate: over all readings well above the floor, and over the lower and the upper half of them.</summary>
internal sealed class FlowSlopes
{
    /// <summary>Largest part of a stress that the floor of the errors may be, by choice: slopes over readings near the floor say nothing and would keep a Newtonian liquid from being called one.</summary>
    private const double LargestFloorShare = 0.05;

    private const int FewestPoints = 3;

    private readonly double _margin;
    private readonly double _level;

    /// <summary>The slopes of a curve.</summary>
    /// <param name="curve">The curve.</param>
    /// <param name="errors">The error model.</param>
    /// <param name="newtonianWithin">Largest relative change of viscosity a decade of rate that counts as none.</param>
    /// <param name="level">Coverage of intervals.</param>
    public FlowSlopes(FlowCurve curve, ErrorModel errors, double newtonianWithin, double level)
    {
        (_margin, _level) = (Math.Log10(1 + newtonianWithin), level);
        FlowPoint[] points = [.. curve.Points.Where(point => errors.Floor.Pascals <= LargestFloorShare * point.Stress.Pascals).OrderBy(point => point.Rate.ReciprocalSeconds)];
        if (points.Length < FewestPoints) return;
        Rates = new(points[0].Rate.ReciprocalSeconds, points[^1].Rate.ReciprocalSeconds);
        FittedLaw Fitted(FlowPoint[] part) => (curve with { Points = part.ToItems() }).Fit((FlowLaw)FlowLaw.PowerLaw, errors);
        Whole = Fitted(points);
        if (points.Length < 2 * FewestPoints) return;
        (Low, High) = (Fitted(points[..(points.Length / 2)]), Fitted(points[(points.Length / 2)..]));
    }

    /// <summary>Rates of the readings used; null where there are too few.</summary>
    public Interval? Rates { get; }

    private FittedLaw? Whole { get; }

    private FittedLaw? Low { get; }

    private FittedLaw? High { get; }

    /// <summary>Interval of the slope over all readings used.</summary>
    public Interval? OfWhole => TwoSided(Whole);

    /// <summary>Interval of the slope over the lower half.</summary>
    public Interval? OfLow => TwoSided(Low);

    /// <summary>Interval of the slope over the upper half.</summary>
    public Interval? OfHigh => TwoSided(High);

    /// <summary>The class, and the sentences it rests on.</summary>
    public (FlowClass Class, IEnumerable<string> Evidence) Judge()
    {
        if (OfWhole is not { } whole || Rates is not { } rates) return (FlowClass.Undecided, ["Too few readings are well above the floor of the errors to tell a slope."]);
        var said = new List<string> { Invariant($"Slope of log stress over log rate {whole.Lower:F3} to {whole.Upper:F3} from {rates.Lower:G4} to {rates.Upper:G4} 1/s.") };
        if (OfLow is not { } low || OfHigh is not { } high) said.Add("Too few readings to ask both halves of the rates.");
        else
        {
            said.Add(Invariant($"Lower half {low.Lower:F3} to {low.Upper:F3}, upper half {high.Lower:F3} to {high.Upper:F3}."));
            if (Equivalent(Low!) && Equivalent(High!))
            {
                said.Add(Invariant($"Both halves are within {_margin:F3} of 1, at {_level:P0} each."));
                return (FlowClass.Newtonian, said);
            }
        }

        if (whole.Upper < 1 && !(OfLow?.Lower > 1 || OfHigh?.Lower > 1)) return (FlowClass.ShearThinning, said);
        if (whole.Lower > 1 && !(OfLow?.Upper < 1 || OfHigh?.Upper < 1)) return (FlowClass.ShearThickening, said);
        said.Add(whole.Contains(1)
            ? Invariant($"A slope of 1 is within reach, and a slope beyond {_margin:F3} of it is not excluded in both halves.")
            : "One half thins and the other thickens.");
        return (FlowClass.Undecided, said);
    }

    private Interval? TwoSided(FittedLaw? fit) => fit is { Usable: true } ? Reach(fit, (1 + _level) / 2) : null;

    /// <summary>Two one-sided tests, each at the level's error.</summary>
    private bool Equivalent(FittedLaw fit) => fit.Usable && Reach(fit, _level) is var reach && reach.Lower > 1 - _margin && reach.Upper < 1 + _margin;

    private static Interval Reach(FittedLaw fit, double probability)
    {
        var reach = StudentQuantile.At(fit.Errors.ScaleKnown ? double.PositiveInfinity : fit.Fit.DegreesOfFreedom, probability) * Math.Sqrt(fit.Covariance[3]);
        return new(Math.Exp(fit.Scaled[1] - reach), Math.Exp(fit.Scaled[1] + reach));
    }
}
