namespace HemoRheo;

/// <summary>Compares the laws of a study on the curves that all of them were fitted to.</summary>
internal static class PooledComparing
{
    private const double EnoughCurves = 0.8;
    private const double BeyondChance = 2;
    private const int CurvesForChance = 4;
    private const double ContradictingPerCurve = 1;
    private const double OftenAtBound = 0.25;

    /// <summary>The comparison.</summary>
    /// <param name="fits">For each law a sound fit of each loading, null where there is none; the law that decides first.</param>
    /// <param name="evidence">What the residuals say of each law.</param>
    public static PooledComparison Of(IReadOnlyList<(FlowLaw Law, FittedLaw?[] Fits)> fits, IReadOnlyDictionary<string, LawEvidence> evidence)
    {
        if (fits.Count == 1) return new([new(fits[0].Law.Name, LawStanding.NotCompared)], "The study fits one law, so there is nothing to compare it with.");
        var wanted = Enumerable.Range(0, fits[0].Fits.Length).Where(i => Criterion(fits[0].Fits[i]) is not null).ToArray();
        var compared = fits.Where(law => wanted.Length > 0 && wanted.Count(i => Criterion(law.Fits[i]) is not null) >= EnoughCurves * wanted.Length).ToArray();
        var curves = wanted.Where(i => compared.All(law => Criterion(law.Fits[i]) is not null)).ToArray();
        if (compared.Length < 2 || curves.Length == 0) return new(fits.Select(law => new PooledLaw(law.Law.Name, LawStanding.NotCompared)).ToItems(), FormattableString.Invariant($"The laws could not be compared: a law takes part that has usable fits of {100 * EnoughCurves:G2} % of the {wanted.Length} curves of {fits[0].Law}; {string.Join(", ", fits.Skip(1).Select(law => FormattableString.Invariant($"{law.Law} has {wanted.Count(i => Criterion(law.Fits[i]) is not null)}")))}."));

        var criteria = compared.ToDictionary(law => law.Law, law => curves.Select(i => Criterion(law.Fits[i])!.Value).ToArray());
        var fitting = compared.Where(law => evidence[law.Law.Name].Fits).Select(law => law.Law).ToArray();
        var best = (fitting.Length > 0 ? fitting : [.. criteria.Keys]).MinBy(law => criteria[law].Sum())!;
        var lowest = criteria.Values.Min(each => each.Sum());
        var total = criteria.Values.Sum(each => Math.Exp((lowest - each.Sum()) / 2));
        var laws = fits.Select(law => criteria.TryGetValue(law.Law, out var each) ? Against(best, criteria[best], law.Law, each) with
        {
            Weight = Math.Exp((lowest - each.Sum()) / 2) / total,
            AtBound = curves.Count(i => law.Fits[i]!.Parameters.Any(parameter => parameter.AtBound)),
        } : new(law.Law.Name, LawStanding.NotCompared)).ToArray();
        var settled = Settled(compared.Select(law => law.Law), [.. laws.Select(law => law.Curves > 0 && !evidence[law.Law].Fits ? law with { Standing = LawStanding.Contradicted } : law)]);
        return new(settled, PooledComparisonWords.Of(settled, best.Name, curves.Length));
    }

    /// <summary>What the comparison adds to the evidence for a law: one that another law of the study beats clearly on every curve does not fit, also where its own residuals cannot show it.</summary>
    public static LawEvidence Judged(LawEvidence evidence, PooledComparison comparison) =>
        evidence.Fits && comparison.Laws.First(law => law.Law == evidence.Law) is { Standing: LawStanding.Contradicted } behind
            ? evidence with { Fits = false, Words = FormattableString.Invariant($"{evidence.Law} does not fit: another law of the study is {behind.Difference:F0} units of AIC better on the same {behind.Curves} curves. {evidence.Words}") }
            : evidence;

    /// <summary>What is to be said of it for the law that decides.</summary>
    public static IEnumerable<Finding> Findings(PooledComparison comparison, string decideBy)
    {
        var standing = comparison.Laws.First(law => law.Law == decideBy).Standing;
        if (standing == LawStanding.NotParted) yield return PoolingFindings.LawsNotParted.At(Where.Nowhere, comparison.Words);
        if (standing == LawStanding.Behind) yield return PoolingFindings.LawBehind.At(Where.Nowhere, comparison.Words);
    }

    private static double? Criterion(FittedLaw? fit)
    {
        if (fit is null) return null;
        var free = fit.Parameters.Count(parameter => !parameter.AtBound);
        var minusTwiceLog = Likelihood.MinusTwiceLog(fit);
        return !double.IsFinite(minusTwiceLog) ? null : fit.Errors.ScaleKnown ? minusTwiceLog + 2 * free : Likelihood.CorrectedCriterion(minusTwiceLog, free + 1, fit.Residuals.Count);
    }

    private static PooledLaw Against(FlowLaw best, double[] lowest, FlowLaw law, double[] each)
    {
        var differences = each.Zip(lowest, (own, other) => own - other).ToArray();
        var (n, difference) = (differences.Length, differences.Sum());
        double? error = law == best || n == 1 ? null : Math.Sqrt(differences.Sum(one => (one - difference / n) * (one - difference / n)) * n / (n - 1.0));
        var chance = n < CurvesForChance ? 0 : error ?? 0;
        var standing = law == best || !(difference > PooledComparison.Parting && difference > BeyondChance * chance) ? LawStanding.NotParted
            : difference > ContradictingPerCurve * n ? LawStanding.Contradicted
            : LawStanding.Behind;
        return new(law.Name, standing, n, each.Sum(), difference, error);
    }

    /// <summary>Takes out of the laws that are not parted those that only repeat a simpler one at their boundary; a law left alone is preferred.</summary>
    private static Items<PooledLaw> Settled(IEnumerable<FlowLaw> compared, PooledLaw[] laws)
    {
        foreach (var general in compared.Where(law => law.Boundary is not null))
        {
            var (own, simple) = (Array.FindIndex(laws, law => law.Law == general.Name), laws.FirstOrDefault(law => law.Law == general.Boundary!.Law));
            if (simple is { Standing: LawStanding.NotParted } && laws[own].Standing is LawStanding.NotParted or LawStanding.Behind && laws[own].AtBound >= OftenAtBound * laws[own].Curves && simple.Criterion <= laws[own].Criterion)
            {
                laws[own] = laws[own] with { Standing = LawStanding.AtBoundary };
            }
        }

        return laws.Count(law => law.Standing == LawStanding.NotParted) > 1 ? laws.ToItems()
            : laws.Select(law => law.Standing == LawStanding.NotParted ? law with { Standing = LawStanding.Preferred } : law).ToItems();
    }
}
