using System.Text.RegularExpressions;

namespace HemoRheo.Notebooks.Tests;

/// <summary>What holds for every notebook of the repository.</summary>
public abstract partial class KeptNotebookTests(KeptNotebook notebook)
{
    private static bool Saving => Environment.GetEnvironmentVariable("HEMORHEO_SAVE_NOTEBOOKS") == "1";

    [Fact]
    public void Every_cell_runs() => Assert.Empty(notebook.Executed.Errors);

    [Fact]
    public void Every_chart_has_its_figure_and_a_still_picture()
    {
        Assert.Equal(notebook.Charts, NewPlot().Count(notebook.Executed.AllHtml));
        Assert.Equal(notebook.Charts, StillPicture().Count(notebook.Executed.AllHtml));
    }

    [Fact]
    public void Every_chart_is_drawn_in_a_browser_without_a_network()
    {
        Assert.Equal(notebook.Charts, Figure().Count(notebook.Drawn));
        Assert.DoesNotMatch(StillPicture(), notebook.Drawn);
    }

    [Fact]
    public void No_output_refers_to_the_network() => Assert.DoesNotMatch(RemoteReference(), notebook.Executed.AllHtml);

    [Fact]
    public void The_notebook_of_the_repository_shows_what_the_library_says()
    {
        var today = SavedNotebook.Of(notebook.Executed, notebook.Source);
        if (Saving) File.WriteAllText(notebook.Source, today);
        var kept = new ExecutedNotebook(notebook.Source);

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
        var text = File.ReadAllText(notebook.Source);
        var kept = new ExecutedNotebook(notebook.Source);

        Assert.DoesNotMatch(MachineTrace(), text);
        Assert.Equal(notebook.Charts, StillPicture().Count(kept.AllHtml));
        Assert.InRange(text.Length, 1, 5_000_000);
    }

    /// <summary>What the first cell with this code shows.</summary>
    protected string Showing(string code, string form)
    {
        var cell = notebook.Executed.Cells.TakeWhile(cell => !ExecutedNotebook.Text(cell["source"]).Contains(code, StringComparison.Ordinal)).Count();
        return notebook.Executed.Shown(cell, form);
    }

    private static string Tables(ExecutedNotebook notebook, int cell) => string.Concat(Table().Matches(notebook.Shown(cell, "text/html")).Select(table => table.Value));

    [GeneratedRegex("Plotly\\.newPlot\\(")]
    private static partial Regex NewPlot();

    [GeneratedRegex("<img [^>]*src=\"data:image/svg\\+xml;base64,")]
    private static partial Regex StillPicture();

    [GeneratedRegex("class=\"js-plotly-plot\"")]
    private static partial Regex Figure();

    [GeneratedRegex("<table>.*?</table>", RegexOptions.Singleline)]
    private static partial Regex Table();

    [GeneratedRegex("(src|href)=[\"']?(https?:)?//", RegexOptions.IgnoreCase)]
    private static partial Regex RemoteReference();

    [GeneratedRegex("https?://|127\\.0\\.0\\.1|iopub|/(tmp|home|root|Users)/|[A-Za-z]:\\\\\\\\|dotnet-interactive|\"execution\"")]
    private static partial Regex MachineTrace();
}
