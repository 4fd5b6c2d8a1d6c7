using System.Reflection;
using System.Text.RegularExpressions;
using HemoRheo.Tests.Architecture;

namespace HemoRheo.Tests.Documents;

/// <summary>What the pages say is there.</summary>
public sealed partial class PageTests
{
    private static readonly Page Developers = new("DEVELOPERS.md");

    [Fact]
    public void Developers_prints_the_table_of_rooms_that_the_tests_hold()
    {
        var printed = Rooms().Match(Developers.Text).Groups["table"].Value;
        Assert.Equal(Architecture.Rooms.ToMarkdown(), printed);
    }

    [Fact]
    public void Developers_installs_the_packages_that_the_checks_install_and_names_what_skips_say()
    {
        static string[] Packages(string text) => [.. Installed().Match(text).Groups["packages"].Value.Split(' ', StringSplitOptions.RemoveEmptyEntries).Where(word => !word.StartsWith('-')).Order(StringComparer.Ordinal)];
        var checks = Packages(File.ReadAllText(Path.Combine(Repository.Root, ".ci", "run")));
        Assert.NotEmpty(checks);
        Assert.Equal(checks, Packages(Developers.Text));
        foreach (var program in new[] { "Jupyter", "Chromium" }) Assert.Contains($"\"not run: needs {program}, see DEVELOPERS.md\"", Developers.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void Developers_has_a_heading_for_every_room() => Faults.None(Architecture.Rooms.All.Select(room => room.Name).Where(name => !Developers.Has(name)));

    [Fact]
    public void The_page_of_the_library_has_a_link_to_every_room() =>
        Faults.None(Architecture.Rooms.All.Select(room => room.Name).Where(name => !new Page("src/HemoRheo/README.md").Links.Contains(name)));

    [Fact]
    public void Every_link_leads_somewhere()
    {
        var dead = from path in Tracked.Paths
                   where path.EndsWith(".md", StringComparison.Ordinal)
                   from link in new Page(path).Links
                   let target = Path.Combine(Repository.Root, Path.GetDirectoryName(path)!, link.Split('#')[0])
                   where !Path.Exists(target)
                   select $"{path}: {link}";
        Faults.None(dead);
    }

    [Fact]
    public void Every_code_of_the_cautions_is_a_finding_or_a_column()
    {
        var kinds = typeof(FindingKind).Assembly.GetTypes().SelectMany(type => type.GetProperties(BindingFlags.Static | BindingFlags.Public))
            .Where(property => property.PropertyType == typeof(FindingKind)).Select(property => ((FindingKind)property.GetValue(null)!).Code);
        var known = kinds.Concat(Glossary.All.Select(column => column.Name)).Concat(["findings.csv", "data-dictionary.csv"]).ToHashSet();
        Faults.None(new Page("CAUTIONS.md").Codes.Where(code => !known.Contains(code)));
    }

    [Theory]
    [InlineData("README.md")]
    [InlineData("DEVELOPERS.md")]
    [InlineData("src/HemoRheo/README.md")]
    public void Every_name_and_path_in_code_letters_exists(string path)
    {
        var words = Sources.FilesBelow(Path.Combine(Repository.Root, "src")).Append(Path.Combine(Repository.Root, "tests", "HemoRheo.Tests", "Architecture", "Rooms.cs"))
            .SelectMany(file => Names().Matches(File.ReadAllText(file)).Select(name => name.Value)).ToHashSet();
        var tracked = Tracked.Paths.SelectMany(Folders).Concat(Tracked.Paths).ToHashSet();
        words.UnionWith(Tracked.Paths.SelectMany(file => file.Split('/')));
        Faults.None(new Page(path).Codes.Where(code => code switch
        {
            _ when OnePath().IsMatch(code) => !IsBuilt(code) && !new[] { "", "src/HemoRheo/", "src/HemoRheo.Notebooks/" }.Any(folder => tracked.Contains(folder + code.TrimEnd('/'))),
            _ when OneName().IsMatch(code) => !words.Contains(code),
            _ => false,
        }));
    }

    [Fact]
    public void Every_release_says_what_changes_a_computed_number()
    {
        var releases = new Page("src/HemoRheo/RELEASE_NOTES.md").Text.Split("\n## ").Skip(1);
        Assert.All(releases, release => Assert.Contains("\n### Changes a computed number\n", release, StringComparison.Ordinal));
    }

    [Fact]
    public void Every_folder_of_reference_data_says_where_its_numbers_come_from()
    {
        var contents = new Page("tests/ReferenceData/README.md");
        var folders = Directory.GetDirectories(Repository.Reference()).Select(folder => Path.GetFileName(folder)!);
        Faults.None(folders.SelectMany(folder => new[]
        {
            File.Exists(Repository.Reference(folder, "README.md")) ? null : $"{folder} has no README.md",
            contents.Links.Contains(folder) ? null : $"{folder} is not in the table of contents",
        }).OfType<string>());
    }

    private static bool IsBuilt(string path) => path.Split('/').Any(part => part is "artifacts" or "bin" or "obj" or "results");

    private static IEnumerable<string> Folders(string path)
    {
        for (var folder = Path.GetDirectoryName(path); !string.IsNullOrEmpty(folder); folder = Path.GetDirectoryName(folder)) yield return folder.Replace('\\', '/');
    }

    [GeneratedRegex("<!-- rooms -->\n(?<table>.*?)<!-- end of rooms -->", RegexOptions.Singleline)]
    private static partial Regex Rooms();

    [GeneratedRegex(@"apt-get install (?<packages>[^>\n]+)")]
    private static partial Regex Installed();

    [GeneratedRegex(@"\b[A-Za-z]\w*\b")]
    private static partial Regex Names();

    [GeneratedRegex(@"^[\w.-]+(/[\w.-]+)*/?$(?<=/.*)")]
    private static partial Regex OnePath();

    [GeneratedRegex("^[A-Z][A-Za-z]+$")]
    private static partial Regex OneName();
}
