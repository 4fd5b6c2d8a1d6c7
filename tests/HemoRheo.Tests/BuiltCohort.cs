namespace HemoRheo.Tests;

/// <summary>An analyzed study built by hand, without readings: change what a test is about with <c>with</c>.</summary>
internal static class BuiltCohort
{
    internal static ViscosityAtRate At10 { get; } = new(new ShearRate(10));

    internal static Study Study { get; } = TestStudy.Plain with { Reference = new(true, []) };

    internal static Contribution Calibration(double amount, string period = "R1/1") => new(new(SourceKind.Calibration, period), amount, "checks " + period, 4);

    internal static Contribution Fit(double amount, string sample) => new(new(SourceKind.Fit, sample), amount);

    /// <summary>A native value of the deciding law at 10 1/s.</summary>
    internal static SampleValue Value(double x, params Contribution[] parts) =>
        new(At10, "Casson", HematocritBasis.Native, new(x, parts.ToItems()), null, true, []);

    internal static SampleResult Sample(string sample, string person, params SampleValue[] values) =>
        new(sample, TestStudy.Sample(sample) with { Person = person }, [], values.ToItems(), InstrumentStatus.InOrder, []);

    internal static SampleResult WithHematocrit(this SampleResult sample, double? literPerLiter, string? counter = "counter") =>
        sample with { Record = sample.Record! with { Hematocrit = literPerLiter is { } h ? new(h) : null, Counter = counter } };

    internal static Person Person(string id, string group) => new(id, group, new("people.csv"));

    internal static AnalyzedStudy Analyzed(Study study, IEnumerable<SampleResult> samples, IEnumerable<Person> people) =>
        new(study, TestStudy.Readings(study) with { People = people.ToItems() }, [], new([], [], [], CorrelationPool.Of([], null), new([], ""), [], []), samples.ToItems());

    /// <summary>Controls c1, c2, ... with one sample each, S-c1, S-c2, ..., whose values are these.</summary>
    internal static AnalyzedStudy Controls(params IEnumerable<double> logs)
    {
        var samples = logs.Select((x, i) => Sample($"S-c{i + 1}", $"c{i + 1}", Value(x, Calibration(-0.01), Fit(0.02, $"S-c{i + 1}")))).ToArray();
        return Analyzed(Study, samples, samples.Select(sample => Person(sample.Record!.Person, "c")));
    }

    internal static AnalyzedStudy With(this AnalyzedStudy analyzed, SampleResult sample, string group = "p") => analyzed with
    {
        Samples = analyzed.Samples.With([sample]),
        Readings = analyzed.Readings with { People = analyzed.Readings.People.With([Person(sample.Record!.Person, group)]) },
    };

    internal static StudyResult Judged(this AnalyzedStudy analyzed) => analyzed.Judge(null, TestContext.Current.CancellationToken);

    /// <summary>This many logs of viscosities, evenly spread over a normal distribution about ln(6 mPa.s) with standard deviation 0.1.</summary>
    internal static IEnumerable<double> Spread(int count) =>
        Enumerable.Range(0, count).Select(i => -5.1 + 0.1 * MathNet.Numerics.Distributions.Normal.InvCDF(0, 1, (i + 0.5) / count));
}
