namespace HemoRheo.Tests.Ledger;

/// <summary>The synthetic cohort analyzed twice: the same inputs give the same record, and a moved reading leads back to its file.</summary>
public sealed class AnalyzedLedgerTests
{
    private static readonly Study Study = Study.Open(Path.Combine(Repository.Root, "synthetic-cohort", "study.toml"));

    [Fact]
    public void The_same_files_analyzed_again_are_identical_and_a_moved_reading_leads_back_to_its_file()
    {
        var readings = Study.ReadExports();
        var earlier = Record(readings);
        Assert.True(Record(Study.ReadExports()).ComparedWith(RunRecord.FromJson(earlier.ToJson())).Identical);

        var moved = readings.Blood[0];
        var path = moved.Where.File!;
        var changed = readings with
        {
            Blood = readings.Blood.Select(recording => ReferenceEquals(recording, moved) ? Thicker(recording) : recording).ToItems(),
            Files = readings.Files.Select(file => file.Path == path ? file with { Digest = "changed" } : file).ToItems(),
        };
        var changes = Record(changed).ComparedWith(earlier).Changes;
        Assert.Equal(("input", path), (changes[0].What, changes[0].Name));
        var own = changes.Where(change => change.Name.StartsWith($"{moved.Sample}/", StringComparison.Ordinal)).ToArray();
        Assert.NotEmpty(own);
        Assert.All(own, change => Assert.Equal($"input {path}", change.NearestCause));
        Assert.All(changes.Where(change => change.What == "result"), change => Assert.StartsWith($"input {path}", change.NearestCause, StringComparison.Ordinal));
    }

    private static RunRecord Record(StudyReadings readings)
    {
        var results = Study.Analyze(readings, null, TestContext.Current.CancellationToken);
        return RunRecord.Of(results, Study.Summarize(results).By("group"));
    }

    private static Recording Thicker(Recording recording) => recording with
    {
        Readings = recording.Readings.Select(reading => reading with { Torque = 1.01 * reading.Torque, Stress = 1.01 * reading.Stress }).ToItems(),
    };
}
