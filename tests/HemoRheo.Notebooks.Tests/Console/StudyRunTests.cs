namespace HemoRheo.Notebooks.Tests;

/// <summary>Whole runs on a copy of the synthetic cohort.</summary>
public sealed class StudyRunTests(StudyRunTests.CohortOnDisk cohort) : IClassFixture<StudyRunTests.CohortOnDisk>
{
    private static CancellationToken Cancel => TestContext.Current.CancellationToken;

    [Fact]
    public void It_ends_with_where_to_look_and_what_needs_attention()
    {
        Assert.Equal("", cohort.First.Error);
        Assert.Equal(0, cohort.First.Exit);
        foreach (var words in new[] { "1 failed (C-4 of 2025-03-31)", "16 in doubt", "16 measured after a failed check", "file-cut", "what to do: Export or copy the file again.", "too-long-since-draw", "first run here", "Start page: " + cohort.Results("index.html"), "research use only" })
        {
            Assert.Contains(words, cohort.First.Output, StringComparison.Ordinal);
        }
        Assert.True(File.Exists(cohort.Results("index.html")));
    }

    [Fact]
    public async Task Run_again_it_says_identical_and_leaves_nothing_beside_the_results()
    {
        var run = await ConsoleRun.Of(cohort.Folder, "study");

        Assert.Equal(0, run.Exit);
        Assert.Contains("identical to the previous run", run.Output, StringComparison.Ordinal);
        Assert.DoesNotContain(Directory.GetDirectories(Path.Combine(cohort.Folder, "study")), path => Path.GetFileName(path).StartsWith("results.", StringComparison.Ordinal));
    }

    [Fact]
    public async Task Strict_it_exits_with_1_because_a_check_failed_and_a_file_was_cut()
    {
        var run = await ConsoleRun.Of(cohort.Folder, "study", "--strict", "--output", "strict-results");

        Assert.Equal(1, run.Exit);
        Assert.True(File.Exists(Path.Combine(cohort.Folder, "strict-results", "run.json")));
    }

    [Fact]
    public async Task A_changed_input_is_named_as_the_nearest_cause()
    {
        await ConsoleRun.Of(cohort.Folder, "synthesize", "changed");
        await ConsoleRun.Of(cohort.Folder, "changed");
        var samples = Path.Combine(cohort.Folder, "changed", "samples.csv");
        var lines = await File.ReadAllLinesAsync(samples, Cancel);
        var fields = lines[1].Split(',');
        fields[4] = "0.470";
        lines[1] = string.Join(',', fields);
        await File.WriteAllTextAsync(samples, string.Join('\n', lines) + "\n", Cancel);

        var run = await ConsoleRun.Of(cohort.Folder, "changed");

        Assert.Equal(0, run.Exit);
        Assert.Contains("samples.csv changed", run.Output, StringComparison.Ordinal);
        Assert.Matches("results changed; nearest cause: .*samples.csv", run.Output);
    }

    [Fact]
    public async Task Stopped_by_the_user_it_exits_with_2_and_the_previous_results_stay()
    {
        var before = await File.ReadAllTextAsync(cohort.Results("run.json"), Cancel);

        var run = await ConsoleRun.Of(cohort.Folder, new StopOn("loadings of"), "study");

        Assert.Equal(2, run.Exit);
        Assert.Contains("Stopped", run.Error, StringComparison.Ordinal);
        Assert.Equal(before, await File.ReadAllTextAsync(cohort.Results("run.json"), Cancel));
    }

    [Fact]
    public async Task Results_are_never_read_as_exports()
    {
        await ConsoleRun.Of(cohort.Folder, "study");

        var readings = Study.Open(Path.Combine(cohort.Folder, "study", "study.toml")).ReadExports();

        Assert.DoesNotContain(readings.Files, file => file.Path.StartsWith("results", StringComparison.Ordinal));
    }

    [Fact]
    public async Task A_record_that_was_changed_by_hand_is_not_compared_with_and_does_not_stop_the_run()
    {
        Directory.CreateDirectory(Path.Combine(cohort.Folder, "by-hand"));
        await File.WriteAllTextAsync(Path.Combine(cohort.Folder, "by-hand", "run.json"), "{ \"mine\": true }", Cancel);

        var run = await ConsoleRun.Of(cohort.Folder, "study", "--output", "by-hand");

        Assert.Equal(0, run.Exit);
        Assert.Contains("not compared", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Without_any_check_it_says_that_there_is_none()
    {
        await ConsoleRun.Of(cohort.Folder, "synthesize", "unchecked");
        Directory.Delete(Path.Combine(cohort.Folder, "unchecked", "checks"), recursive: true);
        Directory.CreateDirectory(Path.Combine(cohort.Folder, "unchecked", "checks"));

        var run = await ConsoleRun.Of(cohort.Folder, "unchecked");

        Assert.Contains("instrument rheometer-1: no check, so nothing vouches for it", run.Output, StringComparison.Ordinal);
        Assert.Contains("84 that no check vouches for: there is no check", run.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("before any check", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Without_faults_strict_exits_with_0()
    {
        var folder = Path.Combine(cohort.Folder, "clean");
        await ConsoleRun.Of(cohort.Folder, "synthesize", "clean");
        foreach (var file in Directory.GetFiles(Path.Combine(folder, "checks")).Order(StringComparer.Ordinal).Skip(3)) File.Delete(file);
        foreach (var file in Directory.GetFiles(Path.Combine(folder, "exports")).Where(AfterTheSecondWeek)) File.Delete(file);
        foreach (var faulty in new[] { "exports/rows-2025-03-12.csv", "exports/blocks-2025-03-18-S-0023.txt" }) File.Delete(Path.Combine(folder, faulty));

        var run = await ConsoleRun.Of(cohort.Folder, "clean", "--strict");

        Assert.DoesNotContain("FAULT", run.Output, StringComparison.Ordinal);
        Assert.Equal(0, run.Exit);
    }

    private static bool AfterTheSecondWeek(string file) =>
        string.CompareOrdinal(Path.GetFileName(file).Split('-', 2)[1], "2025-03-22") > 0;

    public sealed class CohortOnDisk : IAsyncLifetime
    {
        private readonly TemporaryFolder folder = new();

        public string Folder => folder.Path;

        internal ConsoleRun First { get; private set; } = new(-1, "", "not run");

        public string Results(string file) => folder["study", "results", file];

        public async ValueTask InitializeAsync()
        {
            await ConsoleRun.Of(folder.Path, "synthesize", "study");
            First = await ConsoleRun.Of(folder.Path, "study");
        }

        public ValueTask DisposeAsync()
        {
            folder.Dispose();
            return ValueTask.CompletedTask;
        }
    }
}
