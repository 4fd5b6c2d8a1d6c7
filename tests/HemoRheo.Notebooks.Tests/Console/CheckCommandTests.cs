using System.Globalization;

namespace HemoRheo.Notebooks.Tests;

/// <summary>Checks of the synthetic cohort: C-4 of 2025-03-31 fails, the instrument is adjusted on 2025-04-04, C-5 passes.</summary>
public sealed class CheckCommandTests(CheckCommandTests.CohortOnDisk cohort) : IClassFixture<CheckCommandTests.CohortOnDisk>
{
    private static CancellationToken Cancel => TestContext.Current.CancellationToken;

    private static int _logs;

    private readonly string log = $"log-{Interlocked.Increment(ref _logs).ToString(CultureInfo.InvariantCulture)}.log";

    [Fact]
    public async Task Record_appends_what_the_log_does_not_hold_in_order_of_time_and_nothing_twice()
    {
        var first = await Run("record", "--by", "A. Miller", "--log", log);
        Assert.Equal((0, ""), (first.Exit, first.Error));
        foreach (var words in new[] { "a new log was begun", "recorded 2: check C-1", "recorded 5: check C-4 of 2025-03-31: +6", "recorded 6: adjusted on 2025-04-04", "recorded 7: check C-5", "last digest", "lab book" }) Assert.Contains(words, first.Output, StringComparison.Ordinal);

        var second = await Run("record", "--by", "A. Miller", "--log", log);
        Assert.Equal(0, second.Exit);
        Assert.Contains("nothing new", second.Output, StringComparison.Ordinal);
        Assert.Equal(7, InstrumentLog.Open(Path.Combine(cohort.Folder, log)).Read().Entries.Count);
    }

    [Fact]
    public async Task Status_gives_the_three_answers_who_must_do_what_and_the_page()
    {
        await Run("record", "--by", "A. Miller", "--log", log);

        var run = await Run("status", "--log", log, "--at", "2025-04-02T12:00+02:00", "--page", "week.html");

        Assert.Equal((0, ""), (run.Exit, run.Error));
        foreach (var words in new[] { "Is it right now? No.", "6.", "It went wrong between 2025-03-24, when it last passed, and 2025-03-31", "28 of 60", "Whoever measures: Stop", "Lab manager:", "last digest of the log", "research use only" }) Assert.Contains(words, run.Output, StringComparison.Ordinal);
        Assert.Contains("Is it right now?", await File.ReadAllTextAsync(Path.Combine(cohort.Folder, "week.html"), Cancel), StringComparison.Ordinal);
        Assert.Equal(1, (await Run("status", "--log", log, "--at", "2025-04-02T12:00+02:00", "--strict")).Exit);
        Assert.Equal(0, (await Run("status", "--at", "2025-03-11T12:00+01:00", "--strict")).Exit);
    }

    [Fact]
    public async Task Status_without_a_log_goes_by_the_study_and_the_present_moment()
    {
        var run = await Run("status");

        Assert.Equal(0, run.Exit);
        Assert.Contains("by the study's own checks", run.Output, StringComparison.Ordinal);
        Assert.Contains("Is it right now? In doubt.", run.Output, StringComparison.Ordinal);
        Assert.Contains("32 of 84", run.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Export_writes_the_log_as_values_and_verify_holds_it_against_a_noted_digest()
    {
        await Run("record", "--by", "A. Miller", "--log", log);
        var digest = InstrumentLog.Open(Path.Combine(cohort.Folder, log)).Verify().LastDigest;

        Assert.Equal(0, (await Run("export", "--log", log, "--to", "all.csv")).Exit);
        Assert.Equal(InstrumentLog.Open(Path.Combine(cohort.Folder, log)).ToCsv(), await File.ReadAllTextAsync(Path.Combine(cohort.Folder, "all.csv"), Cancel));
        var sound = await Run("verify", "--log", log, "--noted", digest, "--strict");
        Assert.Equal(0, sound.Exit);
        Assert.Contains("7 entries, all as written", sound.Output, StringComparison.Ordinal);
        var cut = await Run("verify", "--log", log, "--noted", "abc", "--strict");
        Assert.Equal(1, cut.Exit);
        Assert.Contains("entries were cut off", cut.Output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_check_whose_export_was_changed_since_is_told_and_not_recorded_again()
    {
        await ConsoleRun.Of(cohort.Folder, "synthesize", "changed");
        await ConsoleRun.Of(cohort.Folder, "check", "record", "changed", "--by", "A. Miller");
        var export = Directory.GetFiles(Path.Combine(cohort.Folder, "changed", "checks")).Order(StringComparer.Ordinal).First();
        await File.WriteAllTextAsync(export, (await File.ReadAllTextAsync(export, Cancel)).Replace(",36.9", ",37.0", StringComparison.Ordinal).Replace("300.0,3", "300.0,2", StringComparison.Ordinal), Cancel);

        var run = await ConsoleRun.Of(cohort.Folder, "check", "record", "changed", "--by", "A. Miller");

        Assert.Equal(0, run.Exit);
        Assert.Contains("not recorded: check C-1", run.Output, StringComparison.Ordinal);
        Assert.Equal(7, InstrumentLog.Open(Path.Combine(cohort.Folder, "changed", "checks-of-rheometer-1.log")).Read().Entries.Count);
    }

    [Theory]
    [InlineData("verify", "There is no log")]
    [InlineData("record", "--by")]
    [InlineData("record --by =me", "Say who records")]
    [InlineData("status --instrument other", "declares no instrument \"other\"")]
    [InlineData("status --page week.txt", "does not end with .html")]
    [InlineData("status --at yesterday", "is no moment")]
    [InlineData("status --log nowhere.log", "nowhere.log")]
    [InlineData("export --to study.toml", "does not end with .csv")]
    [InlineData("verify --log study/study.toml", "is not an instrument log")]
    public async Task What_cannot_be_done_exits_with_2_and_a_plain_message(string command, string expected)
    {
        var words = command.Split(' ');

        var run = await Run(words[0], words[1..]);

        Assert.Equal(2, run.Exit);
        Assert.Contains(expected, run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_log_beside_the_study_that_leads_elsewhere_is_refused_unless_it_is_named()
    {
        await ConsoleRun.Of(cohort.Folder, "synthesize", "linked");
        File.CreateSymbolicLink(Path.Combine(cohort.Folder, "linked", "checks-of-rheometer-1.log"), Path.Combine(cohort.Folder, "elsewhere.log"));

        var run = await ConsoleRun.Of(cohort.Folder, "check", "record", "linked", "--by", "A. Miller");

        Assert.Equal(2, run.Exit);
        Assert.Contains("is a link", run.Error, StringComparison.Ordinal);
        Assert.False(File.Exists(Path.Combine(cohort.Folder, "elsewhere.log")));
    }

    [Theory]
    [InlineData("check", "--help")]
    [InlineData("check", "record", "--help")]
    public async Task Help_of_check_tells_its_commands(params string[] words)
    {
        var run = await ConsoleRun.Of(cohort.Folder, words);

        Assert.Equal(0, run.Exit);
        foreach (var word in new[] { "check record <folder> --by <name>", "check status", "check export", "check verify", "--noted", "--page" }) Assert.Contains(word, run.Output, StringComparison.Ordinal);
    }

    private Task<ConsoleRun> Run(string verb, params string[] rest) => ConsoleRun.Of(cohort.Folder, ["check", verb, "study", .. rest]);

    public sealed class CohortOnDisk : IAsyncLifetime
    {
        private readonly TemporaryFolder folder = new();

        public string Folder => folder.Path;

        public async ValueTask InitializeAsync() => await ConsoleRun.Of(Folder, "synthesize", "study");

        public ValueTask DisposeAsync()
        {
            folder.Dispose();
            return ValueTask.CompletedTask;
        }
    }
}
