using System.Xml.Linq;

namespace HemoRheo.Tests.Architecture;

/// <summary>Which packages each project rests on, and which part of it may touch them.</summary>
public sealed class ProjectTests
{
    private static readonly string[] OfTheLibrary =
    [
        "MathNet.Numerics", "Microsoft.CodeAnalysis.BannedApiAnalyzers", "Microsoft.CodeAnalysis.PublicApiAnalyzers", "Microsoft.Data.Sqlite", "Tomlyn",
    ];

    [Fact]
    public void The_library_rests_on_numbers_and_file_readers_alone() =>
        Faults.None(Packages("HemoRheo").Except(OfTheLibrary));

    [Fact]
    public void The_console_program_has_no_chart_frame_or_notebook_package_of_its_own() =>
        Assert.Equal(["System.CommandLine"], Packages("HemoRheo.App"));

    [Theory]
    [InlineData("Microsoft.DotNet.Interactive", "Kernel")]
    [InlineData("Deedle", "Frames", "Kernel")]
    [InlineData("Plotly.NET", "Charts", "Kernel")]
    [InlineData("OxyPlot", "Charts")]
    public void A_package_that_may_have_to_go_is_touched_in_one_place(string package, params string[] folders)
    {
        var project = Path.Combine(Repository.Root, "src", "HemoRheo.Notebooks");
        var elsewhere = Sources.FilesBelow(project)
            .Where(path => !folders.Contains(Path.GetRelativePath(project, path).Replace('\\', '/').Split('/')[0]))
            .Where(path => File.ReadLines(path).Any(line => line.StartsWith($"using {package}", StringComparison.Ordinal) || line.Contains($" {package}.", StringComparison.Ordinal)));
        Faults.None(elsewhere.Select(Sources.Short));
    }

    private static IEnumerable<string> Packages(string project) => XDocument.Load(Path.Combine(Repository.Root, "src", project, $"{project}.csproj"))
        .Descendants("PackageReference").Select(item => (string)item.Attribute("Include")!).Order(StringComparer.Ordinal);
}
