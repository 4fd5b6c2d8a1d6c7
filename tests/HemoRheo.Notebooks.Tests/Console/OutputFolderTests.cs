using HemoRheo.App;

namespace HemoRheo.Notebooks.Tests;

public sealed class OutputFolderTests : IDisposable
{
    private readonly TemporaryFolder folder = new();

    private string Results => folder["study", "results"];

    public OutputFolderTests() => Directory.CreateDirectory(folder["study"]);

    public void Dispose() => folder.Dispose();

    [Fact]
    public void The_first_run_makes_the_folder_and_leaves_nothing_else_beside_it()
    {
        Open().Replace(Writes("first"));

        Assert.Equal("first", File.ReadAllText(Path.Combine(Results, "run.json")));
        Assert.Equal([Results], Directory.GetFileSystemEntries(folder["study"]));
    }

    [Fact]
    public void The_next_run_replaces_it_whole()
    {
        Open().Replace(fresh =>
        {
            Writes("first")(fresh);
            File.WriteAllText(Path.Combine(fresh, "page-of-a-sample-that-is-gone.html"), "old");
        });
        Open().Replace(Writes("second"));

        Assert.Equal("second", Open().PreviousRecord());
        Assert.Equal(["run.json"], Directory.GetFileSystemEntries(Results).Select(Path.GetFileName));
        Assert.Equal([Results], Directory.GetFileSystemEntries(folder["study"]));
    }

    [Fact]
    public void A_run_that_breaks_while_writing_leaves_the_previous_results_whole()
    {
        Open().Replace(Writes("first"));

        Assert.Throws<IOException>(() => Open().Replace(fresh =>
        {
            Writes("half")(fresh);
            throw new IOException("disk full");
        }));

        Assert.Equal("first", Open().PreviousRecord());
        Assert.Equal([Results], Directory.GetFileSystemEntries(folder["study"]));
    }

    [Fact]
    public void A_cancelled_run_leaves_the_previous_results_whole()
    {
        Open().Replace(Writes("first"));

        Assert.Throws<OperationCanceledException>(() => Open().Replace(_ => throw new OperationCanceledException()));

        Assert.Equal("first", Open().PreviousRecord());
    }

    [Fact]
    public void A_swap_that_fails_in_the_middle_puts_the_previous_results_back()
    {
        Open().Replace(Writes("first"));
        var moves = 0;
        var failing = new OutputFolder(Results, folder["study"], (from, to) =>
        {
            if (++moves == 2) throw new IOException("cannot rename");
            Directory.Move(from, to);
        });

        Assert.Throws<IOException>(() => failing.Replace(Writes("second")));

        Assert.Equal("first", File.ReadAllText(Path.Combine(Results, "run.json")));
        Assert.Equal([Results], Directory.GetFileSystemEntries(folder["study"]));
    }

    [Fact]
    public void What_a_swap_left_when_the_machine_stopped_between_its_two_renames_is_put_back()
    {
        Open().Replace(Writes("first"));
        Directory.Move(Results, Results + ".old-1");

        Assert.Equal("first", Open().PreviousRecord());
        Assert.Equal([Results], Directory.GetFileSystemEntries(folder["study"]));
    }

    [Fact]
    public void A_folder_with_files_of_somebody_else_is_never_replaced()
    {
        Directory.CreateDirectory(Results);
        File.WriteAllText(Path.Combine(Results, "thesis.txt"), "years of work");

        var refusal = Assert.Throws<CouldNotRunException>(Open);

        Assert.Contains("holds other files", refusal.Message, StringComparison.Ordinal);
        Assert.Equal("years of work", File.ReadAllText(Path.Combine(Results, "thesis.txt")));
    }

    [Theory]
    [InlineData("study")]
    [InlineData("")]
    public void A_folder_that_holds_the_study_is_refused_even_when_a_run_record_lies_there(string name)
    {
        File.WriteAllText(Path.Combine(folder[name], "run.json"), "{}");

        Assert.Throws<CouldNotRunException>(() => new OutputFolder(folder[name], folder["study"]));
    }

    private OutputFolder Open() => new(Results, folder["study"]);

    private static Action<string> Writes(string record) => fresh => File.WriteAllText(Path.Combine(fresh, "run.json"), record);
}
