namespace HemoRheo;

/// <summary>Laws compared, said as a sentence: <c>curve.Compare(FlowLaw.Casson, FlowLaw.Quemada)</c>.</summary>
public static class LawComparing
{
    /// <summary>Mean squared residual, in variances of the error model, that is rounding and no error.</summary>
    private const double RoundingAlone = 1e-20;

    /// <summary>Fits flow laws to the kept points of a curve with the default error model, known up to a scale, and compares them.</summary>
    /// <param name="curve">The curve.</param>
    /// <param name="laws">Two laws or more, each once.</param>
    /// <exception cref="ArgumentException">There are fewer than two laws, or one stands twice.</exception>
    public static LawComparison Compare(this FlowCurve curve, params FlowLaw[] laws) => curve.Compare(ErrorModel.Default, laws);

    /// <summary>Fits flow laws to the kept points of a curve and compares them.</summary>
    /// <param name="curve">The curve.</param>
    /// <param name="errors">The error model: known sizes also tell whether a law fits at all.</param>
    /// <param name="laws">Two laws or more, each once.</param>
    /// <returns>The comparison. Laws that cannot be fitted stand in it with the reason, never as an exception.</returns>
    /// <exception cref="ArgumentException">There are fewer than two laws, or one stands twice.</exception>
    public static LawComparison Compare(this FlowCurve curve, ErrorModel errors, params FlowLaw[] laws)
    {
        ArgumentNullException.ThrowIfNull(curve);
        ArgumentNullException.ThrowIfNull(errors);
        ArgumentNullException.ThrowIfNull(laws);
        foreach (var law in laws) ArgumentNullException.ThrowIfNull(law);
        if (laws.Length < 2) throw new ArgumentException($"A comparison needs two laws or more; there {(laws.Length == 1 ? $"is one, {laws[0]}" : "is none")}.", nameof(laws));
        if (laws.GroupBy(law => law.Name).FirstOrDefault(same => same.Count() > 1) is { } twice) throw new ArgumentException($"{twice.Key} stands twice among the laws to compare; give each once, and laws of your own names of their own.", nameof(laws));
        return Of([.. laws.Select(law => Fits.OfAll([curve], law, errors)[0])]);
    }

    /// <summary>The comparison of fits to one curve with one error model.</summary>
    internal static LawComparison Of(IReadOnlyList<FittedLaw> fits)
    {
        ComparedLaw[] plain = [.. fits.Select(Alone)];
        var criteria = plain.Select(law => law.Criterion).OfType<double>().ToArray();
        var lowest = criteria.Length == 0 ? 0 : criteria.Min();
        var total = criteria.Sum(criterion => Math.Exp((lowest - criterion) / 2));
        var laws = plain.Select(law => law.Criterion is not { } criterion ? law : Against(law with { Difference = criterion - lowest, Weight = Math.Exp((lowest - criterion) / 2) / total }));
        return new(laws.ToItems(), Tests(fits).ToItems());
    }

    private static ComparedLaw Alone(FittedLaw fit)
    {
        var counted = Likelihood.Counted(fit.Law, fit.Errors);
        if (!fit.Usable) return new(fit, counted, null, null, null, null, null, $"its fit is not usable ({fit.Findings.FirstOrDefault(finding => finding.Severity == Severity.Fault)?.Code ?? fit.Convergence.Message})", null);
        var minusTwice = Likelihood.MinusTwiceLog(fit);
        var pattern = ResidualPattern.Of(fit);
        var criterion = Likelihood.CorrectedCriterion(minusTwice, counted, fit.Residuals.Count);
        var why = criterion is null ? $"{fit.Residuals.Count} points are too few for AICc with {counted} parameters"
            : !double.IsFinite(minusTwice) || (!fit.Errors.ScaleKnown && fit.Fit.ChiSquare < RoundingAlone * fit.Residuals.Count) ? "it goes through every point, so the errors have no size"
            : null;
        return new(fit, counted, double.IsFinite(minusTwice) ? minusTwice : null, why is null ? criterion : null, null, null, pattern, why, null);
    }

    private static ComparedLaw Against(ComparedLaw law) => law with
    {
        Against = law.Fit.Fit is { Contradicts: true, Probability: { } p } ? p < 1e-4 ? "lack of fit, p below 0.0001" : FormattableString.Invariant($"lack of fit, p {p:G2}")
            : law.Difference > LawComparison.Contradicting ? FormattableString.Invariant($"AICc {law.Difference:F1} above the lowest")
            : null,
    };

    private static IEnumerable<NestedTest> Tests(IReadOnlyList<FittedLaw> fits) =>
        from nesting in Nesting.All
        let simple = fits.FirstOrDefault(fit => fit.Law == nesting.Simple)
        let general = fits.FirstOrDefault(fit => fit.Law == nesting.General)
        where simple is { Usable: true } && general is { Usable: true }
        let test = NestedTest.Of(simple, general, nesting.Kind, nesting.Where)
        where test is not null
        select test;
}
