namespace HemoRheo.Tests.Cohorts;

/// <summary>People and samples are counted apart, and each count adds up.</summary>
public sealed class GroupCountsTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(2)]
    [InlineData(3)]
    [InlineData(4)]
    [InlineData(5)]
    public void Used_set_aside_and_marked_samples_are_all_samples_and_counted_and_left_out_people_all_people(int seed)
    {
        var analyzed = Cohort(new Random(seed));
        var summary = analyzed.Summarized();
        var measurand = Assert.Single(summary.Measurands);
        foreach (var (group, code) in new[] { (measurand.First, "c"), (measurand.Second, "p") })
        {
            var people = analyzed.Readings.People.Where(person => person.GroupCode == code).Select(person => person.Id).ToHashSet();
            var samples = analyzed.Samples.Where(sample => people.Contains(sample.Record!.Person)).ToArray();
            var usable = samples.Where(sample => sample.Status == InstrumentStatus.InOrder && sample.Values is [{ Decidable: true }]).ToArray();
            Assert.Equal((samples.Length, usable.Length), (group.Samples, group.SamplesUsed));
            Assert.Equal((people.Count, usable.DistinctBy(sample => sample.Record!.Person).Count()), (group.People, group.Used));
            Assert.Equal(group.Samples, group.SamplesUsed + group.SetAside.Sum(reason => reason.Count) + group.Marked);
            Assert.Equal(group.People, group.Used + group.PeopleLeftOut!.Sum(reason => reason.Count));
            Assert.Equal(samples.Length, summary.Outcomes.Single(count => count.Label == group.Label).Samples);
        }
    }

    [Fact]
    public void Two_visits_of_four_people_are_eight_samples_used_and_four_people_counted()
    {
        double[] logs = [-5.2, -5.1, -5.0, -4.9];
        var analyzed = TwoGroups.Of(logs, logs);
        var visits = analyzed.Samples.SelectMany(sample => new[] { sample with { Sample = $"{sample.Sample}/1" }, sample with { Sample = $"{sample.Sample}/2" } });
        var group = Assert.Single((analyzed with { Samples = visits.ToItems() }).Summarized().Measurands).First;
        Assert.Equal((4, 4, 8, 8), (group.People, group.Used, group.Samples, group.SamplesUsed));
    }

    [Fact]
    public void A_person_of_the_people_table_without_a_sample_is_left_out_with_that_reason()
    {
        var analyzed = TwoGroups.Of([-5.2, -5.1, -5.0], [-5.2, -5.1, -5.0]);
        var more = analyzed with { Readings = analyzed.Readings with { People = analyzed.Readings.People.With([BuiltCohort.Person("c4", "c")]) } };
        var group = Assert.Single(more.Summarized().Measurands).First;
        Assert.Equal((4, 3), (group.People, group.Used));
        Assert.Equal([new CountedReason("person-not-measured", 1)], group.PeopleLeftOut!);
    }

    /// <summary>A cohort of people with none to three samples, some of them marked, without a value, or not decidable.</summary>
    private static AnalyzedStudy Cohort(Random random)
    {
        var people = Enumerable.Range(1, 40).Select(i => BuiltCohort.Person($"x{i}", random.Next(2) == 0 ? "c" : "p")).ToArray();
        var samples = people.SelectMany(person => Enumerable.Range(1, random.Next(4)).Select(visit => Sample(random, person, visit)));
        return BuiltCohort.Analyzed(BuiltCohort.Study, samples.ToArray(), people);
    }

    private static SampleResult Sample(Random random, Person person, int visit)
    {
        var value = BuiltCohort.Value(-5 + 0.1 * random.NextDouble());
        var sample = BuiltCohort.Sample($"S-{person.Id}/{visit}", person.Id, value);
        return random.Next(5) switch
        {
            0 => sample with { Status = InstrumentStatus.InDoubt },
            1 => sample with { Values = [] },
            2 => sample with { Values = [value with { Decidable = false }] },
            _ => sample,
        };
    }
}
