using System.Globalization;

namespace HemoRheo;

/// <summary>Reference ranges from the study's controls, or from the limits its file declares.</summary>
internal static class RangeMaking
{
    private const int FewestControls = 20;

    internal static RangeAnswer Answer(AnalyzedStudy analyzed, Question question)
    {
        var declared = Declared(analyzed.Study, question);
        if (!analyzed.Study.Reference.FromControls)
        {
            return new(question, declared, declared is null ? "The study file gives no limits for it." : null, []);
        }

        var codes = analyzed.Study.Groups.Where(group => group.Controls).Select(group => group.Code).ToHashSet();
        var controls = GroupValues.Of(analyzed, question, person => codes.Contains(person.GroupCode));
        var (range, kind, reason) = FromControls(analyzed.Study, question, controls);
        if (range is not null) return new(question, range, null, []);
        var message = $"{question.Measurand.Name}, {question.Basis.Words()}, {question.Law}: {reason} {(declared is null ? "There is no range." : "The declared limits are used instead.")}";
        var said = declared is null && controls.People.Count == 0 && question.IsContradicted(analyzed);
        return new(question, declared, declared is null ? reason : null, said ? [] : [kind!.At(Where.Nowhere, message, controls.People.Count, FewestControls)]);
    }

    private static (ReferenceRange? Range, FindingKind? Kind, string? Reason) FromControls(Study study, Question question, GroupValues controls)
    {
        var used = controls.People.Count;
        if (used < FewestControls) return (null, RangeFindings.TooFewControls, TooFew(controls));
        var numbers = controls.People.Select(person => person.Value.X).ToArray();
        if (RobustLimits.Find([.. numbers], RobustLimits.TwoSided(used)) is not { } limits)
        {
            return (null, RangeFindings.ControlsWithoutSpread, "Half of the controls or more have one and the same value.");
        }

        var intervals = RobustLimitsBootstrap.Of(numbers, study.Seed, question.Name);
        var shared = Value.Mean(controls.People.Select(person => person.Value).ToItems()).Only(source => source.Shared).Parts;
        var method = string.Create(CultureInfo.InvariantCulture, $"robust limits, 2.5th and 97.5th percentile{(question.Measurand.Logarithmic ? " of the logarithm" : "")}; 90 % intervals from {RobustLimitsBootstrap.Resamples} resamples");
        return (new(question.Measurand, question.Law, question.Basis, limits.Limits, intervals.LowerLimit, intervals.UpperLimit, method, used, controls.PeopleLeftOut, shared, RobustLimits.Source.ToString()), null, null);
    }

    private static string TooFew(GroupValues controls)
    {
        var left = string.Join(", ", controls.PeopleLeftOut.Select(reason => $"{reason.Count} {reason.Code}"));
        return $"The robust method needs {FewestControls} controls; {controls.People.Count} can be used{(left.Length == 0 ? "" : $" (left out: {left})")}.";
    }

    private static ReferenceRange? Declared(Study study, Question question)
    {
        if (question.Measurand is not ViscosityAtRate viscosity || question.Law != study.Analysis.DecideBy) return null;
        var standard = question.Basis != HematocritBasis.Native;
        var limits = study.Reference.Declared.FirstOrDefault(limits => limits.Rate == viscosity.Rate && limits.AtStandardHematocrit == standard);
        return limits is null
            ? null
            : new(question.Measurand, null, question.Basis, new(viscosity.ToWorking(limits.Lower.PascalSeconds), viscosity.ToWorking(limits.Upper.PascalSeconds)), null, null, "declared in the study file", 0, [], [], limits.Source);
    }

    /// <summary>One finding a law beside the deciding one, which is judged with the pool, whose quantities the study's curves keep from being decided on.</summary>
    internal static IEnumerable<Finding> Contradicted(AnalyzedStudy analyzed, IReadOnlyCollection<RangeAnswer> answers) => answers
        .Select(answer => answer.Question)
        .Where(question => question.Law != analyzed.Study.Analysis.DecideBy && question.IsContradicted(analyzed))
        .GroupBy(question => question.Law)
        .Select(law => RangeFindings.LawContradicted.At(Where.Nowhere,
            $"{string.Join(", ", law.Select(question => question.Measurand.Name).Distinct())}: shown, not decided on, without a range and without a mean. {analyzed.Pool.Laws.First(evidence => evidence.Law == law.Key).Words}"));

    internal static IEnumerable<Finding> Unused(Study study, IReadOnlyCollection<RangeAnswer> answers)
    {
        foreach (var limits in study.Reference.Declared)
        {
            var used = answers.Any(answer => answer.Range is { Law: null } && answer.Question.Measurand is ViscosityAtRate viscosity
                && viscosity.Rate == limits.Rate && answer.Question.Basis != HematocritBasis.Native == limits.AtStandardHematocrit);
            if (!used)
            {
                var basis = limits.AtStandardHematocrit ? "standard" : "native";
                yield return RangeFindings.DeclaredLimitsUnused.At(new(File: study.FileName), $"Declared {basis} limits at {limits.Rate} are held against no value.");
            }
        }
    }
}
