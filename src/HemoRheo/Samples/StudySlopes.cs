namespace HemoRheo;

/// <summary>The visits that show how log viscosity follows hematocrit, given to <see cref="SlopePool"/>.</summary>
internal static class StudySlopes
{
    /// <summary>
    /// One slope a law and standard rate, from samples in order, whose hematocrit has a declared counter and whose person stands in a group.
    /// Without a people table everybody is one group.
    /// </summary>
    /// <param name="study">The study.</param>
    /// <param name="readings">What was read for it.</param>
    /// <param name="inOrder">Samples measured while the instrument was in order.</param>
    /// <param name="native">Native values of every sample.</param>
    public static IEnumerable<HematocritSlope> Of(Study study, StudyReadings readings, IReadOnlyCollection<string> inOrder, IReadOnlyDictionary<string, SampleValue[]> native)
    {
        var records = readings.Samples.ToDictionary(record => record.Sample);
        var groups = readings.People.ToDictionary(person => person.Id, person => person.GroupCode);
        var people = inOrder.Where(records.ContainsKey).Select(name => (
            Record: records[name],
            Counter: study.Counters.FirstOrDefault(counter => counter.Name == records[name].Counter),
            Group: groups.Count == 0 ? "" : groups.GetValueOrDefault(records[name].Person))).ToArray();
        foreach (var law in study.Analysis.Laws)
        {
            foreach (var measurand in study.Analysis.StandardRates.Select(Measurand.Viscosity))
            {
                var visits = new List<(string Person, string Stratum, double Hematocrit, double Uncertainty, double LogValue)>();
                foreach (var (record, counter, group) in people)
                {
                    var value = native[record.Sample].FirstOrDefault(value => value.Law == law && value.Measurand == measurand);
                    if (record.Hematocrit is not { } hematocrit || counter is null || group is null || value is null || !Speaks(value)) continue;
                    visits.Add((record.Person, group, hematocrit.LiterPerLiter, counter.Uncertainty, value.Value.X));
                }

                yield return SlopePool.Pool(law, measurand, visits);
            }
        }
    }

    private static bool Speaks(SampleValue value) => value.Findings.All(finding => finding.Severity != Severity.Fault || finding.Kind == PoolingFindings.LawDoesNotFit);
}
