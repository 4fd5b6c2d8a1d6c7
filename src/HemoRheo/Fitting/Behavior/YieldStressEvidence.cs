using static System.FormattableString;

namespace HemoRheo;

/// <summary>Whether a thinning curve shows a yield stress: laws with one against laws without.</summary>
internal static class YieldStressEvidence
{
    /// <summary>Largest ratio of the lowest stress to the yield stress at which the low rates reach near enough, by choice: at least half of that stress is then yield stress.</summary>
    internal const double NearEnough = 2;

    /// <summary>Where the plateau of viscosity begins that must be excluded, as a share of the lowest rate, by choice.</summary>
    private const double LatePlateau = 0.1;

    /// <summary>The answer, and the sentences it rests on.</summary>
    public static (YieldStressAnswer Answer, IEnumerable<string> Evidence) Judge(FlowCurve curve, ErrorModel errors)
    {
        var with = Fitted(curve, errors, [FlowLaw.Bingham, FlowLaw.Casson, FlowLaw.HerschelBulkley]);
        var without = Fitted(curve, errors, [FlowLaw.PowerLaw, FlowLaw.Quemada, FlowLaw.Cross, FlowLaw.Carreau]).Where(law => !AtBound(law)).ToArray();
        var yielding = with.Where(law => !AtBound(law) && !law.Fit.Fit.Contradicts).MinBy(law => law.Criterion);
        var smooth = without.Where(law => !law.Fit.Fit.Contradicts).MinBy(law => law.Criterion);
        if (smooth is not null && with.Count > 0 && with.All(law => law.Criterion - smooth.Criterion > LawComparison.LargestAlike))
        {
            return (YieldStressAnswer.NoSign, [Invariant($"{smooth.Law}, which has no yield stress, is more than {LawComparison.LargestAlike} units of AICc below every law with one.")]);
        }

        if (yielding is null) return (YieldStressAnswer.Undecided, ["No law with a yield stress describes the curve."]);
        var yieldStress = yielding.Fit.Parameters[0].Estimate;
        var lowest = curve.Points.MinBy(point => point.Rate.ReciprocalSeconds)!;
        var ratio = yielding.Law.Stress(lowest.Rate, yielding.Fit.Parameters.Select(parameter => parameter.Estimate).ToArray()).Pascals / yieldStress;
        if (ratio > NearEnough)
        {
            return (YieldStressAnswer.Undecided, [Invariant($"At the lowest rate, {lowest.Rate}, the stress is {ratio:F1} times the yield stress of {yielding.Law}; lower rates are needed.")]);
        }

        if (smooth is not null && smooth.Criterion < yielding.Criterion) return (YieldStressAnswer.Undecided, [$"{smooth.Law}, which has no yield stress, describes the curve at least as well as {yielding.Law}."]);
        var rivals = Fitted(curve, errors, [FlowLaw.PowerLaw, .. Rivals(lowest.Rate.ReciprocalSeconds, yielding.Fit)]);
        var near = rivals.Where(law => law.Criterion - yielding.Criterion <= LawComparison.LargestAlike).ToArray();
        if (near.Length > 0) return (YieldStressAnswer.Undecided, [$"{near[0].Law}, without a yield stress, is not clearly worse than {yielding.Law}."]);
        if (rivals.Count < 2) return (YieldStressAnswer.Undecided, ["Laws without a yield stress could not be fitted for comparison."]);
        var reach = StudentQuantile.At(errors.ScaleKnown ? double.PositiveInfinity : yielding.Fit.Fit.DegreesOfFreedom, 0.975) * Math.Sqrt(yielding.Fit.Covariance[0]);
        return (YieldStressAnswer.Present, [
            Invariant($"{yielding.Law}: yield stress {1000 * yieldStress * Math.Exp(-reach):G3} to {1000 * yieldStress * Math.Exp(reach):G3} mPa; the stress at the lowest rate is {ratio:F1} times that."),
            $"Clearly worse: {string.Join("; ", rivals.Select(law => law.Law.Name))}."]);
    }

    /// <summary>Laws of two parameters without a yield stress that come nearest to one: a plateau of viscosity just below the rates measured, and a slope that stays.</summary>
    private static FlowLaw[] Rivals(double lowestRate, FittedLaw yielding)
    {
        var (stress, plateau) = (yielding.Parameters[0].Estimate, LatePlateau * lowestRate);
        var highest = yielding.Curve.Points.MaxBy(point => point.Rate.ReciprocalSeconds)!;
        var viscosity = highest.ApparentViscosity.PascalSeconds;
        return
        [
            FlowLaw.Custom(
                "Quemada's law with a plateau below a tenth of the lowest rate",
                (rate, p) =>
                {
                    var s = LaneDual.Sqrt(rate / p[1]);
                    return rate * p[0] * LaneDual.Square((1 + s) / (LaneDual.Sqrt(plateau / p[1]) + s));
                },
                new("high-shear viscosity", "η_∞", "Pa.s", Start: viscosity),
                new("critical rate", "γ_c", "1/s", Start: stress / viscosity)),
            Sisko(0.2, stress, viscosity),
            Sisko(0.5, stress, viscosity),
        ];
    }

    /// <summary>Sisko's law, Industrial and Engineering Chemistry 1958, 50:1789-1792, with a given exponent.</summary>
    private static FlowLaw<NamedValues> Sisko(double exponent, double stress, double viscosity) => FlowLaw.Custom(
        Invariant($"Sisko's law with exponent {exponent}"),
        (rate, p) => p[0] * rate + p[1] * LaneDual.Exp(exponent * LaneDual.Log(rate)),
        new("high-shear viscosity", "η_∞", "Pa.s", Start: viscosity),
        new("consistency", "K", "Pa.s^n", Start: stress));

    private static bool AtBound(ComparedLaw law) => law.Fit.Parameters.Any(parameter => parameter.AtBound);

    private static List<ComparedLaw> Fitted(FlowCurve curve, ErrorModel errors, IEnumerable<FlowLaw> laws) =>
        [.. LawComparing.Of([.. laws.Select(law => Fits.OfAll([curve], law, errors)[0])]).Laws.Where(law => law.Criterion is not null)];
}
