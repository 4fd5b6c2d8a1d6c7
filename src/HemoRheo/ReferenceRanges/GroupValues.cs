namespace HemoRheo;

/// <summary>The values of some people for one question, and what was left out and why.</summary>
/// <param name="People">One value a person that can be used, in the order of the people table.</param>
/// <param name="Samples">Samples measured, used or not.</param>
/// <param name="SetAside">Samples left out though the instrument was in order, by code.</param>
/// <param name="Marked">Samples measured while the instrument was not in order; never used.</param>
/// <param name="SamplesUsed">Samples used; those of one person are averaged.</param>
/// <param name="PeopleLeftOut">People without a value that can be used, by the code of their first sample's reason.</param>
internal sealed record GroupValues(Items<PersonValue> People, int Samples, int SamplesUsed, Items<CountedReason> SetAside, int Marked, Items<CountedReason> PeopleLeftOut)
{
    internal static GroupValues Of(AnalyzedStudy analyzed, Question question, Func<Person, bool> belongs)
    {
        var byPerson = analyzed.Samples.Where(sample => sample.Record is not null).ToLookup(sample => sample.Record!.Person);
        var people = new List<PersonValue>();
        var reasons = new List<string>();
        var left = new List<string>();
        var samples = 0;
        foreach (var person in analyzed.Readings.People.Where(belongs).DistinctBy(person => person.Id))
        {
            var own = byPerson[person.Id].Select(sample => (Sample: sample, Reason: WhyLeftOut(sample, question))).ToArray();
            samples += own.Length;
            reasons.AddRange(own.Select(one => one.Reason).OfType<string>());
            var used = own.Where(one => one.Reason is null).Select(one => one.Sample).ToItems();
            if (used.Count > 0)
            {
                people.Add(new(person.Id, Value.Mean(used.Select(sample => Find(sample, question)!.Value).ToItems()), used));
            }
            else
            {
                left.Add(own.Length == 0 ? ExportFindings.PersonNotMeasured.Code : own[0].Reason!);
            }
        }

        var marked = reasons.Count(reason => reason == RangeFindings.InstrumentNotInOrder.Code);
        return new(people.ToItems(), samples, people.Sum(person => person.Samples.Count), Counted(reasons.Where(reason => reason != RangeFindings.InstrumentNotInOrder.Code)), marked, Counted(left));
    }

    private static string? WhyLeftOut(SampleResult sample, Question question)
    {
        if (sample.Status != InstrumentStatus.InOrder) return RangeFindings.InstrumentNotInOrder.Code;
        var value = Find(sample, question);
        if (value is null) return RangeFindings.ValueMissing.Code;
        if (sample.StatusOf(value) != InstrumentStatus.InOrder) return RangeFindings.InstrumentNotInOrder.Code;
        if (value.Decidable) return double.IsFinite(value.Value.X) ? null : RangeFindings.ValueNotDecidable.Code;
        return value.Findings.MaxBy(finding => finding.Severity)?.Code ?? RangeFindings.ValueNotDecidable.Code;
    }

    private static SampleValue? Find(SampleResult sample, Question question) => sample.Find(question.Law, question.Measurand, question.Basis);

    private static Items<CountedReason> Counted(IEnumerable<string> codes) =>
        codes.GroupBy(code => code).Select(same => new CountedReason(same.Key, same.Count())).OrderBy(reason => reason.Code, StringComparer.Ordinal).ToItems();
}
