using System.Text.RegularExpressions;

namespace HemoRheo.Notebooks.Tests;

[Collection(OneKernelAtATime.Name)]
public sealed partial class VerdictNotebookTests(VerdictNotebook notebook) : KeptNotebookTests(notebook), IClassFixture<VerdictNotebook>
{
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

    [GeneratedRegex(">(below|within|above|undecided)</td><td[^>]*>[01]\\.[0-9]{3}</td>")]
    private static partial Regex VerdictRow();

    [GeneratedRegex(">fault</td>.*exports/[^<]*:[0-9]+", RegexOptions.Singleline)]
    private static partial Regex CutFile();
}
