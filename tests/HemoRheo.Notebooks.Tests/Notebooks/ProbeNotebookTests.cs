using System.Text.RegularExpressions;

namespace HemoRheo.Notebooks.Tests;

[Collection(OneKernelAtATime.Name)]
public sealed partial class ProbeNotebookTests(ProbeNotebook probe) : IClassFixture<ProbeNotebook>
{
    [Fact]
    public void Every_cell_runs() => Assert.Empty(probe.Executed.Errors);

    [Fact]
    public void The_notebook_gets_the_packages_of_this_build()
    {
        Guid[] built = [typeof(FlowCurve).Assembly.ManifestModule.ModuleVersionId, typeof(InteractiveChart).Assembly.ManifestModule.ModuleVersionId];

        Assert.Equal(built, probe.Executed.Printed(ProbeNotebook.Versions).Split('\n', StringSplitOptions.RemoveEmptyEntries).Select(Guid.Parse));
    }

    [Fact]
    public void Loading_says_version_and_research_use_in_one_line() =>
        Assert.EndsWith("HemoRheo 0.1.0. For research use only: its values are not a diagnosis.", probe.Executed.Shown(ProbeNotebook.Loading, "text/plain").TrimEnd(), StringComparison.Ordinal);

    [Theory]
    [InlineData(ProbeNotebook.Loading)]
    [InlineData(ProbeNotebook.LoadedAgain)]
    public void The_chart_library_is_shown_once_each_time_the_package_is_named(int cell) =>
        Assert.Single(LibraryScript().Matches(probe.Executed.Shown(cell, "text/html")));

    [Fact]
    public void A_curve_is_a_table_with_units_and_one_line_of_text()
    {
        var html = probe.Executed.Shown(ProbeNotebook.Curve, "text/html");

        Assert.Contains(">shear rate [1/s]</th>", html, StringComparison.Ordinal);
        Assert.Contains(">viscosity [mPa·s]</th>", html, StringComparison.Ordinal);
        Assert.Contains(">4.8</td>", html, StringComparison.Ordinal);
        Assert.Equal("curve, loading 1: 5 points kept, 0 set aside", probe.Executed.Shown(ProbeNotebook.Curve, "text/plain").Trim());
    }

    [Theory]
    [InlineData(ProbeNotebook.CurveChart)]
    [InlineData(ProbeNotebook.HostileName)]
    public void A_chart_has_its_figure_and_a_still_picture(int cell)
    {
        var html = probe.Executed.Shown(cell, "text/html");

        Assert.Contains("Plotly.newPlot(", html, StringComparison.Ordinal);
        Assert.Contains("src=\"data:image/svg+xml;base64,", html, StringComparison.Ordinal);
    }

    [Fact]
    public void A_chart_made_in_a_cell_is_drawn_by_the_same_library() =>
        Assert.Contains("Plotly.newPlot(", probe.Executed.Shown(ProbeNotebook.OwnChart, "text/html"), StringComparison.Ordinal);

    [Fact]
    public void Every_chart_is_drawn_in_a_browser_without_a_network()
    {
        Assert.Equal(3, MainDrawing().Count(probe.Drawn));
        Assert.DoesNotContain("<img width=\"700\"", probe.Drawn, StringComparison.Ordinal);
    }

    [Fact]
    public void A_frame_is_a_table_with_its_size()
    {
        var html = probe.Executed.Shown(ProbeNotebook.Frame, "text/html");

        Assert.Contains("<th>shear stress [mPa]</th>", html, StringComparison.Ordinal);
        Assert.Contains("<p>5 rows x 8 columns</p>", html, StringComparison.Ordinal);
        Assert.Contains("<i>missing</i>", html, StringComparison.Ordinal);
    }

    [Fact]
    public void A_name_that_is_markup_stays_text() =>
        Assert.DoesNotContain("<script>alert", probe.Executed.AllHtml, StringComparison.Ordinal);

    [Fact]
    public void No_output_refers_to_the_network() =>
        Assert.DoesNotMatch(RemoteReference(), probe.Executed.AllHtml);

    [GeneratedRegex("DecompressionStream")]
    private static partial Regex LibraryScript();

    [GeneratedRegex("class=\"js-plotly-plot\"")]
    private static partial Regex MainDrawing();

    [GeneratedRegex("(src|href)=[\"']?(https?:)?//", RegexOptions.IgnoreCase)]
    private static partial Regex RemoteReference();
}
