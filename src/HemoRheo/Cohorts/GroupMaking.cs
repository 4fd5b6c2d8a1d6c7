namespace HemoRheo;

/// <summary>One group's mean and scatter.</summary>
internal static class GroupMaking
{
    /// <summary>The group's summary: shared parts kept source by source, individual ones replaced by the scatter among people.</summary>
    internal static GroupSummary Of(Group group, Question question, GroupValues values)
    {
        var used = values.People.Count;
        if (used < 2) return new(group.Label, values.Samples, used, values.SetAside, values.Marked, null, null, WhyNoMean(group, values));
        var mean = Value.Mean(values.People.Select(person => person.Value).ToItems());
        var deviation = Math.Sqrt(values.People.Sum(person => Square(person.Value.X - mean.X)) / (used - 1));
        var scatter = new Contribution(new(SourceKind.People, group.Label), deviation / Math.Sqrt(used), $"people of {group.Label}, {question.Name}", used - 1);
        return new(group.Label, values.Samples, used, values.SetAside, values.Marked, mean.Only(source => source.Shared).With(scatter), deviation);
    }

    private static string WhyNoMean(Group group, GroupValues values)
    {
        var left = string.Join(", ", values.PeopleLeftOut.Select(reason => $"{reason.Count} {reason.Code}"));
        return $"{group.Label}: a mean needs two people, {values.People.Count} can be used{(left.Length == 0 ? "" : $" (left out: {left})")}.";
    }

    private static double Square(double x) => x * x;
}
