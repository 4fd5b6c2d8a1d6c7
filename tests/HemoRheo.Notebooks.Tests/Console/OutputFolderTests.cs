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
        Assert.Equal(["run.json", "written-files.txt"], Directory.GetFileSystemEntries(Results).Select(Path.GetFileName).Order(StringComparer.Ordinal));
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
    [InlineData("thesis.txt")]
    [InlineData("tables/my-own.csv")]
    public void A_file_of_somebody_else_in_finished_results_is_named_and_kept(string name)
    {
        Open().Replace(Writes("first"));
        var file = Path.Combine(Results, name);
        Directory.CreateDirectory(Path.GetDirectoryName(file)!);
        File.WriteAllText(file, "years of work");

        var refusal = Assert.Throws<CouldNotRunException>(Open);

        Assert.Contains($"\"{name}\"", refusal.Message, StringComparison.Ordinal);
        Assert.Contains("Move it elsewhere", refusal.Message, StringComparison.Ordinal);
        Assert.Equal("years of work", File.ReadAllText(file));
    }

    [Fact]
    public void A_file_that_comes_while_a_run_writes_is_kept_too()
    {
        Open().Replace(Writes("first"));
        var file = Path.Combine(Results, "thesis.txt");

        Assert.Throws<CouldNotRunException>(() => Open().Replace(fresh =>
        {
            Writes("second")(fresh);
            File.WriteAllText(file, "years of work");
        }));

        Assert.Equal("years of work", File.ReadAllText(file));
        Assert.Equal("first", File.ReadAllText(Path.Combine(Results, "run.json")));
        Assert.Equal([Results], Directory.GetFileSystemEntries(folder["study"]));
    }

    [Fact]
    public void What_a_killed_run_left_goes_with_the_next_good_one_and_what_is_not_ours_stays()
    {
        Directory.CreateDirectory(Results + ".tmp-1");
        File.WriteAllText(Path.Combine(Results + ".tmp-1", "thesis.txt"), "years of work");
        Directory.CreateDirectory(Results + ".tmp-2");
        File.WriteAllText(Path.Combine(Results + ".tmp-2", "written-files.txt"), "");
        File.WriteAllText(Path.Combine(Results + ".tmp-2", "index.html"), "half");

        Open().Replace(Writes("first"));

        Assert.Equal([Results, Results + ".tmp-1"], Directory.GetFileSystemEntries(folder["study"]).Order(StringComparer.Ordinal));
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
