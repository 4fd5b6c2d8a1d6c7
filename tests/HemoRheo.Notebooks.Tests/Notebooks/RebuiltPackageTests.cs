using System.Diagnostics;
using System.Security.Cryptography;

namespace HemoRheo.Notebooks.Tests;

public sealed class RebuiltPackageTests : IDisposable
{
    private readonly string _packages = Directory.CreateTempSubdirectory("hemorheo-packages-").FullName;

    [Theory]
    [InlineData(true, true)]
    [InlineData(false, false)]
    public void An_unpacked_copy_of_other_bytes_than_the_feed_s_is_taken_away_by_the_build(bool sameBytes, bool stays)
    {
        var feed = Path.Combine(Repository.Root, "artifacts", "feed", "HemoRheo.0.1.0.nupkg");
        var copy = Directory.CreateDirectory(Path.Combine(_packages, "hemorheo", "0.1.0")).FullName;
        var hash = SHA512.HashData(sameBytes ? File.ReadAllBytes(feed) : [1, 2, 3]);
        File.WriteAllText(Path.Combine(copy, "hemorheo.0.1.0.nupkg.sha512"), Convert.ToBase64String(hash));
        File.WriteAllText(Path.Combine(copy, ".nupkg.metadata"), "{}");

        var start = new ProcessStartInfo("dotnet", ["msbuild", Path.Combine(Repository.Root, "src", "HemoRheo", "HemoRheo.csproj"), "-t:ForgetUnpackedCopy", $"-p:NuGetPackageRoot={_packages}/", "-p:Configuration=Release", "-nologo", "-nodeReuse:false"]) { RedirectStandardOutput = true };
        using var process = Process.Start(start)!;
        var said = process.StandardOutput.ReadToEnd();
        process.WaitForExit();

        Assert.True(process.ExitCode == 0, said);
        Assert.Equal(stays, Directory.Exists(copy));
    }

    public void Dispose() => Directory.Delete(_packages, true);
}
