namespace HemoRheo.Notebooks;

/// <summary>What one writing of the pages is made of, and the look-ups its pages share.</summary>
internal sealed class Edition
{
    private readonly Dictionary<string, string> _groups;

    public Edition(StudyResult results, CohortSummary? summary, RunRecord record, RunComparison? comparison)
    {
        Results = results;
        Summary = summary;
        Record = record;
        Comparison = comparison;
        SamplePages = new(results.Samples.Select(sample => sample.Sample));
        InstrumentPages = new(results.Analyzed.Histories.SelectMany(history => new[] { history.Instrument.Name, Week(history.Instrument.Name) }));
        var labels = Study.Groups.ToDictionary(group => group.Code, group => group.Label);
        _groups = results.Analyzed.Readings.People.DistinctBy(person => person.Id).ToDictionary(person => person.Id, person => labels.GetValueOrDefault(person.GroupCode, person.GroupCode));
        Rates = Study.Analysis.StandardRates.Select(rate => new ViscosityAtRate(rate)).ToItems();
    }

    public StudyResult Results { get; }

    public CohortSummary? Summary { get; }

    public RunRecord Record { get; }

    public RunComparison? Comparison { get; }

    public PageNames SamplePages { get; }

    public PageNames InstrumentPages { get; }

    /// <summary>The key of an instrument's weekly page among the instruments' pages: no name of an instrument holds a line feed.</summary>
    public static string Week(string instrument) => $"{instrument}\nweek";

    public Study Study => Results.Study;

    /// <summary>The law that decides.</summary>
    public string Law => Study.Analysis.DecideBy;

    /// <summary>The basis of the standardised values that are decided on.</summary>
    public HematocritBasis Basis => Study.Standard.DecideBy.Basis();

    /// <summary>Viscosities at the study's standard rates, in its order.</summary>
    public Items<ViscosityAtRate> Rates { get; }

    /// <summary>Label of the group a sample's person belongs to; empty where none is known.</summary>
    public string GroupOf(JudgedSample sample) => sample.Result.Record is { } record ? _groups.GetValueOrDefault(record.Person, "") : "";

    /// <summary>The value of the deciding law; null where there is none.</summary>
    public JudgedValue? Find(JudgedSample sample, Measurand measurand, HematocritBasis basis) =>
        sample.Values.FirstOrDefault(value => value.Value.Law == Law && value.Value.Basis == basis && value.Value.Measurand == measurand);

    /// <summary>Values of the deciding law at the standard rates, at the standard hematocrit first, then native.</summary>
    public Items<JudgedValue> Deciding(JudgedSample sample) =>
        new[] { Basis, HematocritBasis.Native }.SelectMany(basis => Rates.Select(rate => Find(sample, rate, basis))).OfType<JudgedValue>().ToItems();

    /// <summary>Whether a sample has no value at the standard hematocrit that may be decided on.</summary>
    public bool IsSetAside(JudgedSample sample) => Rates.All(rate => Find(sample, rate, Basis) is not { Value.Decidable: true });

    /// <summary>Findings that keep a sample's values from being decided on.</summary>
    public IEnumerable<Finding> Reasons(JudgedSample sample) =>
        Deciding(sample).SelectMany(value => value.Value.Findings).Concat(sample.Result.Values.Count == 0 ? sample.Result.Findings : []).OrderByDescending(finding => finding.Severity).Distinct();

    /// <summary>A link to a sample's page from a folder.</summary>
    /// <param name="sample">Pseudonym.</param>
    /// <param name="up">How the folder of all pages is reached: empty, or <c>../</c>.</param>
    public Markup SampleLink(string sample, string up = "") =>
        SamplePages.Find(sample) is { } file ? Markup.Of($"<a href=\"{up}samples/{file}\">{sample}</a>") : Markup.Of($"{sample}");

    /// <summary>A link to an instrument's page.</summary>
    public Markup InstrumentLink(string instrument, string up = "") =>
        InstrumentPages.Find(instrument) is { } file ? Markup.Of($"<a href=\"{up}instruments/{file}\">{instrument}</a>") : Markup.Of($"{instrument}");
}
