using System.Globalization;
using System.Text;
using System.Text.RegularExpressions;
using HemoRheo.App.Synthetic;

namespace HemoRheo.Notebooks.Tests;

public sealed partial class CohortRegenerationTests
{
    private static readonly string Committed = Path.Combine(Repository.Root, "synthetic-cohort");

    [Fact]
    public void The_committed_cohort_is_what_the_seed_gives()
    {
        var bytes = Environment.GetEnvironmentVariable("CI") == "true";
        foreach (var file in SyntheticCohort.Files(SyntheticCohort.RepositorySeed))
        {
            var committed = File.ReadAllBytes(Path.Combine(Committed, file.Path));
            if (bytes) Assert.True(committed.AsSpan().SequenceEqual(Encoding.UTF8.GetBytes(file.Text)), $"{file.Path} differs from what the seed gives.");
            else AssertSameToTheLastDigit(Encoding.UTF8.GetString(committed), file);
        }
    }

    [Fact]
    public void Nothing_else_lies_in_the_committed_cohort()
    {
        var made = SyntheticCohort.Files(SyntheticCohort.RepositorySeed).Select(file => file.Path);
        var there = Directory.EnumerateFiles(Committed, "*", SearchOption.AllDirectories)
            .Select(path => Path.GetRelativePath(Committed, path).Replace('\\', '/'))
            .Where(path => !path.StartsWith("results", StringComparison.Ordinal));

        Assert.Equal(made.Order(StringComparer.Ordinal), there.Order(StringComparer.Ordinal));
    }

    [Fact]
    public void It_is_the_same_under_a_culture_with_decimal_comma()
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            var german = SyntheticCohort.Files(7);
            CultureInfo.CurrentCulture = CultureInfo.InvariantCulture;
            Assert.Equal(SyntheticCohort.Files(7), german);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Fact]
    public void Another_seed_gives_other_numbers_in_the_same_files()
    {
        var one = SyntheticCohort.Files(1);
        var two = SyntheticCohort.Files(2);

        Assert.Equal(one.Select(file => file.Path), two.Select(file => file.Path));
        Assert.NotEqual(one.Single(file => file.Path == "samples.csv"), two.Single(file => file.Path == "samples.csv"));
    }

    [Fact]
    public void All_of_it_is_small_and_ends_lines_with_a_line_feed()
    {
        var files = SyntheticCohort.Files(SyntheticCohort.RepositorySeed);

        Assert.InRange(files.Sum(file => Encoding.UTF8.GetByteCount(file.Text)), 100_000, 5_000_000);
        Assert.DoesNotContain(files, file => file.Text.Contains('\r'));
    }

    private static void AssertSameToTheLastDigit(string committed, SyntheticFile made)
    {
        var decimalSign = made.Path.StartsWith("exports/rows", StringComparison.Ordinal) ? ',' : '.';
        var number = decimalSign == ',' ? WithComma() : WithPoint();
        Assert.Equal(number.Replace(committed, "#"), number.Replace(made.Text, "#"));
        foreach (var (before, now) in number.Matches(committed).Zip(number.Matches(made.Text)))
        {
            var decimals = before.Length - 1 - before.Value.IndexOf(decimalSign);
            Assert.Equal(decimals, now.Length - 1 - now.Value.IndexOf(decimalSign));
            var apart = Math.Abs(Parsed(before) - Parsed(now));
            Assert.True(apart <= 1.5 * Math.Pow(10, -decimals), $"{made.Path}: {before.Value} became {now.Value}.");
        }

        double Parsed(Match match) => double.Parse(match.Value.Replace(',', '.'), CultureInfo.InvariantCulture);
    }

    [GeneratedRegex(@"-?\d+\.\d+")]
    private static partial Regex WithPoint();

    [GeneratedRegex(@"-?\d+,\d+")]
    private static partial Regex WithComma();
}
