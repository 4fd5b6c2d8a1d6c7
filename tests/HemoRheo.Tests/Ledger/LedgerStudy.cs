namespace HemoRheo.Tests.Ledger;

/// <summary>A study built by hand whose samples come from files.</summary>
internal static class LedgerStudy
{
    internal static AnalyzedStudy Analyzed { get; } = Build();

    internal static RunRecord Record(AnalyzedStudy analyzed)
    {
        var result = analyzed.Judged();
        return RunRecord.Of(result, result.Study.Summarize(result).By("group"));
    }

    /// <summary>The study with another digest for one file, and with the samples that this changes.</summary>
    internal static AnalyzedStudy WithFile(this AnalyzedStudy analyzed, string path, Func<SampleResult, SampleResult> change) => analyzed with
    {
        Readings = analyzed.Readings with { Files = analyzed.Readings.Files.Select(file => file.Path == path ? file with { Digest = "changed" } : file).ToItems() },
        Samples = analyzed.Samples.Select(change).ToItems(),
    };

    /// <summary>The sample with its value moved.</summary>
    internal static SampleResult Moved(this SampleResult sample, double by) => sample with
    {
        Values = sample.Values.Select(value => value with { Value = value.Value with { X = value.Value.X + by } }).ToItems(),
    };

    private static AnalyzedStudy Build()
    {
        var plain = BuiltCohort.Controls(BuiltCohort.Spread(20))
            .With(BuiltCohort.Sample("S-p1", "p1", BuiltCohort.Value(-4.4, BuiltCohort.Calibration(-0.01))))
            .With(BuiltCohort.Sample("S-p2", "p2", BuiltCohort.Value(-4.6, BuiltCohort.Calibration(-0.01))));
        var samples = plain.Samples.Select(sample => sample with { Loadings = [Loading(sample.Sample)] }).ToItems();
        ExportFile[] files = [.. samples.Select(sample => new ExportFile(Path(sample.Sample), $"digest of {sample.Sample}", "rows", 1, 12, [])), File("people.csv"), File("samples.csv"), File("checks/week-1.csv")];
        return plain with { Samples = samples, Readings = plain.Readings with { Files = files.ToItems() } };
    }

    internal static string Path(string sample) => $"exports/{sample}.csv";

    private static ExportFile File(string path) => new(path, $"digest of {path}", null, 0, 0, []);

    private static LoadingResult Loading(string sample)
    {
        var recording = TestStudy.Blood(sample, []) with { Where = new(Path(sample), Line: 1) };
        return new(recording, FlowCurve.Of([1, 10], [0.01, 0.05]), null, [], new(InstrumentStatus.InOrder, "invented", null, []), []);
    }
}
