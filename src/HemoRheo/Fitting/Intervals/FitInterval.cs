using System.Globalization;

namespace HemoRheo;

/// <summary>The interval of a parameter, or of a quantity derived from a fit, from one curve alone. A side that these data leave open has no number.</summary>
/// <param name="Name">What it is of.</param>
/// <param name="Shown">The unit it is shown in.</param>
/// <param name="Estimate">The estimate, SI; null where there is none.</param>
/// <param name="Lower">Lower limit, SI; null where the side is open.</param>
/// <param name="Upper">Upper limit, SI; null where the side is open.</param>
/// <param name="Range">Where the quantity can lie at all, SI.</param>
/// <param name="Level">Coverage asked for, e.g. 0.95.</param>
/// <param name="Method">How it was found.</param>
/// <param name="WhyNone">Why the method has no answer; null where it has one.</param>
/// <param name="Findings">Findings about the interval.</param>
public sealed record FitInterval(
    string Name,
    Unit Shown,
    double? Estimate,
    double? Lower,
    double? Upper,
    Interval Range,
    double Level,
    IntervalMethod Method,
    string? WhyNone,
    Items<Finding> Findings)
{
    /// <summary>What it says.</summary>
    public IntervalKind Kind => (WhyNone, Lower, Upper) switch
    {
        (not null, _, _) => IntervalKind.NoAnswer,
        (_, not null, not null) => IntervalKind.Closed,
        (_, null, not null) => IntervalKind.AtMost,
        (_, not null, null) => IntervalKind.AtLeast,
        _ => IntervalKind.NotIdentifiable,
    };

    /// <summary>Whether it leaves a number possible; without an answer nothing is excluded.</summary>
    /// <param name="si">The number, SI.</param>
    public bool Allows(double si) => !(si < Lower || si > Upper);

    /// <inheritdoc/>
    public override string ToString() => Kind switch
    {
        IntervalKind.Closed => $"{Name} {Closed(Shown.FromSi(Lower!.Value), Shown.FromSi(Upper!.Value))}{UnitWord} ({How}){ByForm}",
        IntervalKind.AtMost => $"{Name} at most {One(Upper!.Value)}{UnitWord} ({How}); these shear rates {(double.IsFinite(Range.Lower) ? $"do not exclude {End(Range.Lower)}" : "set no lower limit")}",
        IntervalKind.AtLeast => $"{Name} at least {One(Lower!.Value)}{UnitWord} ({How}); these shear rates {(double.IsFinite(Range.Upper) ? $"do not exclude {End(Range.Upper)}" : "set no upper limit")}",
        IntervalKind.NotIdentifiable => $"{Name}: not identifiable with these shear rates ({How})",
        _ => $"{Name}: no answer ({How}): {WhyNone}",
    };

    private string ByForm => Findings.FirstOrDefault(finding => finding.Kind == FittingFindings.YieldStressByForm || finding.Kind == FittingFindings.IntervalExtrapolated) is { } finding ? $". {finding.Message.TrimEnd('.')}" : "";

    private string How => string.Create(CultureInfo.InvariantCulture, $"{100 * Level:G6} %, {MethodWord}");

    private string MethodWord => Method switch
    {
        IntervalMethod.Wald => "Wald",
        IntervalMethod.ProfileLikelihood => "profile likelihood",
        IntervalMethod.ParametricBootstrap => "parametric bootstrap",
        _ => "residual bootstrap",
    };

    private string UnitWord => Shown.Symbol == ShownUnits.One.Symbol ? "" : $" {Shown.Symbol}";

    private string One(double si) => Rounding.Digits(Shown.FromSi(si), 3);

    private string End(double si) => si == 0 ? "zero" : One(si) + UnitWord;

    private string Closed(double lower, double upper) =>
        Estimate is { } estimate && double.IsFinite(estimate) ? $"{Rounding.Number(Shown.FromSi(estimate), (upper - lower) / 4)}, {Rounding.Interval(lower, upper)}" : Rounding.Interval(lower, upper);
}
