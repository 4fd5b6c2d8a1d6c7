namespace HemoRheo;

/// <summary>People of one group with both a value and a hematocrit whose error is known.</summary>
/// <param name="Values">Their values, visits averaged.</param>
/// <param name="Hematocrits">Their hematocrits, L/L, of the same visits.</param>
/// <param name="Variance">Mean variance of a person's hematocrit, shared parts left out.</param>
/// <param name="CounterShares">By counter, the share of the group's mean hematocrit that it measured.</param>
/// <param name="Without">People with a value whose hematocrit or its error is not known.</param>
internal sealed record HematocritOfPeople(Items<Value> Values, Items<double> Hematocrits, double Variance, Items<CounterShare> CounterShares, int Without)
{
    internal static HematocritOfPeople Of(Study study, Question question, GroupValues group)
    {
        var values = new List<Value>();
        var hematocrits = new List<double>();
        var variances = new List<double>();
        var shares = new Dictionary<Counter, double>();
        foreach (var person in group.People)
        {
            var visits = person.Samples.Select(sample => (Sample: sample, Counter: CounterOf(study, sample))).Where(visit => visit.Counter is not null).ToArray();
            if (visits.Length == 0) continue;
            values.Add(Value.Mean(visits.Select(visit => visit.Sample.Find(question.Law, question.Measurand, question.Basis)!.Value).ToItems()));
            hematocrits.Add(visits.Average(visit => visit.Sample.Record!.Hematocrit!.Value.LiterPerLiter));
            variances.Add(visits.Average(visit => visit.Counter!.Uncertainty * visit.Counter.Uncertainty) / visits.Length);
            foreach (var visit in visits) shares[visit.Counter!] = shares.GetValueOrDefault(visit.Counter!) + 1.0 / visits.Length;
        }

        return new(
            values.ToItems(),
            hematocrits.ToItems(),
            variances.DefaultIfEmpty(0).Average(),
            shares.Select(share => new CounterShare(share.Key, share.Value / values.Count)).ToItems(),
            group.People.Count - values.Count);
    }

    internal WithinGroup Within => WithinGroup.Of(Hematocrits, [.. Values.Select(value => value.X)]);

    private static Counter? CounterOf(Study study, SampleResult sample) =>
        sample.Record is { Hematocrit: not null, Counter: { } name } ? study.Counters.FirstOrDefault(counter => counter.Name == name) : null;
}
