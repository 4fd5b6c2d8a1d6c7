namespace HemoRheo.Notebooks.Tests;

/// <summary>Where the repository lies on this machine: the first folder above the tests that holds HemoRheo.sln.</summary>
internal static class Repository
{
    public static string Root { get; } = Find();

    public static string Reference(params string[] parts) => Path.Combine([Root, "tests", "ReferenceData", .. parts]);

    private static string Find()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "HemoRheo.sln"))) return folder.FullName;
        }

        throw new InvalidOperationException($"No folder above {AppContext.BaseDirectory} holds HemoRheo.sln.");
    }
}
