using System.Globalization;

namespace HemoRheo;

/// <summary>The difference of two groups' native values at equal hematocrit.</summary>
internal static class HematocritAdjustment
{
    private const string Plain = "covariance adjustment within groups that knows the error of hematocrit, one slope and one residual variance for both groups";
    private const string Source = "source: Fuller 1987, Measurement Error Models";

    internal static (GroupDifference Difference, Items<Finding> Findings) Of(Study study, Question question, (Group Group, GroupValues Values) first, (Group Group, GroupValues Values) second)
    {
        var nobody = new[] { first, second }.Where(group => group.Values.People.Count == 0).Select(group => GroupMaking.WhyNoMean(group.Group, group.Values)).ToArray();
        if (nobody.Length > 0) return (NotHad(string.Join(" ", nobody)), []);
        var a = HematocritOfPeople.Of(study, question, first.Values);
        var b = HematocritOfPeople.Of(study, question, second.Values);
        var name = $"{question.Measurand.Name}, {second.Group.Label} beside {first.Group.Label}";
        if (Math.Min(a.Values.Count, b.Values.Count) < 2)
        {
            return Refused($"Adjusting needs two people a group with a hematocrit whose error is known; there are {a.Values.Count} and {b.Values.Count}.", name);
        }

        var (insideA, insideB) = (a.Within, b.Within);
        var variance = ((insideA.Count - 1) * a.Variance + (insideB.Count - 1) * b.Variance) / (insideA.Count + insideB.Count - 2);
        if (ErrorAwareDifference.Of(insideA, insideB, variance) is not { } adjusted) return Refused(ErrorAwareSlope.TooCoarse, name);
        var difference = WithParts(adjusted, question, (first.Group, a), (second.Group, b));
        var method = string.Create(CultureInfo.InvariantCulture,
            $"{Plain}; {insideA.Count} and {insideB.Count} people{Without(a, b)}; slope {adjusted.Slope:G4} ± {adjusted.SlopeUncertainty:G2} per L/L, hematocrit known to {Math.Sqrt(variance):G2} L/L; {Source}");
        return (new(GroupDifferences.AdjustedQuestion, difference, GroupDifferences.TwoSided(difference), method, null), Slopes(name, insideA, a.Variance, insideB, b.Variance));
    }

    private static Value WithParts(ErrorAwareDifference adjusted, Question question, (Group Group, HematocritOfPeople People) first, (Group Group, HematocritOfPeople People) second)
    {
        var groups = $"{second.Group.Label} and {first.Group.Label}";
        var estimate = $"people of {groups}, adjusted, {question.Name}";
        var shared = (Value.Mean(second.People.Values) - Value.Mean(first.People.Values)).Only(source => source.Shared).Parts;
        var counters = second.People.CounterShares
            .Concat(first.People.CounterShares.Select(share => share with { Share = -share.Share }))
            .GroupBy(share => share.Counter, share => share.Share)
            .Where(counter => Math.Abs(counter.Sum()) > 1e-12)
            .Select(counter => new Contribution(new(SourceKind.Counter, counter.Key.Name), -adjusted.Slope * counter.Sum() * counter.Key.SharedUncertainty));
        return new(adjusted.Difference,
        [
            .. shared,
            .. counters,
            new(new(SourceKind.People, groups), adjusted.Scatter, estimate, adjusted.DegreesOfFreedom),
            new(new(SourceKind.Slope, $"{question.Name} within {groups}"), -adjusted.MeanDistance * adjusted.SlopeUncertainty, estimate, adjusted.DegreesOfFreedom),
        ]);
    }

    private static Items<Finding> Slopes(string name, WithinGroup first, double firstVariance, WithinGroup second, double secondVariance) =>
        ErrorAwareDifference.SlopesApart(first, firstVariance, second, secondVariance) is > 3 and var apart
            ? [CohortFindings.UnequalSlopes.At(Where.Nowhere, string.Create(CultureInfo.InvariantCulture, $"{name}: the groups' slopes against hematocrit lie {apart:G3} standard errors apart."), apart, 3)]
            : [];

    private static (GroupDifference, Items<Finding>) Refused(string reason, string name) =>
        (NotHad(reason), [CohortFindings.NotAdjusted.At(Where.Nowhere, $"{name}: {reason}")]);

    private static GroupDifference NotHad(string reason) => new(GroupDifferences.AdjustedQuestion, null, null, $"{Plain}; {Source}", reason);

    private static string Without(HematocritOfPeople a, HematocritOfPeople b) => a.Without + b.Without == 0 ? "" : $" ({a.Without} and {b.Without} left out, their hematocrit or its error is not known)";
}
