using System.Diagnostics;

namespace HemoRheo.Notebooks.Tests;

/// <summary>A browser without a window and without a network: every host name is unknown to it.</summary>
internal static class Browser
{
    private static readonly string Program = Environment.GetEnvironmentVariable("HEMORHEO_CHROMIUM") ?? "/usr/bin/chromium";

    /// <summary>Skips the test where there is no browser.</summary>
    public static void Needed() => Assert.SkipUnless(File.Exists(Program), "not run: needs Chromium, see DEVELOPERS.md");

    /// <summary>The page as it stands after its scripts have run.</summary>
    /// <param name="page">Path of an HTML file.</param>
    /// <param name="folder">Folder for the browser's own files.</param>
    public static string Drawn(string page, string folder)
    {
        string[] arguments = ["--headless", "--no-sandbox", "--disable-gpu", "--disable-dev-shm-usage", $"--user-data-dir={folder}", "--host-resolver-rules=MAP * ~NOTFOUND", "--virtual-time-budget=60000", "--dump-dom", $"file://{page}"];
        var start = new ProcessStartInfo(Program, arguments) { RedirectStandardOutput = true, RedirectStandardError = true };
        using var process = Process.Start(start)!;
        var error = process.StandardError.ReadToEndAsync();
        var drawn = process.StandardOutput.ReadToEnd();
        if (!process.WaitForExit(TimeSpan.FromMinutes(2))) process.Kill(entireProcessTree: true);
        Assert.True(process.ExitCode == 0, error.Result);
        return drawn;
    }
}
