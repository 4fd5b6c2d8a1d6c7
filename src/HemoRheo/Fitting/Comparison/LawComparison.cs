namespace HemoRheo;

/// <summary>Flow laws compared on one curve: what each says for and against it, and which of them these data can part.</summary>
/// <param name="Laws">The laws, in the order asked for.</param>
/// <param name="Nested">Tests of those that are special cases of others among them.</param>
/// <remarks>
/// AICc, its differences and weights: Burnham and Anderson 2002, Model Selection and Multimodel Inference, 2nd edition, sections 2.2, 2.4, 2.6 and 2.9.
/// One curve rarely parts laws that are near each other, and a simple law can never be preferred to one that contains it: the judgment for a study rests on all its curves.
/// Points of one ramp may be correlated; then probabilities and differences say too much.
/// </remarks>
public sealed record LawComparison(Items<ComparedLaw> Laws, Items<NestedTest> Nested)
{
    /// <summary>Largest difference of AICc at which two laws count as alike, 6: between "considerably less" support (4 to 7) and "essentially none" (above 10) of Burnham and Anderson 2002, page 70; by choice.</summary>
    public const double LargestAlike = 6;

    /// <summary>Difference of AICc above which a law is contradicted by the others, 10: "essentially no support" in Burnham and Anderson 2002, page 70.</summary>
    public const double Contradicting = 10;

    /// <summary>The one law that is left when the data part it from all others compared; null where none or several are left.</summary>
    public FlowLaw? Preferred => Possible.Count == 1 && Laws.Count(law => law.Difference is not null) > 1 ? Possible[0].Law : null;

    /// <summary>Laws that these data cannot part, from few parameters to many; one where one is preferred, none where all are contradicted.</summary>
    public Items<ComparedLaw> Possible => Laws.Where(law => law.Possible).OrderBy(law => law.Parameters).ToItems();

    /// <summary>Laws that are contradicted.</summary>
    public Items<ComparedLaw> Contradicted => Laws.Where(law => law.Against is not null).ToItems();

    /// <summary>The answer in words.</summary>
    public string Verdict => string.Join(" ", Sentences());

    /// <summary>One row a law: how well it fits, and what speaks against it.</summary>
    public Table ToTable() => Table.Of("law", "parameters", "chi-square", "probability", "AICc", "difference", "weight", "against")
        .WithRows(Laws, law => law.MinusTwiceLogLikelihood is null && !law.Fit.Usable
            ? [law.Law.Name, law.Parameters, Cell.Empty, Cell.Empty, Cell.Empty, Cell.Empty, Cell.Empty, law.WhyNotCompared]
            : [law.Law.Name, law.Parameters, TwoPlaces(law.Fit.Fit.ChiSquare), Small(law.Fit.Fit.Probability), TwoPlaces(law.Criterion), TwoPlaces(law.Difference), Small(law.Weight), law.WhyNotCompared ?? law.Against]);

    /// <summary>One row a law with a usable fit: its likelihood, and how its residuals follow each other along the curve.</summary>
    public Table ResidualsToTable() => Table.Of("law", "-2 log likelihood", "residual signs", "residual correlation", "correlation probability")
        .WithRows(Laws.Where(law => law.Residuals is not null), law => [law.Law.Name, TwoPlaces(law.MinusTwiceLogLikelihood), law.Residuals!.Signs, TwoPlaces(law.Residuals.Correlation), Small(law.Residuals.Probability)]);

    /// <summary>One row a nested pair.</summary>
    public Table NestedToTable() => Table.Of("law", "general law", "special case", "statistic", "degrees of freedom", "probability", "method")
        .WithRows(Nested, test => [test.Simple.Name, test.General.Name, test.Where, TwoPlaces(test.Statistic), test.DegreesOfFreedom, Small(test.Probability), Method(test)]);

    /// <inheritdoc/>
    public override string ToString() => $"{ToTable()}\n{TextTable.Wrap(Verdict, 100)}";

    private IEnumerable<string> Sentences()
    {
        var possible = Possible;
        var compared = Laws.Count(law => law.Difference is not null);
        if (compared == 0) yield return "No law could be compared.";
        else if (possible.Count == 0) yield return compared < Laws.Count(law => law.Fit.Usable) ? "None of the laws that could be compared describes the curve." : "None of these laws describes the curve.";
        else if (compared == 1) yield return $"Only {possible[0].Law} could be compared.";
        else if (possible.Count == 1) yield return $"{possible[0].Law} is preferred.";
        else yield return $"These data cannot tell {Listed(possible.Select(law => law.Law.Name))} apart; {possible[0].Law} has the fewest parameters.";

        var weak = Laws.Where(law => law is { Against: null, Difference: > LargestAlike }).Select(law => FormattableString.Invariant($"{law.Law} (difference {law.Difference:F1})")).ToArray();
        if (weak.Length > 0) yield return $"Less supported: {string.Join(", ", weak)}.";
        if (Contradicted.Count > 0) yield return $"Contradicted: {string.Join(", ", Contradicted.Select(law => $"{law.Law} ({law.Against})"))}.";
        foreach (var law in Laws.Where(law => law.WhyNotCompared is not null)) yield return $"{law.Law} took no part: {law.WhyNotCompared}.";
        foreach (var law in possible.Where(law => law.Fit.Parameters.Any(parameter => parameter.AtBound))) yield return $"{law.Law} ended at its boundary, {law.Fit.Law.Boundary!.Law}.";
    }

    private static Cell TwoPlaces(double? number) => number is { } known ? Cell.Rounded(known, known.ToString("F2", System.Globalization.CultureInfo.InvariantCulture)) : Cell.Empty;

    private static Cell Small(double? probability) => probability is { } known ? Cell.Rounded(known, known < 1e-4 ? "<0.0001" : Rounding.Digits(known, 2)) : Cell.Empty;

    private static string Listed(IEnumerable<string> names)
    {
        string[] all = [.. names];
        return $"{string.Join(", ", all[..^1])} and {all[^1]}";
    }

    private static string Method(NestedTest test) => (test.ResidualDegreesOfFreedom is { } left ? $"F on {test.DegreesOfFreedom} and {left}" : "chi-square") + test.Kind switch
    {
        NestingKind.AtBound => ", half and half at the bound",
        NestingKind.OthersMeaningless => ", no known distribution",
        _ => "",
    };
}
