namespace HemoRheo.Notebooks;

/// <summary>Everything of one sample: its curve, values, verdicts, budget, findings, and where each number comes from.</summary>
internal static class SamplePage
{
    private const string Up = "../";

    /// <summary>The page.</summary>
    /// <param name="edition">What is written.</param>
    /// <param name="place">The sample's place in the study, from 0.</param>
    public static string Write(Edition edition, int place)
    {
        var sample = edition.Results.Samples[place];
        return Page.Write($"Sample {sample.Sample}", Trail(edition, place), edition.Study.Name, Markup.Of($"""
            {Lead(edition, sample)}
            {SampleVerdicts.Write(edition, sample)}
            {SampleCurve.Write(edition, sample)}
            {SampleValues.Write(edition, sample)}
            {SampleBudget.Write(edition, sample)}
            {Page.Section("findings", "Findings", Marks.Findings($"Findings about sample {sample.Sample}", All(sample)))}
            {SampleLineage.Write(edition, sample)}
            """));
    }

    /// <summary>Findings about a sample, those of its values included.</summary>
    public static IEnumerable<Finding> All(JudgedSample sample) => sample.Result.Findings.Concat(sample.Values.SelectMany(value => value.Value.Findings)).Distinct();

    private static Markup Lead(Edition edition, JudgedSample sample)
    {
        var record = sample.Result.Record;
        var standing = sample.Result.Loadings.Select(loading => loading.Standing).Where(standing => standing.Status == sample.Result.Status).FirstOrDefault();
        return Markup.Of($"""
            <dl>
            <dt>Person, visit</dt><dd>{(record is null ? Markup.Of($"not in the samples table") : Markup.Of($"{record.Person}, visit {record.Visit}"))}{(edition.GroupOf(sample) is { Length: > 0 } group ? $", {group}" : "")}</dd>
            <dt>Drawn, measured</dt><dd>{(record?.DrawnAt is { } drawn ? Figures.Moment(drawn) : "draw time unknown")}; {string.Join(", ", sample.Result.Loadings.Select(loading => $"loading {loading.Recording.Loading} at {Figures.Moment(loading.Recording.StartedAt)}"))}</dd>
            <dt>Hematocrit</dt><dd>{(record?.Hematocrit is { } hematocrit ? $"{Figures.Fixed(hematocrit.LiterPerLiter, 3)} L/L{Counter(edition, record)}" : "not known")}</dd>
            <dt>Plasma viscosity</dt><dd>{(record?.PlasmaViscosity is { } plasma ? $"{Rounding.Digits(plasma.MillipascalSeconds, 4)} mPa·s{(record.PlasmaTemperature is { } at ? $" at {Rounding.Digits(at.DegreesCelsius, 4)} °C" : "")}, by {record.PlasmaInstrument ?? "an unnamed device"}" : "not known")}</dd>
            <dt>Instrument</dt><dd>{Instruments(edition, sample)}: {Marks.Status(sample.Result.Status)}. {standing?.Reason}</dd>
            </dl>
            """);
    }

    private static string Counter(Edition edition, SampleRecord record) =>
        edition.Study.Counters.FirstOrDefault(counter => counter.Name == record.Counter) is { } counter
            ? $", by {counter.Name} (standard uncertainty {Rounding.Digits(counter.Uncertainty, 2)} of its own, {Rounding.Digits(counter.SharedUncertainty, 2)} shared)"
            : "";

    private static Markup Instruments(Edition edition, JudgedSample sample) =>
        new(string.Join(", ", sample.Result.Loadings.Select(loading => loading.Recording.Instrument).Distinct().Select(name => edition.InstrumentLink(name, Up).Text)));

    private static Markup Trail(Edition edition, int place)
    {
        var samples = edition.Results.Samples;
        return Markup.Of($"""
            <ul><li><a href="../index.html">Cohort overview</a></li>{(place > 0 ? Markup.Of($"<li>before: {edition.SampleLink(samples[place - 1].Sample, Up)}</li>") : Markup.None)}{(place < samples.Count - 1 ? Markup.Of($"<li>after: {edition.SampleLink(samples[place + 1].Sample, Up)}</li>") : Markup.None)}<li><a href="#verdicts">Verdicts</a></li><li><a href="#curve">Flow curve</a></li><li><a href="#values">Values</a></li><li><a href="#budget">Uncertainty</a></li><li><a href="#findings">Findings</a></li><li><a href="#lineage">Lineage</a></li></ul>
            """);
    }
}
