namespace HemoRheo.Tests.Ledger;

public sealed class RunComparisonTests
{
    private const string Own = "S-p1/Casson/viscosity at 10 1/s/native hematocrit/value";
    private const string Cohort = "cohort/Casson/viscosity at 10 1/s/native hematocrit/patients beside controls/total/value";

    private static readonly RunRecord Earlier = LedgerStudy.Record(LedgerStudy.Analyzed);

    [Fact]
    public void The_same_study_again_is_identical()
    {
        var again = RunRecord.FromJson(LedgerStudy.Record(LedgerStudy.Analyzed).ToJson()).ComparedWith(Earlier);
        Assert.True(again.Identical);
        Assert.Equal("identical", again.ToString());
    }

    [Fact]
    public void A_changed_sample_leads_back_to_its_own_file_and_the_cohort_to_what_samples_share()
    {
        var path = LedgerStudy.Path("S-p1");
        var later = LedgerStudy.Record(LedgerStudy.Analyzed.WithFile(path, sample => sample.Sample == "S-p1" ? sample.Moved(0.1) : sample));
        var changes = later.ComparedWith(Earlier).Changes;
        Assert.Equal(("input", path), (changes[0].What, changes[0].Name));
        var own = Assert.Single(changes, change => change.Name == Own);
        Assert.Equal(("-4.4", "-4.300000000000001", $"input {path}"), (own.Before, own.After, own.NearestCause));
        Assert.Equal($"input {path}, through what the samples share", Assert.Single(changes, change => change.Name == Cohort).NearestCause);
        Assert.DoesNotContain(changes, change => change.Name.StartsWith("S-c", StringComparison.Ordinal));
    }

    [Fact]
    public void A_changed_check_changes_every_sample_and_is_named_as_what_they_share()
    {
        var later = LedgerStudy.Record(LedgerStudy.Analyzed.WithFile("checks/week-1.csv", sample => sample.Moved(0.01)));
        var own = Assert.Single(later.ComparedWith(Earlier).Changes, change => change.Name == Own);
        Assert.Equal("input checks/week-1.csv, through what the samples share", own.NearestCause);
    }

    [Fact]
    public void A_changed_samples_table_is_nearer_than_settings()
    {
        var analyzed = LedgerStudy.Analyzed.WithFile("samples.csv", sample => sample.Moved(0.01));
        var later = LedgerStudy.Record(analyzed with { Study = analyzed.Study with { Digest = "other" } });
        Assert.Equal("input samples.csv", Assert.Single(later.ComparedWith(Earlier).Changes, change => change.Name == Own).NearestCause);
    }

    [Fact]
    public void Settings_come_before_versions_and_versions_before_the_seed()
    {
        var moved = LedgerStudy.Record(LedgerStudy.Analyzed with { Samples = LedgerStudy.Analyzed.Samples.Select(sample => sample.Moved(0.01)).ToItems() });
        var newer = moved with { Seed = 2, Versions = moved.Versions.Select(version => version.Name == "runtime" ? version with { Text = "another runtime" } : version).ToItems() };
        Assert.Equal("setting study file", CauseOf(newer with { Settings = "other" }));
        Assert.Equal("version runtime", CauseOf(newer));
        Assert.Equal("seed", CauseOf(moved with { Seed = 2 }));
        Assert.Equal("nothing that was recorded: no input, setting, version or seed changed", CauseOf(moved));

        static string? CauseOf(RunRecord later) => Assert.Single(later.ComparedWith(Earlier).Changes, change => change.Name == Own).NearestCause;
    }

    [Fact]
    public void What_came_and_what_went_is_listed_with_an_empty_side()
    {
        var fewer = LedgerStudy.Analyzed with
        {
            Samples = LedgerStudy.Analyzed.Samples.Where(sample => sample.Sample != "S-p1").ToItems(),
            Readings = LedgerStudy.Analyzed.Readings with { Files = LedgerStudy.Analyzed.Readings.Files.Where(file => file.Path != LedgerStudy.Path("S-p1")).ToItems() },
        };
        var gone = LedgerStudy.Record(fewer).ComparedWith(Earlier).Changes;
        var own = Assert.Single(gone, change => change.Name == Own);
        Assert.Equal(("-4.4", null, $"input {LedgerStudy.Path("S-p1")}"), (own.Before, own.After, own.NearestCause));
        Assert.Null(Assert.Single(gone, change => change is { What: "input" }).After);
        Assert.Null(Assert.Single(Earlier.ComparedWith(LedgerStudy.Record(fewer)).Changes, change => change.Name == Own).Before);
    }

    [Fact]
    public void A_pseudonym_with_a_slash_is_still_led_back_to_its_file()
    {
        var before = Earlier with { Feeds = [new("a/b", "x.csv")], Inputs = [new("x.csv", "1")], Results = [new("a/b/Casson/value", "1")] };
        var after = before with { Inputs = [new("x.csv", "2")], Results = [new("a/b/Casson/value", "2")] };
        Assert.Equal("input x.csv", after.ComparedWith(before).Changes[^1].NearestCause);
    }
}
