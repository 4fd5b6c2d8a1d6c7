namespace HemoRheo;

/// <summary>One group's mean and scatter.</summary>
internal static class GroupMaking
{
    /// <summary>The group's summary: shared parts kept source by source, individual ones replaced by the scatter among people.</summary>
    internal static GroupSummary Of(Group group, Question question, GroupValues values)
    {
        var used = values.People.Count;
        var counted = new GroupSummary(
            group.Label, values.Samples, used, values.SetAside, values.Marked, null, null,
            People: used + values.PeopleLeftOut.Sum(reason => reason.Count), SamplesUsed: values.SamplesUsed, PeopleLeftOut: values.PeopleLeftOut);
        if (used < 2) return counted with { WhyNoMean = WhyNoMean(group, values) };
        var mean = Value.Mean(values.People.Select(person => person.Value).ToItems());
        var deviation = Math.Sqrt(values.People.Sum(person => Square(person.Value.X - mean.X)) / (used - 1));
        var scatter = new Contribution(new(SourceKind.People, group.Label), deviation / Math.Sqrt(used), $"people of {group.Label}, {question.Name}", used - 1);
        return counted with { Mean = mean.Only(source => source.Shared).With(scatter), StandardDeviation = deviation };
    }

    /// <summary>Why a group with fewer than two people that can be used has no mean, the reasons counted.</summary>
    internal static string WhyNoMean(Group group, GroupValues values)
    {
        var left = string.Join(", ", values.PeopleLeftOut.Select(reason => $"{reason.Count} {reason.Code}"));
        var can = values.People.Count == 0 ? "nobody can be used" : "a mean needs two people, 1 can be used";
        return $"{group.Label}: {can}{(left.Length == 0 ? "" : $" (people left out: {left})")}.";
    }

    private static double Square(double x) => x * x;
}
