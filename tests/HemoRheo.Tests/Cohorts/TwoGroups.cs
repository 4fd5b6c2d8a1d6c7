namespace HemoRheo.Tests.Cohorts;

/// <summary>Two groups of people built by hand.</summary>
internal static class TwoGroups
{
    internal static AnalyzedStudy Of(IEnumerable<double> controls, IEnumerable<double> patients, params Contribution[] parts) =>
        Of(controls.Select(x => (x, 0.44)), patients.Select(x => (x, 0.44)), parts);

    internal static AnalyzedStudy Of(IEnumerable<(double Log, double Hematocrit)> controls, IEnumerable<(double Log, double Hematocrit)> patients, params Contribution[] parts) =>
        BuiltCohort.Analyzed(BuiltCohort.Study, [.. Samples("c", controls, parts), .. Samples("p", patients, parts)], [.. People("c", controls.Count()), .. People("p", patients.Count())]);

    internal static CohortSummary Summarized(this AnalyzedStudy analyzed) => analyzed.Study.Summarize(analyzed.Judged()).By("group");

    /// <summary>A case of the reference data, its hematocrit's standard uncertainty given to the counter.</summary>
    internal static AnalyzedStudy Case(string name, double u)
    {
        var rows = ReferenceTable.Read("group-comparison", "adjusted-data.csv").Where(row => row["case"] == name).ToArray();
        var analyzed = Of(Group("0"), Group("1"));
        return analyzed with { Study = analyzed.Study with { Counters = [new("counter", u, 0.003)] } };

        IEnumerable<(double, double)> Group(string group) => rows.Where(row => row["group"] == group).Select(row => (row.Number("ln_value"), row.Number("hematocrit_L_per_L")));
    }

    private static IEnumerable<SampleResult> Samples(string group, IEnumerable<(double Log, double Hematocrit)> people, Contribution[] parts) =>
        people.Select((person, i) => BuiltCohort.Sample($"S-{group}{i + 1}", $"{group}{i + 1}", BuiltCohort.Value(person.Log, [BuiltCohort.Fit(0.03, $"S-{group}{i + 1}"), .. parts])).WithHematocrit(person.Hematocrit));

    private static IEnumerable<Person> People(string group, int count) => Enumerable.Range(1, count).Select(i => BuiltCohort.Person($"{group}{i}", group));
}
