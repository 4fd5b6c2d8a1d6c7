namespace HemoRheo.Notebooks.Tests;

public sealed class CommandLineTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Fact]
    public async Task New_writes_the_commented_study_file_and_never_over_one()
    {
        var first = await ConsoleRun.Of(folder.Path, "new", "my-study");
        Assert.Equal(0, first.Exit);
        foreach (var words in new[] { "exports and checks", "samples.csv", "people.csv", "hemorheo my-study" }) Assert.Contains(words, first.Output, StringComparison.Ordinal);
        Assert.Equal(Study.Template(), await File.ReadAllTextAsync(folder["my-study", "study.toml"], TestContext.Current.CancellationToken));

        await File.WriteAllTextAsync(folder["my-study", "study.toml"], "mine", TestContext.Current.CancellationToken);
        var second = await ConsoleRun.Of(folder.Path, "new", "my-study");
        Assert.Equal(2, second.Exit);
        Assert.Contains("already", second.Error, StringComparison.Ordinal);
        Assert.Equal("mine", await File.ReadAllTextAsync(folder["my-study", "study.toml"], TestContext.Current.CancellationToken));
    }

    [Theory]
    [InlineData("--help")]
    [InlineData("-h")]
    public async Task Help_tells_the_commands_and_the_exit_codes(string option)
    {
        var run = await ConsoleRun.Of(folder.Path, option);

        Assert.Equal(0, run.Exit);
        foreach (var word in new[] { "hemorheo new <folder>", "hemorheo synthesize <folder>", "hemorheo check status <folder>", "--strict", "--output", "research use only", "0   done", "1   only with --strict", "2   could not run" })
        {
            Assert.Contains(word, run.Output, StringComparison.Ordinal);
        }
    }

    [Theory]
    [InlineData("new", "Never writes over one")]
    [InlineData("synthesize", "--seed")]
    public async Task Help_of_a_command_tells_that_command(string command, string expected)
    {
        var run = await ConsoleRun.Of(folder.Path, command, "--help");

        Assert.Equal(0, run.Exit);
        Assert.Contains(expected, run.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("--strickt", "There is no option \"--strickt\"")]
    [InlineData("nowhere", "There is no folder")]
    [InlineData("synthesize", "folder")]
    [InlineData("@list", "There is no folder")]
    public async Task What_cannot_be_run_exits_with_2_and_a_plain_message(string arg, string expected)
    {
        var run = await ConsoleRun.Of(folder.Path, arg);

        Assert.Equal(2, run.Exit);
        Assert.Contains(expected, run.Error, StringComparison.Ordinal);
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Without_a_folder_and_without_a_synthetic_cohort_above_it_says_what_to_give()
    {
        var run = await ConsoleRun.Of(folder.Path);

        Assert.Equal(2, run.Exit);
        Assert.Contains("Give the folder of a study", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_folder_without_a_study_file_is_told_how_to_get_one()
    {
        Directory.CreateDirectory(folder["data"]);

        var run = await ConsoleRun.Of(folder.Path, "data");

        Assert.Equal(2, run.Exit);
        Assert.Contains("hemorheo new", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_study_file_with_a_misspelled_key_is_named_by_line_with_the_nearest_key()
    {
        await ConsoleRun.Of(folder.Path, "synthesize", "study");
        var file = folder["study", "study.toml"];
        var text = await File.ReadAllTextAsync(file, TestContext.Current.CancellationToken);
        await File.WriteAllTextAsync(file, text.Replace("torque_floor", "torqe_floor", StringComparison.Ordinal), TestContext.Current.CancellationToken);
        var line = text[..text.IndexOf("torque_floor", StringComparison.Ordinal)].Count(letter => letter == '\n') + 1;

        var run = await ConsoleRun.Of(folder.Path, "study");

        Assert.Equal(2, run.Exit);
        Assert.Contains($"study.toml:{line}:1", run.Error, StringComparison.Ordinal);
        Assert.Contains("torque_floor", run.Error, StringComparison.Ordinal);
        Assert.False(Directory.Exists(folder["study", "results"]));
    }

    [Fact]
    public async Task Text_of_a_file_cannot_steer_the_terminal()
    {
        Directory.CreateDirectory(folder["study"]);
        await File.WriteAllTextAsync(folder["study", "study.toml"], "na\u001b[2Jme = 1\n", TestContext.Current.CancellationToken);

        var run = await ConsoleRun.Of(folder.Path, "study");

        Assert.Equal(2, run.Exit);
        Assert.DoesNotContain('\u001b', run.Error);
    }

    [Fact]
    public async Task Synthesize_repeats_itself_and_does_not_write_over_what_differs_unless_asked()
    {
        Assert.Equal(0, (await ConsoleRun.Of(folder.Path, "synthesize", "cohort")).Exit);
        Assert.Equal(0, (await ConsoleRun.Of(folder.Path, "synthesize", "cohort")).Exit);
        await File.WriteAllTextAsync(folder["cohort", "people.csv"], "mine", TestContext.Current.CancellationToken);

        var refused = await ConsoleRun.Of(folder.Path, "synthesize", "cohort");
        Assert.Equal(2, refused.Exit);
        Assert.Contains("people.csv", refused.Error, StringComparison.Ordinal);
        Assert.Equal("mine", await File.ReadAllTextAsync(folder["cohort", "people.csv"], TestContext.Current.CancellationToken));

        Assert.Equal(0, (await ConsoleRun.Of(folder.Path, "synthesize", "cohort", "--replace")).Exit);
        Assert.StartsWith("person,group\n", await File.ReadAllTextAsync(folder["cohort", "people.csv"], TestContext.Current.CancellationToken), StringComparison.Ordinal);
    }
}
