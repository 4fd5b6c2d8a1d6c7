using System.Text.RegularExpressions;

namespace HemoRheo.Tests.Architecture;

/// <summary>The repository as a whole: what lies at its top, and what no file of it says.</summary>
public sealed partial class RepositoryTests
{
    private static readonly string[] Top =
    [
        "CAUTIONS.md", "DEVELOPERS.md", "HemoRheo.sln", "LICENSE", "README.md", "global.json", "nuget.config",
        "notebooks", "src", "synthetic-cohort", "tests",
    ];

    [Fact]
    public void The_top_level_holds_what_DEVELOPERS_says_and_nothing_else()
    {
        var there = Tracked.Paths.Select(path => path.Split('/')[0]).Distinct();
        Faults.None(there.Where(name => !Top.Contains(name) && !name.StartsWith('.') && !BuildSettings().IsMatch(name)));
    }

    [Fact]
    public void No_text_file_names_a_path_of_a_machine()
    {
        var wrong = from path in Tracked.Paths
                    where Tracked.IsText(path)
                    from line in File.ReadLines(Path.Combine(Repository.Root, path)).Index()
                    where MachinePath().IsMatch(line.Item)
                    select $"{path}:{line.Index + 1}: {MachinePath().Match(line.Item).Value}";
        Faults.None(wrong);
    }

    [Fact]
    public void No_source_or_page_leaves_work_for_later()
    {
        var wrong = from path in Tracked.Paths
                    where Path.GetExtension(path) is ".cs" or ".md" or ".toml" or ".ipynb"
                    from line in File.ReadLines(Path.Combine(Repository.Root, path)).Index()
                    where Unfinished().IsMatch(line.Item)
                    select $"{path}:{line.Index + 1}";
        Faults.None(wrong);
    }

    [Fact]
    public void Pages_of_text_use_plain_dashes()
    {
        var wrong = from path in Tracked.Paths
                    where Path.GetExtension(path) is ".md" or ".cs" or ".toml"
                    from line in File.ReadLines(Path.Combine(Repository.Root, path)).Index()
                    where line.Item.Contains('\u2014', StringComparison.Ordinal)
                    select $"{path}:{line.Index + 1}";
        Faults.None(wrong);
    }

    [GeneratedRegex(@"^Directory\.\w+\.(props|targets)$")]
    private static partial Regex BuildSettings();

    // Written in parts, so that this file does not find itself.
    [GeneratedRegex("(?<![\\w.)\\]}])/(root|tmp" + "|home|work|Users)/|[A-Z]:" + @"\\\w")]
    private static partial Regex MachinePath();

    [GeneratedRegex("\\b(TO" + "DO|FIX" + "ME|HA" + "CK|XX" + "X)\\b|NotImplemented" + "Exception")]
    private static partial Regex Unfinished();
}
