namespace HemoRheo.Tests.Samples;

/// <summary>Whose visits show how viscosity follows hematocrit.</summary>
public sealed class StudySlopesTests
{
    private static readonly Study Study = TestStudy.Plain with { Analysis = TestStudy.Plain.Analysis with { Laws = ["Casson"], StandardRates = [new(10)] } };

    [Fact]
    public void A_hematocrit_without_a_declared_counter_is_not_taken_as_exact()
    {
        var records = Records().ToArray();
        Assert.Equal(40, Slope(records, []).People);
        records[0] = records[0] with { Counter = null };
        records[1] = records[1] with { Counter = "unheard of" };
        records[2] = records[2] with { Hematocrit = null };
        Assert.Equal(37, Slope(records, []).People);
    }

    [Fact]
    public void People_missing_from_the_people_table_are_no_group_of_their_own()
    {
        var records = Records().ToArray();
        var people = records.Take(30).Select((record, i) => new Person(record.Person, i % 2 == 0 ? "c" : "p", new("people.csv", Line: i + 2)));
        Assert.Equal(30, Slope(records, people).People);
    }

    private static IEnumerable<SampleRecord> Records() => Enumerable.Range(0, 40).Select(i => TestStudy.Sample($"S-{i:00}") with { Hematocrit = new(0.38 + 0.004 * i) });

    private static HematocritSlope Slope(IReadOnlyCollection<SampleRecord> records, IEnumerable<Person> people)
    {
        var readings = TestStudy.Readings(Study, samples: records) with { People = people.ToItems() };
        var native = records.ToDictionary(record => record.Sample, record => new SampleValue[] { new(Measurand.Viscosity(10.PerSecond()), "Casson", HematocritBasis.Native, Value.Exact(-5.2), null, true, []) });
        return Assert.Single(StudySlopes.Of(Study, readings, [.. records.Select(record => record.Sample)], native));
    }
}
