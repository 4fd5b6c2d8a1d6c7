using System.Globalization;

namespace HemoRheo.Notebooks.Tests;

[Collection(OneKernelAtATime.Name)]
public sealed class ProgressTests
{
    /// <summary>Analyzes a study in a cell and notes when the bar changed and what it showed last.</summary>
    private const string Session = """
        import sys, time
        from jupyter_client.manager import start_new_kernel
        manager, client = start_new_kernel(kernel_name="hemorheo-test", startup_timeout=120)
        changes = []
        def hook(message):
            if message["msg_type"] == "update_display_data": changes.append((time.time(), message["content"]["data"].get("text/html", "")))
        def run(code): return client.execute_interactive(code, timeout=300, output_hook=hook)["content"]["status"]
        try:
            print("loaded:", run('#r "nuget:HemoRheo.Notebooks"'))
            changes.clear()
            print("analyzed:", run('using HemoRheo; var study = Study.Open("' + sys.argv[1] + '"); var readings = study.ReadExports(); foreach (var i in new[] { 1, 2, 3 }) study.Analyze(readings);'))
            bars = [t for t, html in changes if "<progress" in html]
            print("bars:", len(bars))
            print("at most five a second:", len(bars) <= 5 * (bars[-1] - bars[0]) + 1)
            print("left behind:", "<progress" in changes[-1][1])
        finally:
            client.stop_channels(); manager.shutdown_kernel(now=True)
        """;

    [Fact]
    public void The_bar_changes_at_most_five_times_a_second_and_is_gone_at_the_end()
    {
        Jupyter.Needed();
        using var jupyter = new Jupyter();

        var (exitCode, log) = jupyter.RunPython("-c", Session, Path.Combine(Repository.Root, "synthetic-cohort", "study.toml"));

        Assert.True(exitCode == 0, log);
        Assert.Contains("analyzed: ok", log, StringComparison.Ordinal);
        Assert.Contains("left behind: False", log, StringComparison.Ordinal);
        Assert.True(Number(log, "bars: ") > 0, log);
        Assert.Contains("at most five a second: True", log, StringComparison.Ordinal);
    }

    private static int Number(string log, string after)
    {
        var from = log.IndexOf(after, StringComparison.Ordinal) + after.Length;
        return int.Parse(log.AsSpan(from, log.AsSpan(from).IndexOf('\n')), CultureInfo.InvariantCulture);
    }
}
