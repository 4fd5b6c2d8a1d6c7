using System.Text.RegularExpressions;

namespace HemoRheo.Notebooks.Tests;

[Collection(OneKernelAtATime.Name)]
public sealed partial class VerdictNotebookTests(VerdictNotebook notebook) : IClassFixture<VerdictNotebook>
{
    private const int Charts = 7;

    private static bool Saving => Environment.GetEnvironmentVariable("HEMORHEO_SAVE_NOTEBOOKS") == "1";

    [Fact]
    public void Every_cell_runs() => Assert.Empty(notebook.Executed.Errors);

    [Fact]
    public void Every_chart_has_its_figure_and_a_still_picture()
    {
        Assert.Equal(Charts, NewPlot().Count(notebook.Executed.AllHtml));
        Assert.Equal(Charts, StillPicture().Count(notebook.Executed.AllHtml));
    }

    [Fact]
    public void Every_chart_is_drawn_in_a_browser_without_a_network()
    {
        Assert.Equal(Charts, Figure().Count(notebook.Drawn));
        Assert.DoesNotMatch(StillPicture(), notebook.Drawn);
    }

    [Fact]
    public void No_output_refers_to_the_network() => Assert.DoesNotMatch(RemoteReference(), notebook.Executed.AllHtml);

    [Fact]
    public void A_sample_has_its_verdicts_with_three_probabilities_and_the_caution()
    {
        var html = Showing("results[\"S-0070\"]", "text/html");

        Assert.Contains(">p below</th>", html, StringComparison.Ordinal);
        Assert.Contains(">p within</th>", html, StringComparison.Ordinal);
        Assert.Contains(">p above</th>", html, StringComparison.Ordinal);
        Assert.Matches(VerdictRow(), html);
        Assert.Contains("For research use only.", html, StringComparison.Ordinal);
    }

    [Fact]
    public void The_progress_bar_is_gone_when_the_analysis_ends()
    {
        var html = Showing("study.Analyze", "text/html");

        Assert.DoesNotContain("<progress", html, StringComparison.Ordinal);
        Assert.Contains(">undecided</th>", html, StringComparison.Ordinal);
    }

    [Fact]
    public void A_file_that_could_not_be_read_whole_is_named_where_it_was_cut() =>
        Assert.Matches(CutFile(), Showing("study.ReadExports", "text/html"));

    [Fact]
    public void The_notebook_of_the_repository_shows_what_the_library_says()
    {
        var today = SavedNotebook.Of(notebook.Executed, VerdictNotebook.Source);
        if (Saving) File.WriteAllText(VerdictNotebook.Source, today);
        var kept = new ExecutedNotebook(VerdictNotebook.Source);

        for (var cell = 1; cell < kept.Cells.Count; cell++)
        {
            Assert.True(
                Tables(notebook.Executed, cell) == Tables(kept, cell),
                $"Code cell {cell + 1} shows other tables than the notebook in the repository. If that is right, run the tests once with HEMORHEO_SAVE_NOTEBOOKS=1 and look at the difference.");
        }
    }

    [Fact]
    public void The_notebook_of_the_repository_has_outputs_and_no_trace_of_a_machine()
    {
        var text = File.ReadAllText(VerdictNotebook.Source);
        var kept = new ExecutedNotebook(VerdictNotebook.Source);

        Assert.DoesNotMatch(MachineTrace(), text);
        Assert.Equal(Charts, StillPicture().Count(kept.AllHtml));
        Assert.InRange(text.Length, 1, 5_000_000);
    }

    private static string Tables(ExecutedNotebook notebook, int cell) => string.Concat(Table().Matches(notebook.Shown(cell, "text/html")).Select(table => table.Value));

    private string Showing(string code, string form)
    {
        var cell = notebook.Executed.Cells.TakeWhile(cell => !ExecutedNotebook.Text(cell["source"]).Contains(code, StringComparison.Ordinal)).Count();
        return notebook.Executed.Shown(cell, form);
    }

    [GeneratedRegex("Plotly\\.newPlot\\(")]
    private static partial Regex NewPlot();

    [GeneratedRegex("<img [^>]*src=\"data:image/svg\\+xml;base64,")]
    private static partial Regex StillPicture();

    [GeneratedRegex("class=\"js-plotly-plot\"")]
    private static partial Regex Figure();

    [GeneratedRegex("<table>.*?</table>", RegexOptions.Singleline)]
    private static partial Regex Table();

    [GeneratedRegex(">(below|within|above|undecided)</td><td[^>]*>[01]\\.[0-9]{3}</td>")]
    private static partial Regex VerdictRow();

    [GeneratedRegex(">fault</td>.*exports/[^<]*:[0-9]+", RegexOptions.Singleline)]
    private static partial Regex CutFile();

    [GeneratedRegex("(src|href)=[\"']?(https?:)?//", RegexOptions.IgnoreCase)]
    private static partial Regex RemoteReference();

    [GeneratedRegex("https?://|127\\.0\\.0\\.1|iopub|/(tmp|home|root|Users)/|[A-Za-z]:\\\\\\\\|dotnet-interactive|\"execution\"")]
    private static partial Regex MachineTrace();
}
