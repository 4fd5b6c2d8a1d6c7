using System.Diagnostics;
using System.Globalization;

namespace HemoRheo.Tests.Calibration;

/// <summary>Programs that write a log at once, and programs killed while they write. The writer is the benchmarks' <c>write-log</c>.</summary>
public sealed class InstrumentLogProcessTests : IDisposable
{
    private const int Kills = 100;
    private const int Lanes = 2;

    private readonly LogFolder[] _folders = [.. Enumerable.Range(0, Lanes).Select(_ => new LogFolder())];

    private static string Writer => Path.Combine(AppContext.BaseDirectory.Replace("HemoRheo.Tests", "HemoRheo.Benchmarks", StringComparison.Ordinal), OperatingSystem.IsWindows() ? "HemoRheo.Benchmarks.exe" : "HemoRheo.Benchmarks");

    public void Dispose()
    {
        foreach (var folder in _folders) folder.Dispose();
    }

    [Fact]
    public void A_hundred_kills_in_the_middle_of_writing_lose_at_most_the_unfinished_check()
    {
        var interrupted = 0;
        Parallel.For(0, Lanes, lane =>
        {
            for (var kill = 0; kill < Kills / Lanes; kill++)
            {
                var (said, midway) = Killed(_folders[lane], RandomStream.Of(6, "kill", lane * Kills + kill).Uniform());
                if (midway) Interlocked.Increment(ref interrupted);
                var verification = InstrumentLog.Open(_folders[lane].Path).Verify();
                Assert.True(verification.Sound, verification.ToString());
                Assert.InRange(verification.Entries, said, said + 1);
            }
        });
        Assert.All(_folders, folder => Assert.InRange(folder.Log.Read().Checks.Count, Kills / Lanes, int.MaxValue));
        Assert.True(interrupted > 0, "No kill fell into a write.");
        TestContext.Current.TestOutputHelper?.WriteLine(FormattableString.Invariant($"{interrupted} of {Kills} kills left an unfinished write."));
    }

    [Fact]
    public async Task Two_programs_that_write_at_once_lose_nothing()
    {
        const int checks = 40;
        var folder = _folders[0];
        using var one = Start(folder, "one", checks);
        using var other = Start(folder, "other", checks);
        var said = await Task.WhenAll(one.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken), other.StandardOutput.ReadToEndAsync(TestContext.Current.CancellationToken));
        await Task.WhenAll(one.WaitForExitAsync(TestContext.Current.CancellationToken), other.WaitForExitAsync(TestContext.Current.CancellationToken));
        Assert.Equal((0, 0), (one.ExitCode, other.ExitCode));
        var contents = folder.Log.Read();
        Assert.True(contents.Verification.Sound, contents.Verification.ToString());
        var names = contents.Entries.Select(entry => entry.What).OfType<LoggedCheck>().Select(check => check.Name).ToArray();
        Assert.Equal(2 * checks, names.Length);
        foreach (var writer in new[] { "one", "other" }) Assert.Equal(Enumerable.Range(0, checks).Select(i => $"{writer}-{i}"), names.Where(name => name.StartsWith($"{writer}-", StringComparison.Ordinal)));
        Assert.Equal(2 * checks, string.Concat(said).Split('\n', StringSplitOptions.RemoveEmptyEntries).Distinct().Count());
    }

    /// <summary>Kills a writer a while after its first entry; the last number it said, and whether it left a journal.</summary>
    private static (int Said, bool Midway) Killed(LogFolder folder, double fraction)
    {
        using var writer = Start(folder, "killed", 100_000);
        var said = writer.StandardOutput.ReadLine();
        Assert.NotNull(said);
        Thread.Sleep((int)(12 * fraction));
        writer.Kill();
        while (writer.StandardOutput.ReadLine() is { } line) said = line;
        writer.WaitForExit();
        var journal = new FileInfo(folder.Path + "-journal");
        return (int.Parse(said, CultureInfo.InvariantCulture), journal.Exists && journal.Length > 0);
    }

    private static Process Start(LogFolder folder, string name, int checks) =>
        Process.Start(new ProcessStartInfo(Writer, ["write-log", folder.Path, name, checks.ToString(CultureInfo.InvariantCulture)]) { RedirectStandardOutput = true, Environment = { ["DOTNET_TieredPGO"] = "0" } })!;
}
