namespace HemoRheo.Notebooks.Tests;

/// <summary>A folder of one test's own, gone when the test ends.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("hemorheo-test-").FullName;

    public string this[params string[] parts] => System.IO.Path.Combine([Path, .. parts]);

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
